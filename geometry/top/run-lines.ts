import type { Layout, Run, RunEnd } from '../core/layout';
import { along } from '../core/vector';
import type { RunLines } from './corner-joint';
import { inches } from './sentence';
import type { LayProblem } from './types';
import { alongWall, type RoomWalls, type WallFrame } from './wall-frame';
import { highestBump } from '../room/profile';

/** Slack of the tape before a run counts as longer than its wall, inches. */
const WALL_SLACK = 1 / 16;

/**
 * Back and front line of a run, or null when it has none: no wall, depth or length.
 *
 * @param problems - takes the sentence that says why, and one for a run that goes past its wall
 */
export function runLines(run: Run, walls: RoomWalls, layout: Layout, problems: LayProblem[]): RunLines | null {
  const at = { run: run.id };
  const wall = walls.byId.get(run.wall);
  const refuse = (code: string, message: string) => {
    problems.push({ code, message, at: { ...at, ...(wall && { wall: wall.id }) } });
    return null;
  };
  if (!wall) return refuse('run-no-wall', `Run ${run.id} lies on wall ${run.wall}, which is not in this room.`);
  if (!(run.depth > 0)) return refuse('run-no-depth', `Run ${run.id} has no depth. Type how deep the top is.`);
  const ignoresFrom = followsCorner(run.left);
  const ignoresTo = followsCorner(run.right);
  const from = ignoresFrom ? 0 : run.from;
  const to = ignoresTo ? wall.length : alongWall(wall, run.to);
  if (!(to > from)) {
    const length = `from ${inches(from, layout.step)} to ${inches(to, layout.step)}`;
    return refuse('run-no-length', `Run ${run.id} has no length: it goes ${length} along wall ${wall.label}.`);
  }
  if (from < -WALL_SLACK || to > wall.length + WALL_SLACK) {
    const past = Math.max(-from, to - wall.length);
    refuse(
      'run-longer-than-wall',
      `Run ${run.id} goes ${inches(past, layout.step)} past the end of wall ${wall.label}, ` +
        `which is ${inches(wall.length, layout.step)} long.`,
    );
  }
  const side = run.side ?? 'front';
  const sign = side === 'back' ? -1 : 1;
  const standoff = standoffOf(run, wall);
  const offset = (off: number) => ({
    origin: along(wall.start, wall.inward, sign * off),
    direction: wall.along,
  });
  return {
    id: run.id,
    wall,
    sign,
    standoff,
    depth: run.depth,
    back: offset(standoff),
    front: offset(standoff + run.depth),
  };
}

/** How far the back edge stands off the wall line: the gap plus the highest bump along the run, inches. */
export function standoffOf(run: Run, wall: WallFrame): number {
  const from = followsCorner(run.left) ? 0 : run.from;
  const to = followsCorner(run.right) ? wall.length : alongWall(wall, run.to);
  return run.backGap + highestBump(wall.profile, from, to, run.side);
}

/** Wall and joint ends go to the corner, wherever the run was drawn to. */
const followsCorner = (end: RunEnd): boolean => end.kind === 'wall' || end.kind === 'joint';
