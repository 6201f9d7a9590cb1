import type { Knex } from 'knex';

import type { ShopEvent } from '@/shared/contracts/events';
import { announce as announceTo, listen, type Listening } from '../repositories/event-repository';

export interface Listener {
  heard(event: ShopEvent): void;
  /** Events may have been missed: whoever listens has to look at everything again. */
  lost(): void;
}

/** Tells a change to every open screen of a shop, when the transaction commits, whichever process serves it. */
export function announce(trx: Knex.Transaction, shopId: string, event: ShopEvent): Promise<void> {
  return announceTo(trx, shopId, event);
}

/** Passes announcements on to listeners, shop by shop, over one database connection that is open while anybody listens. */
export class EventHub {
  private readonly listeners = new Map<string, Set<Listener>>();
  private listening: Listening | null = null;

  constructor(private readonly db: Knex) {}

  /** @returns call it to listen no more */
  subscribe(shopId: string, listener: Listener): () => void {
    const ofShop = this.listeners.get(shopId) ?? new Set();
    this.listeners.set(shopId, ofShop.add(listener));
    this.listening ??= listen(
      this.db,
      ({ shopId: shop, event }) => this.each(shop, (one) => one.heard(event as ShopEvent)),
      () => {
        for (const shop of this.listeners.keys()) this.each(shop, (one) => one.lost());
      },
    );
    return () => this.unsubscribe(shopId, listener);
  }

  /** Resolves when whoever has subscribed misses nothing from now on. */
  async ready(): Promise<void> {
    await this.listening?.ready;
  }

  private unsubscribe(shopId: string, listener: Listener): void {
    const ofShop = this.listeners.get(shopId);
    ofShop?.delete(listener);
    if (ofShop?.size === 0) this.listeners.delete(shopId);
    if (this.listeners.size > 0) return;
    void this.listening?.stop();
    this.listening = null;
  }

  private each(shopId: string, tell: (listener: Listener) => void): void {
    for (const listener of this.listeners.get(shopId) ?? []) tell(listener);
  }
}
