import type { Knex } from 'knex';

import type { Defect, Faces } from '@/geometry/core/layout';

/** An offcut on the rack. Lengths inches. */
export interface RackRecord {
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
  readonly leftAngleDeg: number;
  readonly rightAngleDeg: number;
  readonly place: string;
  readonly fromJobId: string | null;
  readonly reservedForJobId: string | null;
  readonly createdAt: Date;
}

export type RackFields = Omit<RackRecord, 'id' | 'code' | 'createdAt' | 'reservedForJobId'>;

/** Pieces that no job has taken, in the order of their codes. */
export function listRack(trx: Knex.Transaction): Promise<RackRecord[]> {
  return pieces(trx).whereNull('p.taken_at').orderBy(['p.species', 'p.thickness', 'p.length', 'p.code']);
}

export async function findRackPiece(trx: Knex.Transaction, pieceId: string): Promise<RackRecord | null> {
  return (await pieces(trx).where('p.id', pieceId).first()) ?? null;
}

/** Puts a piece on the rack under the next free code R1, R2 … Call it with the shop's codes locked. */
export async function insertRackPiece(
  trx: Knex.Transaction,
  whose: { readonly shopId: string; readonly personId: string },
  code: string,
  fields: RackFields,
): Promise<string> {
  const [row] = await trx('rack_pieces')
    .insert({
      shop_id: whose.shopId,
      person_id: whose.personId,
      code,
      species: fields.species,
      thickness: fields.thickness,
      length: fields.length,
      depth: fields.depth,
      batch: fields.batch,
      faces: fields.faces,
      defects: JSON.stringify(fields.defects),
      price_cents: fields.priceCents,
      left_angle_deg: fields.leftAngleDeg,
      right_angle_deg: fields.rightAngleDeg,
      place: fields.place,
      from_job_id: fields.fromJobId,
    })
    .returning<{ id: string }[]>('id');
  if (!row) throw new Error('insert into rack_pieces returned no row');
  return row.id;
}

/** Locks the shop's rack codes until the transaction ends and gives the first one that was never used. */
export async function takeRackCode(trx: Knex.Transaction, shopId: string): Promise<string> {
  await trx('shops').where({ id: shopId }).forNoKeyUpdate().first('id');
  const row = await trx('rack_pieces')
    .whereRaw("code ~ '^R[0-9]{1,9}$'")
    .first<{ highest: number | null }>(trx.raw('max(substr(code, 2)::int) as highest'));
  return `R${(row?.highest ?? 0) + 1}`;
}

function pieces(trx: Knex.Transaction) {
  return trx('rack_pieces as p')
    .leftJoin('reservations as r', (on) =>
      on.on('r.shop_id', 'p.shop_id').andOn('r.rack_piece_id', 'p.id').andOnNull('r.released_at'),
    )
    .select<RackRecord[]>({
      id: 'p.id',
      code: 'p.code',
      species: 'p.species',
      thickness: 'p.thickness',
      length: 'p.length',
      depth: 'p.depth',
      batch: 'p.batch',
      faces: 'p.faces',
      defects: 'p.defects',
      priceCents: 'p.price_cents',
      leftAngleDeg: 'p.left_angle_deg',
      rightAngleDeg: 'p.right_angle_deg',
      place: 'p.place',
      fromJobId: 'p.from_job_id',
      reservedForJobId: 'r.job_id',
      createdAt: 'p.created_at',
    });
}
