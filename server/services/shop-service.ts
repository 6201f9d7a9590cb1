import type { Knex } from 'knex';

import type { BodyOf } from '@/shared/contracts/contract';
import type { Shop, updateShop as updateShopContract } from '@/shared/contracts/shop';
import { logAct } from '../repositories/audit-repository';
import { updateShop, type ShopRecord } from '../repositories/shop-repository';
import type { Actor } from './actor';
import { announce } from './event-hub';
import { inShop } from './in-shop';
import { readShop, toShop } from './read-shop';

/** Name, units, settings and letterhead of the shop. */
export class ShopService {
  constructor(private readonly db: Knex) {}

  get(actor: Actor): Promise<Shop> {
    return inShop(this.db, actor, 'shop.see', readShop);
  }

  update(actor: Actor, change: BodyOf<typeof updateShopContract>): Promise<Shop> {
    return inShop(this.db, actor, 'shop.edit', async (trx) => {
      const given = Object.entries(change).filter(([, value]) => value !== undefined);
      const record = await updateShop(trx, actor.shopId, Object.fromEntries(given) as Partial<ShopRecord>);
      const data = { fields: given.map(([name]) => name) };
      await logAct(trx, { shopId: actor.shopId, personId: actor.personId, action: 'shop.changed', data });
      await announce(trx, actor.shopId, { kind: 'shop' });
      return toShop(record);
    });
  }
}
