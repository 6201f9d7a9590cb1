import type { Layout } from '../core/layout';
import { scribeRun, type Scribe } from './scribe';
import { slideBack, type SlideBack } from './slide-back';
import type { LaidRun } from './types';
import type { RoomWalls } from './wall-frame';

/** How the runs meet their walls on the day they are set. */
export interface WallFit {
  /** Runs whose wall was read along a straight-edge, in the order of the runs. */
  readonly scribes: readonly Scribe[];
  /** Runs between two side walls. */
  readonly slides: readonly SlideBack[];
}

/** Scribe lines of the runs on bowed walls, and whether runs between two walls slide straight back. */
export function wallFit(runs: readonly LaidRun[], layout: Layout, walls: RoomWalls): WallFit {
  const drawn = new Map(layout.runs.map((run) => [run.id, run]));
  return {
    scribes: runs.flatMap((laid) => {
      const run = drawn.get(laid.id);
      const wall = walls.byId.get(laid.wall);
      if (!run || !wall || wall.profile.length === 0) return [];
      // The far side of a wall line has no backsplash.
      return [scribeRun(run, laid, wall, run.side === 'back' ? 0 : layout.fixing.backsplash)];
    }),
    slides: runs.flatMap((laid) => slideBack(laid, walls) ?? []),
  };
}
