import type { Layout } from '../core/layout';
import type { ShopSettings } from '../core/settings';
import type { Finding } from '../findings/types';
import type { NestPlan } from '../nest/types';
import type { RoomFit } from '../room/types';
import type { PlacedCutout, Piece, TopJoint, TopSeam, Tops } from '../top/types';
import type { JointWood, Movement, ScrewChoice, Step } from '../wood/types';

/** Everything computed from a layout, the shop's settings and a nest result; stored only inside a revision. */
export interface Plan {
  readonly engine: string;
  readonly room: RoomFit | null;
  /** Why there is no room yet; everything below is then empty. */
  readonly roomError: { readonly code: string; readonly message: string; readonly path: string } | null;
  readonly tops: Tops;
  readonly pieces: readonly (Piece & { readonly weight: number })[];
  readonly joints: readonly (TopJoint & JointWood)[];
  readonly seams: readonly TopSeam[];
  readonly cutouts: readonly PlacedCutout[];
  /** Null while the nest result belongs to other pieces, or is still being searched. */
  readonly nest: NestPlan | null;
  readonly cost: {
    readonly slabs: number;
    readonly lowerBound: number;
    readonly gap: number;
    readonly proved: boolean;
  } | null;
  readonly movement: Movement;
  readonly screws: ScrewChoice | null;
  readonly findings: readonly Finding[];
  readonly schedule: readonly Step[];
}

export interface PlanInput {
  readonly layout: Layout;
  readonly settings: ShopSettings;
  readonly nest: NestPlan | null;
}
