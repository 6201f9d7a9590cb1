import type { Layout } from '../core/layout';
import type { ShopSettings } from '../core/settings';
import type { NestPlan } from '../nest/types';
import type { RoomFit } from '../room/types';
import type { Piece, TopJoint, Tops } from '../top/types';
import type { WallFit } from '../top/wall-fit';
import type { JointWood, Movement } from '../wood/types';

/** Whether an assembled section gets into the house. */
export interface SectionPassage {
  /** Pieces that are carried as one. */
  readonly letters: readonly string[];
  /** Why it may not, with its measure and the clear one in it, as half a sentence; null when it goes in. */
  readonly obstacle: string | null;
}

/** All that the rules look at. Nothing in it is searched for here: whoever makes the plan has it already. */
export interface FindingContext {
  readonly layout: Layout;
  readonly settings: ShopSettings;
  /** Null while the room cannot be solved; rules about walls then stay silent. */
  readonly fit: RoomFit | null;
  readonly tops: Tops;
  readonly pieces: readonly (Piece & { readonly weight: number })[];
  readonly joints: readonly (TopJoint & JointWood)[];
  readonly movement: Movement;
  /** Null while no plan belongs to these pieces. */
  readonly nest: NestPlan | null;
  /** Why the pieces cannot be nested, in a sentence; null when they can or it was not tried. */
  readonly nestProblem: { readonly code: string; readonly message: string } | null;
  readonly passages: readonly SectionPassage[];
  readonly wallFit: WallFit;
}
