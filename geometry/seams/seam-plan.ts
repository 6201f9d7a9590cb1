import type { Step } from '../core/layout';
import type { SeamLimits } from '../core/settings';
import type { Deck } from '../top/deck';
import type { DeckCut } from '../top/deck-cells';
import type { LaidCutout } from '../top/lay-cutouts';
import type { LayProblem } from '../top/types';
import type { LongStock, WholePieces } from './long-stock';
import type { Hole, Support } from './seam-zones';

/** What decides about the seams of one deck. */
export interface SeamGround {
  readonly deck: Deck;
  readonly holes: readonly Hole[];
  /** What stands along its wall; none for an island. */
  readonly supports: readonly Support[];
  /** Pinned places, inches along the wall. */
  readonly pins: readonly number[];
  readonly limits: SeamLimits;
  readonly stock: LongStock;
  readonly whole: WholePieces;
  /** Longest piece that can be carried in. */
  readonly carried: number;
  readonly step: Step;
}

/** A cross seam (own x, in one row) or an edge seam (own y). */
export interface PlannedSeam {
  readonly kind: 'cross' | 'edge';
  readonly row: number;
  /** Own y of the row's front and back edge. */
  readonly bottom: number;
  readonly top: number;
  readonly at: number;
  readonly visible: number;
  readonly inCutout: LaidCutout | null;
  readonly pinned: boolean;
}

export interface SeamPlan {
  readonly cut: DeckCut;
  readonly seams: readonly PlannedSeam[];
  /** Longest piece each row may be cut into; Infinity where it can stay whole. */
  readonly longest: readonly number[];
  readonly problems: readonly LayProblem[];
}
