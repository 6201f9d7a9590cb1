import type { Knex } from 'knex';

import type { Layout } from '@/geometry/core/layout';
import { emptyLayout } from '@/shared/layout/empty-layout';
import type { Shop } from '@/shared/contracts/shop';
import { stockOfShop } from './stock-for-layout';

/** An empty layout with the shop's units, tape and stock. */
export async function newLayout(trx: Knex.Transaction, shop: Shop): Promise<Layout> {
  const empty = emptyLayout({ units: shop.units, step: shop.step });
  return {
    ...empty,
    room: { ...empty.room, tapeSd: shop.settings.tapeSd },
    stock: { ...empty.stock, ...(await stockOfShop(trx, empty.material)) },
  };
}
