import type { Knex } from 'knex';

import type { Defect, Faces } from '@/geometry/core/layout';

/** A slab that can be bought. Lengths inches. */
export interface StockRecord {
  readonly id: string;
  readonly code: string;
  readonly species: string;
  readonly thickness: number;
  readonly length: number;
  readonly depth: number;
  readonly batch: string;
  readonly faces: Faces;
  readonly defects: readonly Defect[];
  readonly priceCents: number;
  /** Null: as many as wanted. */
  readonly count: number | null;
  readonly trim: number | null;
  readonly measuredDepth: number | null;
  readonly crook: number | null;
  readonly straightening: number | null;
  readonly supplier: string;
}

export type StockFields = Omit<StockRecord, 'id'>;

const COLUMNS = {
  id: 'id',
  code: 'code',
  species: 'species',
  thickness: 'thickness',
  length: 'length',
  depth: 'depth',
  batch: 'batch',
  faces: 'faces',
  defects: 'defects',
  priceCents: 'price_cents',
  count: 'count',
  trim: 'trim',
  measuredDepth: 'measured_depth',
  crook: 'crook',
  straightening: 'straightening',
  supplier: 'supplier',
} as const;

/** By species, thickness and length, as a person looks for one. */
export function listStock(trx: Knex.Transaction): Promise<StockRecord[]> {
  return trx('stock_slabs').select<StockRecord[]>(COLUMNS).orderBy(['species', 'thickness', 'length', 'depth', 'code']);
}

export async function findStock(trx: Knex.Transaction, slabId: string): Promise<StockRecord | null> {
  return (await trx('stock_slabs').where({ id: slabId }).first<StockRecord>(COLUMNS)) ?? null;
}

/** Whether another slab of the shop has this code. */
export async function isStockCodeTaken(trx: Knex.Transaction, code: string, exceptId?: string): Promise<boolean> {
  const found = await trx('stock_slabs').where({ code }).first<{ id: string }>('id');
  return found !== undefined && found.id !== exceptId;
}

export async function insertStock(trx: Knex.Transaction, shopId: string, fields: StockFields): Promise<string> {
  const [row] = await trx('stock_slabs')
    .insert({ shop_id: shopId, ...toRow(fields) })
    .returning<{ id: string }[]>('id');
  if (!row) throw new Error('insert into stock_slabs returned no row');
  return row.id;
}

export async function updateStock(trx: Knex.Transaction, slabId: string, fields: Partial<StockFields>): Promise<void> {
  await trx('stock_slabs')
    .where({ id: slabId })
    .update({ ...toRow(fields), updated_at: trx.fn.now(3) });
}

/** @returns false when the shop has no such slab */
export async function deleteStock(trx: Knex.Transaction, slabId: string): Promise<boolean> {
  return (await trx('stock_slabs').where({ id: slabId }).delete()) > 0;
}

function toRow(fields: Partial<StockFields>): Record<string, unknown> {
  return Object.fromEntries(
    Object.entries(fields).map(([name, value]) => [
      COLUMNS[name as keyof StockFields],
      // pg would send a bare array as a PostgreSQL array, not as jsonb.
      name === 'defects' ? JSON.stringify(value) : value,
    ]),
  );
}
