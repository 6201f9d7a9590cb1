import type { JointKind, RunEnd, CutoutKind } from '../core/layout';
import type { Line } from '../core/line';
import type { Point, Polygon } from '../core/point';

/** A run laid in the room, before it is cut into pieces. Room axes. */
export interface LaidRun {
  readonly id: string;
  readonly wall: string;
  /** Back line at the back gap plus the highest bump, directed left to right as seen from the room. */
  readonly back: Line;
  readonly front: Line;
  readonly depth: number;
  readonly left: RunEnd;
  readonly right: RunEnd;
  /** Whole strip between its ends, before seams and cutouts. */
  readonly outline: Polygon;
  /** Along the wall from its left end to the run's ends on the back line and on the straight part of the front line. */
  readonly backFrom: number;
  readonly backTo: number;
  readonly frontFrom: number;
  readonly frontTo: number;
}

export interface PieceEnd {
  readonly kind: RunEnd['kind'] | 'seam' | 'edge';
  /** Interior angle between the back edge and this end, degrees; under 90 the long point is at the back. */
  readonly angle: number;
  /** The end needs a finish: it is seen. */
  readonly finished: boolean;
  /** Corner radius at an open end, inches. */
  readonly radius: number;
  /** Slope of the cut through the thickness, degrees off square; 45 where a waterfall leg meets its top. */
  readonly bevel?: number;
}

/** What is cut from a slab. */
export interface Piece {
  /** Stable within a layout: run, island or strip id and the piece's number on it, left to right ("2.1"). */
  readonly key: string;
  readonly letter: string;
  readonly on: string;
  readonly kind: 'run' | 'island' | 'strip' | 'leg';
  /**
   * Room axes, counter-clockwise; ignores corner radii and cutouts. A leg is folded flat outwards from its end; a strip
   * lies below the room.
   */
  readonly outline: Polygon;
  /**
   * The same outline as it is laid out on a slab, good face up: x along the grain from 0, y from the front edge (0)
   * to the back edge (depth). `left` and `right` are its ends at small and large x: for a run on the far side of its wall
   * they are the other way round than seen from the room. With a diagonal front the lowest point is y = 0, and the
   * outline is not convex.
   */
  readonly shape: Polygon;
  /** Room place of the shape's origin, and the direction of its x axis. */
  readonly origin: Point;
  readonly grain: Point;
  /** Lengths of the back and the front edge, inches. */
  readonly back: number;
  readonly front: number;
  readonly depth: number;
  readonly thickness: number;
  readonly left: PieceEnd;
  readonly right: PieceEnd;
  /** Square inches, without radii and cutouts. */
  readonly area: number;
  /** Square inches, net of cutouts. */
  readonly netArea: number;
  readonly finishedEdges: readonly ('front' | 'back' | 'left' | 'right')[];
  /** Cutouts that touch the piece: outline in the piece's shape axes, clipped to the piece. */
  readonly cutouts: readonly { readonly id: string; readonly outline: Polygon }[];
  /** Ready-made in count (strips); 1 for all others. */
  readonly count: number;
}

export interface TopJoint {
  readonly between: readonly [string, string];
  readonly kind: JointKind | 'square' | 'step';
  /** Piece letters on the left-hand and the right-hand run. */
  readonly letters: readonly [string, string];
  /** From the back corner to the front corner, room axes. */
  readonly from: Point;
  readonly to: Point;
  readonly length: number;
  /** Interior corner angle between the back lines, degrees, and its sd (degrees). */
  readonly corner: number;
  readonly cornerSd: number;
  /** Angles between each run's back edge and the joint, degrees; at a butt joint those of both cut ends. */
  readonly angles: readonly [number, number];
  /** Opening at the far end for the corner's own sd, inches. */
  readonly openingPerSd: number;
  readonly assembled: 'shop' | 'site';
  readonly through?: string;
}

export interface TopSeam {
  readonly on: string;
  /** Along the wall from its left end. */
  readonly at: number;
  readonly from: Point;
  readonly to: Point;
  readonly letters: readonly [string, string];
  /** Inches of it that stay on the finished top. */
  readonly visible: number;
  readonly inCutout: string | null;
  readonly pinned: boolean;
  /** A seam along the grain, hardly seen: `at` is then inches from the front edge. */
  readonly edge?: true;
}

export interface PlacedCutout {
  readonly id: string;
  readonly on: string;
  readonly kind: CutoutKind;
  readonly label: string;
  /** Room axes, arcs flattened to 1/128 in; `radius` keeps the true corner. */
  readonly outline: Polygon;
  readonly radius: number;
  readonly width: number;
  readonly depth: number;
  readonly frontStrip: number;
  readonly backStrip: number;
  /** Inches of cut edge across the grain, to be sealed. */
  readonly endGrain?: number;
  readonly letters: readonly string[];
}

/** A sentence about something that cannot be laid; the rest is laid all the same. */
export interface LayProblem {
  readonly code: string;
  readonly message: string;
  readonly at: { readonly run?: string; readonly cutout?: string; readonly wall?: string; readonly joint?: string };
  /** It is laid as drawn, but somebody has to look at it; without this it has to be changed. */
  readonly severity?: 'warn';
}

/** Everything that lies in the room. */
export interface Tops {
  readonly runs: readonly LaidRun[];
  readonly pieces: readonly Piece[];
  readonly joints: readonly TopJoint[];
  readonly seams: readonly TopSeam[];
  readonly cutouts: readonly PlacedCutout[];
  readonly problems: readonly LayProblem[];
}
