import type { Adjustment } from './adjust-network';
import type { RoomFrame } from './room-frame';
import type { RoomObservation } from './room-observations';

/** A room that has been fitted, before it is put into words. */
export interface SolvedRoom {
  readonly frame: RoomFrame;
  /** In the fit, in the order of the adjustment's residuals. */
  readonly active: readonly RoomObservation[];
  readonly ignored: readonly RoomObservation[];
  readonly adjustment: Adjustment;
}
