import type { Layout } from '../core/layout';
import type { ShopSettings } from '../core/settings';
import type { Finding } from '../findings/types';
import type { NestError, NestInstance, NestPlan } from '../nest/types';
import type { RoomError, RoomFit } from '../room/types';
import type { PlacedCutout, Piece, TopJoint, TopSeam, Tops } from '../top/types';
import type { GettingIn } from '../top/getting-in';
import type { WallFit } from '../top/wall-fit';
import type { JointWood, Movement, ScrewChoice, Step } from '../wood/types';

/** Everything computed from a layout, the shop's settings and a nest result; stored only inside a revision. */
export interface Plan {
  readonly engine: string;
  readonly room: RoomFit | null;
  /** Why the room is not known yet; the sketch stands in for what is missing where it can. */
  readonly roomError: RoomError | null;
  /** Walls nobody has taped. */
  readonly untaped: readonly string[];
  readonly tops: Tops;
  readonly pieces: readonly (Piece & { readonly weight: number })[];
  readonly joints: readonly (TopJoint & JointWood)[];
  readonly seams: readonly TopSeam[];
  readonly cutouts: readonly PlacedCutout[];
  /** What the nest search takes for this plan. */
  readonly instance: NestInstance;
  /** Null while the nest result belongs to other pieces, or is still being searched. */
  readonly nest: NestPlan | null;
  readonly cost: {
    readonly slabs: number;
    readonly lowerBound: number;
    readonly gap: number;
    readonly proved: boolean;
  } | null;
  /** How each section that is carried as one gets into the room. */
  readonly passages: readonly GettingIn[];
  /** Scribe lines on bowed walls, and which runs slide straight back. */
  readonly wallFit: WallFit;
  readonly movement: Movement;
  readonly screws: ScrewChoice | null;
  readonly findings: readonly Finding[];
  readonly schedule: readonly Step[];
}

export interface PlanInput {
  readonly layout: Layout;
  readonly settings: ShopSettings;
  readonly nest: NestPlan | null;
  /** Why the pieces cannot be nested, when a search said so. */
  readonly nestProblem?: NestError['error'] | null;
}
