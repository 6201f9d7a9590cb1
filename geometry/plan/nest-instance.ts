import type { Layout, RackPiece, StockSlab } from '../core/layout';
import type { Polygon } from '../core/point';
import type { NestInstance, NestPart, NestSlab } from '../nest/types';
import { convexHull } from '../top/convex-hull';
import type { Piece } from '../top/types';

/** Slabs within this of the wanted thickness are the same slab, inches. */
const SAME_THICKNESS = 1 / 32;

/**
 * The slabs and pieces of a job as the nest search takes them. Its id is a fingerprint of everything in it: a plan
 * that names another id belongs to other pieces.
 *
 * @param pieces - pieces of the job's own thickness and species; thinner strips (a backsplash) come from other stock
 */
export function nestInstanceOf(layout: Layout, pieces: readonly Piece[]): NestInstance {
  const { stock, material } = layout;
  const fits = (slab: StockSlab | RackPiece) =>
    (slab.species === undefined || slab.species === material.species) &&
    (slab.thickness === undefined || Math.abs(slab.thickness - material.thickness) <= SAME_THICKNESS);
  const oneFace = (slab: StockSlab | RackPiece) => (slab.faces ?? material.faces) === 'one';
  const slabs = [
    ...stock.slabs.filter((slab) => fits(slab) && slab.count !== 0).map((slab) => slabOf(slab, slab.count, slab.price)),
    ...stock.rack.filter(fits).map((piece) => ({ ...slabOf(piece, 1, piece.price ?? 0), trim: 0 })),
  ];
  // A slab with one good face forbids turning over wherever it is used; the plan does not know the slab beforehand.
  const mayTurnOver =
    stock.turnOver && material.faces === 'both' && ![...stock.slabs, ...stock.rack].filter(fits).some(oneFace);
  const parts = pieces.filter((piece) => Math.abs(piece.thickness - material.thickness) <= SAME_THICKNESS);
  const body = {
    kerf: stock.kerf,
    trim: stock.trim,
    reuseMin: stock.reuseMin,
    stock: slabs,
    parts: parts.map((piece) => partOf(piece, stock.turn, mayTurnOver)),
    ...(stock.grainMatch && { groups: groupsOf(parts) }),
  };
  const rounded = { ...body, parts: body.parts.map((part) => ({ ...part, outline: roundedRing(part.outline) })) };
  return { id: fingerprint(JSON.stringify(rounded)), ...body };
}

function slabOf(slab: StockSlab | RackPiece, count: number | null, price: number): NestSlab {
  const trim = 'trim' in slab ? slab.trim : undefined;
  return {
    id: slab.id,
    length: slab.length,
    depth: slab.depth,
    price,
    count,
    ...(trim !== undefined && { trim }),
    ...(slab.defects && slab.defects.length > 0 && { defects: slab.defects.map(({ x, y, w, h }) => ({ x, y, w, h })) }),
  };
}

function partOf(piece: Piece, turn: boolean, turnOver: boolean): NestPart {
  return {
    id: piece.letter,
    ...(piece.count > 1 && { count: piece.count }),
    // A diagonal front or an inner corner is cut after the piece: it lies on the slab as its convex hull.
    outline: convexHull(piece.shape),
    turn,
    turnOver,
  };
}

/** Grain match: pieces of one run lie next to each other, so that the staves run on through the seam. */
function groupsOf(pieces: readonly Piece[]): { id: string; parts: string[] }[] {
  const byRun = new Map<string, string[]>();
  for (const piece of pieces) {
    if (piece.kind !== 'run') continue;
    byRun.set(piece.on, [...(byRun.get(piece.on) ?? []), piece.letter]);
  }
  return [...byRun].filter(([, parts]) => parts.length > 1).map(([id, parts]) => ({ id, parts }));
}

/** Engines of browsers and servers differ in the last bits of a sine: far below any saw, inches. */
const FINGERPRINT_STEP = 1e-5;

/** The outline on a coarse grid, from its leftmost lowest corner on: the same text on every machine. */
function roundedRing(outline: Polygon): readonly (readonly number[])[] {
  const grid = outline.map((point) => point.map((value) => Math.round(value / FINGERPRINT_STEP)));
  const before = (a: readonly number[], b: readonly number[]) => a[0]! - b[0]! || a[1]! - b[1]!;
  const first = grid.reduce((least, point, i) => (before(point, grid[least]!) < 0 ? i : least), 0);
  return [...grid.slice(first), ...grid.slice(0, first)];
}

/** 64-bit FNV-1a of a text, in hex: enough to tell two nests apart, not a defence against anybody. */
export function fingerprint(text: string): string {
  let high = 0xcbf29ce4;
  let low = 0x84222325;
  for (let i = 0; i < text.length; i++) {
    low ^= text.charCodeAt(i);
    // Multiply by the FNV prime 2^40 + 0x1b3 in two 32-bit halves.
    const l = low >>> 0;
    const shifted = (l << 8) >>> 0;
    const product = l * 0x1b3;
    high = (Math.imul(high, 0x1b3) + shifted + Math.floor(product / 0x100000000)) >>> 0;
    low = product >>> 0;
  }
  return high.toString(16).padStart(8, '0') + (low >>> 0).toString(16).padStart(8, '0');
}
