import type { Run, RunEnd, Step } from '../core/layout';
import { intersect } from '../core/line';
import { along } from '../core/vector';
import { STRAIGHT_WITHIN, type JointEnd, type RunLines } from './corner-joint';
import { degrees, inches } from './sentence';
import type { LayProblem } from './types';
import { alongWall, footOn, interiorAngle, type RoomWalls, type WallFrame } from './wall-frame';
import { highestBump } from '../room/profile';

export type EndSide = 'left' | 'right';

/** An end that no joint decides, with what is wrong about it. */
export interface LaidEnd {
  readonly at: JointEnd;
  readonly kind: RunEnd['kind'];
  readonly problem: LayProblem | null;
}

/**
 * Where a run ends on its back and front line: square with an overhang (open, appliance, waterfall) or parallel to the
 * neighbouring wall at its clearance. A wall or joint end that nothing stands against is laid square at the wall's end.
 *
 * @param side - left or right as seen from the room
 */
export function layEnd(run: Run, lines: RunLines, side: EndSide, walls: RoomWalls, step: Step): LaidEnd {
  const end = run[side];
  const { wall } = lines;
  if (end.kind === 'wall') return wallEnd(run, lines, side, walls, step);
  if (end.kind === 'joint') return { at: squareAt(side === 'left' ? 0 : wall.length), kind: 'joint', problem: null };
  const from = side === 'left' ? run.from - end.overhang : alongWall(wall, run.to) + end.overhang;
  return { at: squareAt(from), kind: end.kind, problem: null };
}

const squareAt = (at: number): JointEnd => ({ back: at, front: at, wing: null });

function wallEnd(run: Run, lines: RunLines, side: EndSide, walls: RoomWalls, step: Step): LaidEnd {
  const { wall } = lines;
  const index = side === 'left' ? wall.previous : wall.next;
  const neighbour = index === null ? undefined : walls.byIndex[index];
  const fallback = squareAt(side === 'left' ? 0 : wall.length);
  const refuse = (message: string): LaidEnd => ({
    at: fallback,
    kind: 'wall',
    problem: { code: 'end-no-wall', message, at: { run: run.id, wall: wall.id } },
  });
  if (!neighbour)
    return refuse(`Run ${run.id} ends against a wall on its ${side}, but wall ${wall.label} has no neighbor there.`);
  const angle = side === 'left' ? interiorAngle(neighbour, wall) : interiorAngle(wall, neighbour);
  if (angle >= Math.PI - STRAIGHT_WITHIN) {
    const turn = degrees((angle * 180) / Math.PI);
    return refuse(
      `Run ${run.id} cannot end against wall ${neighbour.label}: the corner is ${turn}, so that wall does not stand in its way.`,
    );
  }
  const clearance = run[side].kind === 'wall' ? run[side].clearance : 0;
  const line = { origin: along(neighbour.start, neighbour.inward, clearance), direction: neighbour.along };
  const back = intersect(lines.back, line);
  const front = intersect(lines.front, line);
  if (!back || !front) return refuse(`Run ${run.id} runs along wall ${neighbour.label} and never ends against it.`);
  const at = { back: footOn(wall, back), front: footOn(wall, front), wing: null };
  return { at, kind: 'wall', problem: bumpBeside(run, lines, side, neighbour, clearance, step) };
}

/** The side wall may stick out further than the clearance where the end passes it. */
function bumpBeside(
  run: Run,
  lines: RunLines,
  side: EndSide,
  neighbour: WallFrame,
  clearance: number,
  step: Step,
): LayProblem | null {
  if (neighbour.profile.length === 0) return null;
  const reach = lines.standoff + lines.depth;
  const [from, to] = side === 'left' ? [neighbour.length - reach, neighbour.length] : [0, reach];
  const bump = highestBump(neighbour.profile, from, to);
  if (bump <= clearance) return null;
  return {
    code: 'end-touches-bump',
    severity: 'warn',
    message:
      `Wall ${neighbour.label} sticks out ${inches(bump, step)} beside run ${run.id}, ` +
      `more than the clearance of ${inches(clearance, step)}.`,
    at: { run: run.id, wall: neighbour.id },
  };
}
