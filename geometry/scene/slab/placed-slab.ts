import type { Defect, Layout, RackPiece, StockSlab } from '../../core/layout';
import type { Point, Polygon } from '../../core/point';
import { boundingBox, counterClockwise } from '../../core/polygon';
import type { NestCut, NestOffcut, NestPlacement } from '../../nest/types';
import type { Plan } from '../../plan/types';
import type { Piece } from '../../top/types';

/** A piece where it lies on its slab: x from the slab's left end, y from its front edge, inches. */
export interface PlacedPiece {
  /** Place in the slab's list, as cuts name it. */
  readonly index: number;
  readonly piece: Piece;
  readonly letter: string;
  readonly outline: Polygon;
  /** The show face lies underneath. */
  readonly faceDown: boolean;
  readonly turned: boolean;
  /** Edge of the slab on whose side the piece's back edge lies; null for a piece that stands at no wall. */
  readonly wallEdge: 'front' | 'back' | null;
  readonly cutouts: readonly PlacedHole[];
}

export interface PlacedHole {
  readonly id: string;
  readonly label: string;
  readonly outline: Polygon;
  /** A seam or joint goes through it: another piece has the rest. */
  readonly part: boolean;
}

/** One slab of the plan with everything that lies on it. */
export interface PlacedSlab {
  /** Place in the plan, from 0. */
  readonly index: number;
  readonly stock: string;
  /** "slab HM-120 no. 1" or "rack 0207". */
  readonly name: string;
  readonly rack: boolean;
  readonly length: number;
  readonly depth: number;
  readonly thickness: number;
  readonly species: string;
  readonly bothFaces: boolean;
  readonly priceCents: number;
  readonly defects: readonly Defect[];
  readonly pieces: readonly PlacedPiece[];
  readonly cuts: readonly NestCut[];
  readonly offcuts: readonly NestOffcut[];
}

/**
 * Looks up what a slab of the plan is and where its pieces lie.
 *
 * @throws RangeError when the plan has no such slab, or names stock or pieces that the job does not have
 */
export function placeSlab(plan: Plan, layout: Layout, index: number): PlacedSlab {
  const slabs = plan.nest?.slabs ?? [];
  const slab = slabs[index];
  if (!slab) throw new RangeError(`the plan has ${slabs.length} slabs, no number ${index + 1}`);
  const { entry, rack } = stockEntry(layout, slab.stock);
  const before = slabs.slice(0, index).filter((other) => other.stock === slab.stock).length;
  return {
    index,
    stock: slab.stock,
    name: rack ? `rack ${slab.stock}` : `slab ${slab.stock} no. ${before + 1}`,
    rack,
    length: entry.length,
    depth: entry.depth,
    thickness: entry.thickness ?? layout.material.thickness,
    species: entry.species ?? layout.material.species,
    bothFaces: (entry.faces ?? layout.material.faces) === 'both',
    priceCents: entry.price ?? 0,
    defects: entry.defects ?? [],
    pieces: slab.parts.map((part, i) => placePiece(plan, layout, part, i)),
    cuts: slab.cuts,
    offcuts: slab.offcuts,
  };
}

function stockEntry(layout: Layout, id: string): { entry: StockSlab | RackPiece; rack: boolean } {
  const slab = layout.stock.slabs.find((s) => s.id === id);
  if (slab) return { entry: slab, rack: false };
  const piece = layout.stock.rack.find((s) => s.id === id);
  if (!piece) throw new RangeError(`the plan cuts from "${id}", which is not in stock`);
  return { entry: piece, rack: true };
}

function placePiece(plan: Plan, layout: Layout, part: NestPlacement, index: number): PlacedPiece {
  const piece = plan.pieces.find((p) => p.letter === part.id) ?? plan.pieces.find((p) => p.key === part.id);
  if (!piece) throw new RangeError(`the plan places "${part.id}", which is not a piece of the tops`);
  const move = placement(piece.shape, part);
  return {
    index,
    piece,
    letter: piece.letter,
    outline: counterClockwise(piece.shape.map(move)),
    faceDown: part.turnedOver,
    turned: part.turned,
    // Turning over mirrors front to back, and turning end for end swaps them again.
    wallEdge: piece.kind === 'run' ? (part.turnedOver === part.turned ? 'back' : 'front') : null,
    cutouts: piece.cutouts.map((cutout) => ({
      id: cutout.id,
      label: holeLabel(layout, cutout.id),
      outline: counterClockwise(cutout.outline.map(move)),
      part: plan.pieces.filter((p) => p.cutouts.some((c) => c.id === cutout.id)).length > 1,
    })),
  };
}

function holeLabel(layout: Layout, id: string): string {
  const cutout = layout.cutouts.find((c) => c.id === id);
  return cutout?.label || (cutout?.kind ?? 'cutout');
}

/** Mirror in y if turned over, then turn by 180 degrees if turned, then move the smallest corner of the shape to its place. */
function placement(shape: Polygon, part: NestPlacement): (p: Point) => Point {
  const sx = part.turned ? -1 : 1;
  const sy = part.turned !== part.turnedOver ? -1 : 1;
  const box = boundingBox(shape.map(([x, y]): Point => [x * sx, y * sy]));
  return ([x, y]) => [x * sx - box.minX + part.x, y * sy - box.minY + part.y];
}
