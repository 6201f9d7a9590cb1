import type { Knex } from 'knex';

import type { Step, Units } from '@/geometry/core/layout';

export interface ShopRecord {
  readonly id: string;
  readonly name: string;
  /** ISO 4217. */
  readonly currency: string;
  readonly units: Units;
  readonly step: Step;
  /** As stored; see completeSettings. */
  readonly settings: Readonly<Record<string, unknown>>;
  readonly letterhead: Letterhead;
}

export interface Letterhead {
  readonly lines?: readonly string[];
  readonly phone?: string;
  readonly email?: string;
}

const COLUMNS = ['id', 'name', 'currency', 'units', 'step', 'settings', 'letterhead'] as const;

/** The shop of the transaction. @throws Error without one, which a request that has an actor never is */
export async function findShop(trx: Knex.Transaction): Promise<ShopRecord> {
  const shop = await trx('shops').first<ShopRecord>(...COLUMNS);
  if (!shop) throw new Error('the transaction sees no shop');
  return shop;
}

/** Changes what is given; settings and letterhead are replaced whole. */
export async function updateShop(
  trx: Knex.Transaction,
  shopId: string,
  change: Partial<Omit<ShopRecord, 'id'>>,
): Promise<ShopRecord> {
  const { settings, letterhead, ...plain } = change;
  const [shop] = await trx('shops')
    .where({ id: shopId })
    .update({
      ...plain,
      ...(settings ? { settings: JSON.stringify(settings) } : {}),
      ...(letterhead ? { letterhead: JSON.stringify(letterhead) } : {}),
      updated_at: trx.fn.now(3),
    })
    .returning<ShopRecord[]>([...COLUMNS]);
  if (!shop) throw new Error('the transaction sees no shop');
  return shop;
}

/** Takes the next job number; a second job that is made at the same moment waits and gets the one after. */
export async function takeJobNumber(trx: Knex.Transaction, shopId: string): Promise<number> {
  const [row] = await trx('shops')
    .where({ id: shopId })
    .increment('next_job_number', 1)
    .returning<{ next_job_number: number }[]>('next_job_number');
  if (!row) throw new Error('the transaction sees no shop');
  return row.next_job_number - 1;
}
