import type { Knex } from 'knex';

import type { Material, RackPiece, StockSlab } from '@/geometry/core/layout';
import { listRack, type RackRecord } from '../repositories/rack-repository';
import { listStock, type StockRecord } from '../repositories/stock-repository';

/** Slabs within this of the wanted thickness are the same slab, inches: what planing leaves uncertain. */
const SAME_THICKNESS = 1 / 32;

/**
 * What the shop can cut from, in the layout's words: slabs in stock and pieces of the rack that no job holds, of the
 * species and thickness asked for.
 */
export async function stockOfShop(
  trx: Knex.Transaction,
  material: Pick<Material, 'species' | 'thickness'>,
): Promise<{ slabs: StockSlab[]; rack: RackPiece[] }> {
  const fits = ({ species, thickness }: StockRecord | RackRecord) =>
    species === material.species && Math.abs(thickness - material.thickness) <= SAME_THICKNESS;
  const slabs = await listStock(trx);
  const rack = await listRack(trx);
  return {
    slabs: slabs.filter((slab) => fits(slab) && slab.count !== 0).map(toStockSlab),
    rack: rack
      .filter((piece) => fits(piece) && piece.reservedForJobId === null)
      .map(toRackPiece)
      .filter((piece) => piece.length > 0),
  };
}

/** The depth that can be used: as measured, less what straightening the edge takes. */
export function toStockSlab(slab: StockRecord): StockSlab {
  return {
    id: slab.code,
    length: slab.length,
    depth: (slab.measuredDepth ?? slab.depth) - (slab.straightening ?? 0),
    price: slab.priceCents,
    count: slab.count,
    ...(slab.trim === null ? {} : { trim: slab.trim }),
    ...wood(slab),
  };
}

export function toRackPiece(piece: RackRecord): RackPiece {
  return {
    id: piece.code,
    length: squareLength(piece),
    depth: piece.depth,
    price: piece.priceCents,
    ...wood(piece),
  };
}

/** What is left of the overall length when angled ends are cut square; 90 degrees is a square end. */
function squareLength({ length, depth, leftAngleDeg, rightAngleDeg }: RackRecord): number {
  const lost = (deg: number) => depth / Math.abs(Math.tan((deg * Math.PI) / 180));
  const ends = [leftAngleDeg, rightAngleDeg].filter((deg) => deg !== 90);
  return ends.reduce((left, deg) => left - lost(deg), length);
}

function wood(slab: StockRecord | RackRecord) {
  return {
    species: slab.species,
    thickness: slab.thickness,
    faces: slab.faces,
    ...(slab.batch ? { batch: slab.batch } : {}),
    ...(slab.defects.length > 0 ? { defects: slab.defects } : {}),
  };
}
