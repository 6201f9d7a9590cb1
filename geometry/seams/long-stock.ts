import type { Layout, RackPiece, SiteAccess, StockSlab } from '../core/layout';

/** Depths and lengths a slab may miss by and still count, inches: float noise, far under a kerf. */
const SLACK = 1e-6;

/** Slabs within this of the job's thickness are the same slab, inches. */
const SAME_THICKNESS = 1 / 32;

/** What can be cut whole: bought slabs as often as wanted, each rack piece once. Lengths inches, less trim. */
export interface LongStock {
  readonly slabs: readonly { readonly length: number; readonly depth: number }[];
  readonly rack: readonly { readonly length: number; readonly depth: number }[];
}

/** Slabs and rack pieces of the job's species and thickness, with the length between their trims and defects. */
export function longStock({ stock, material }: Layout): LongStock {
  const fits = (slab: StockSlab | RackPiece) =>
    (slab.species === undefined || slab.species === material.species) &&
    (slab.thickness === undefined || Math.abs(slab.thickness - material.thickness) <= SAME_THICKNESS);
  return {
    slabs: stock.slabs
      .filter((slab) => fits(slab) && slab.count !== 0)
      .map((slab) => ({ length: clearLength(slab, slab.trim ?? stock.trim), depth: slab.depth })),
    rack: stock.rack.filter(fits).map((piece) => ({ length: clearLength(piece, 0), depth: piece.depth })),
  };
}

/** Longest stretch between trims and defects that cross the whole slab; others can be ripped round. */
function clearLength(slab: StockSlab | RackPiece, trim: number): number {
  const end = slab.length - trim;
  const across = (slab.defects ?? []).filter((d) => d.y <= SLACK && d.y + d.h >= slab.depth - SLACK);
  let longest = 0;
  let from = trim;
  for (const defect of [...across].sort((a, b) => a.x - b.x)) {
    longest = Math.max(longest, Math.min(defect.x, end) - from);
    from = Math.max(from, defect.x + defect.w);
  }
  return Math.max(longest, end - from);
}

/** Deepest slab or rack piece there is; Infinity when there is no stock to go by. */
export function deepest({ slabs, rack }: LongStock): number {
  if (slabs.length + rack.length === 0) return Infinity;
  return Math.max(...slabs.map((s) => s.depth), ...(slabs.length === 0 ? rack.map((r) => r.depth) : []));
}

/** Longest piece of this depth that a bought slab gives (a rack piece where nothing is bought); Infinity without stock. */
export function longestPiece({ slabs, rack }: LongStock, depth: number): number {
  if (slabs.length + rack.length === 0) return Infinity;
  const longest = (list: LongStock['slabs']) =>
    list.reduce((most, s) => (s.depth >= depth - SLACK ? Math.max(most, s.length) : most), 0);
  return longest(slabs) || longest(rack) || Infinity;
}

/** Longest piece that passes where a rigid piece of `clearLength` passes, tipped over its end: sqrt(L^2 + t^2) at most. */
export function longestCarried({ clearLength: clear }: SiteAccess, thickness: number): number {
  if (clear === null) return Infinity;
  return Math.sqrt(Math.max(0, clear * clear - thickness * thickness));
}

/** Keeps count of the rack: a piece longer than any bought slab takes the shortest rack piece that holds it whole. */
export class WholePieces {
  private readonly rack: { length: number; depth: number }[];

  constructor(private readonly stock: LongStock) {
    this.rack = [...stock.rack].sort((a, b) => a.length - b.length);
  }

  /** Whether a piece can be cut whole; a rack piece that it needs is then spoken for. */
  take(length: number, depth: number): boolean {
    const bought = this.stock.slabs.some((s) => s.depth >= depth - SLACK && s.length >= length - SLACK);
    return bought || longestPiece(this.stock, depth) === Infinity || this.takeFromRack(length, depth);
  }

  /** Speaks for the shortest rack piece that holds a piece whole; false when there is none. */
  takeFromRack(length: number, depth: number): boolean {
    const index = this.rack.findIndex((r) => r.depth >= depth - SLACK && r.length >= length - SLACK);
    if (index < 0) return false;
    this.rack.splice(index, 1);
    return true;
  }
}
