import type { Knex } from 'knex';

import { completeSettings } from '@/shared/contracts/shop-settings';
import type { Shop } from '@/shared/contracts/shop';
import { findShop, type ShopRecord } from '../repositories/shop-repository';

/** The shop of the transaction, its settings complete. */
export async function readShop(trx: Knex.Transaction): Promise<Shop> {
  return toShop(await findShop(trx));
}

export function toShop(record: ShopRecord): Shop {
  return { ...record, settings: completeSettings(record.settings) };
}
