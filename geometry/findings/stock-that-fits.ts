import type { RackPiece, StockSlab } from '../core/layout';
import type { Piece } from '../top/types';
import type { Facts } from './facts';

/** Slabs within this of the wanted thickness are the same slab, inches. */
export const SAME_THICKNESS = 1 / 32;

/** A slab the job may be cut from: what is left of its length between the trims, and its depth. */
export interface UsableSlab {
  readonly id: string;
  readonly length: number;
  readonly depth: number;
  /** null = as many as wanted. */
  readonly count: number | null;
}

/** Whether a slab is of the job's own wood and thickness. */
export function isJobStock(facts: Facts, slab: StockSlab | RackPiece): boolean {
  const { material } = facts.layout;
  return (
    (slab.species === undefined || slab.species === material.species) &&
    (slab.thickness === undefined || Math.abs(slab.thickness - material.thickness) <= SAME_THICKNESS)
  );
}

/** Slabs and rack pieces of the job's wood and thickness, trim taken off. */
export function usableSlabs(facts: Facts): readonly UsableSlab[] {
  const { stock } = facts.layout;
  const slabs = stock.slabs
    .filter((slab) => slab.count !== 0 && isJobStock(facts, slab))
    .map(({ id, length, depth, count, trim }) => ({ id, length: length - 2 * (trim ?? stock.trim), depth, count }));
  const rack = stock.rack
    .filter((piece) => isJobStock(facts, piece))
    .map(({ id, length, depth }) => ({ id, length, depth, count: 1 }));
  return [...slabs, ...rack];
}

/** Pieces cut from the job's slabs; thinner strips come from other stock. */
export const slabPieces = (facts: Facts): readonly Piece[] =>
  facts.tops.pieces.filter((piece) => Math.abs(piece.thickness - facts.layout.material.thickness) <= SAME_THICKNESS);
