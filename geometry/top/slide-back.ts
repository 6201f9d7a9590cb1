import type { LaidRun } from './types';
import { interiorAngle, type RoomWalls } from './wall-frame';

/** Whether a run between two side walls slides straight back into its place. Inches. */
export interface SlideBack {
  readonly run: string;
  readonly slides: boolean;
  /** How much narrower than the top the way in is at its narrowest, 0 when it slides. */
  readonly short: number;
}

/**
 * A run that ends against a wall at both ends, pushed straight back from the room. Its ends are parallel to the side walls;
 * where the walls close in towards the room, the way is narrower than the top by `q (cot tl + cot tr)` at `q` inches before
 * its place, less both clearances measured along the wall: then it has to be lowered from above.
 *
 * @returns null for a run that has not a wall at both ends: it can step aside
 */
export function slideBack(run: LaidRun, walls: RoomWalls): SlideBack | null {
  const wall = walls.byId.get(run.wall);
  if (!wall || run.left.kind !== 'wall' || run.right.kind !== 'wall' || wall.previous === null || wall.next === null) {
    return null;
  }
  const [before, after] = [walls.byIndex[wall.previous], walls.byIndex[wall.next]];
  if (!before || !after) return null;
  const left = interiorAngle(before, wall);
  const right = interiorAngle(wall, after);
  const closing = 1 / Math.tan(left) + 1 / Math.tan(right);
  const play = run.left.clearance / Math.sin(left) + run.right.clearance / Math.sin(right);
  // It is free once its back edge has passed the end of the shorter side wall.
  const reach = Math.min(before.length * Math.sin(left), after.length * Math.sin(right));
  const short = Math.max(0, closing * reach - play);
  return { run: run.id, slides: short <= TOUCH, short: short <= TOUCH ? 0 : short };
}

/** Inches; walls that are parallel but for rounding do not close in. */
const TOUCH = 1e-9;
