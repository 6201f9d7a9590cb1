import type { JointChoice, Layout, Run } from '../core/layout';
import { toDegrees } from '../core/angle';
import { cornerJoint, type CornerJoint, type JointEnd, type RunLines } from './corner-joint';
import type { EndSide } from './run-end';
import { degrees } from './sentence';
import type { SolvedRoom } from './solved-room';
import type { LayProblem } from './types';
import type { RoomWalls, WallFrame } from './wall-frame';

/** A joint between two laid runs, before pieces have letters. */
export interface LaidJoint extends CornerJoint {
  readonly between: readonly [string, string];
  /** Standard deviation of the corner, degrees. */
  readonly cornerSd: number;
  readonly assembled: 'shop' | 'site';
}

/** Where joints end the runs, by run id, as seen from the room. */
export interface JointEnds {
  readonly left: ReadonlyMap<string, JointEnd>;
  readonly right: ReadonlyMap<string, JointEnd>;
  /** `${run id} ${side}` of the deeper run at a step: part of its end stays in view. */
  readonly stepped: ReadonlySet<string>;
}

/** Corners, degrees, between which tops can sensibly be joined. */
const SHARPEST = 60;
const WIDEST = 300;

/**
 * Joins every run that ends on a joint with the run on the neighbouring wall that does the same.
 *
 * @param lines - the runs that can be laid, by id
 * @returns the joints left to right, the ends they give, and a sentence for each joint that has no partner
 */
export function layJoints(
  layout: Layout,
  room: SolvedRoom,
  lines: ReadonlyMap<string, RunLines>,
  walls: RoomWalls,
): { readonly joints: readonly LaidJoint[]; readonly ends: JointEnds; readonly problems: readonly LayProblem[] } {
  const problems: LayProblem[] = [];
  const ends = { left: new Map<string, JointEnd>(), right: new Map<string, JointEnd>(), stepped: new Set<string>() };
  const joints: LaidJoint[] = [];
  const choices = new Map(layout.joints.map((choice) => [pairKey(...choice.between), choice]));
  const sds = new Map(room.corners.map((corner) => [corner.between.join('\u0000'), corner.sd]));
  const pairs = pairUp(layout.runs, lines, walls, problems);
  for (const [left, right] of pairs) {
    const [own, other] = [lines.get(left.id)!, lines.get(right.id)!];
    const choice = choices.get(pairKey(left.id, right.id)) ?? null;
    const joint = jointOf(own, other, choice, problems);
    if (!joint) continue;
    ends.right.set(left.id, joint.left);
    ends.left.set(right.id, joint.right);
    if (joint.kind === 'step') ends.stepped.add(left.depth > right.depth ? `${left.id} right` : `${right.id} left`);
    joints.push({
      ...joint,
      between: [left.id, right.id],
      cornerSd: sds.get(`${left.wall}\u0000${right.wall}`) ?? 0,
      assembled: choice?.assembled ?? 'shop',
    });
  }
  const met = new Set(pairs.map(([left, right]) => pairKey(left.id, right.id)));
  for (const choice of layout.joints) {
    if (!met.has(pairKey(...choice.between)))
      problems.push(badJoint(...choice.between, 'they do not meet at a corner.'));
  }
  return { joints, ends, problems };
}

/** Left-hand and right-hand run of every corner where both end on a joint. */
function pairUp(
  runs: readonly Run[],
  lines: ReadonlyMap<string, RunLines>,
  walls: RoomWalls,
  problems: LayProblem[],
): readonly (readonly [Run, Run])[] {
  const waiting = new Map<string, Run>();
  for (const run of runs) {
    if (run.left.kind !== 'joint' || !lines.has(run.id)) continue;
    const key = standKey(run.wall, run);
    if (waiting.has(key)) problems.push(alone(run, 'left', 'another run already ends at that corner'));
    else waiting.set(key, run);
  }
  const pairs: (readonly [Run, Run])[] = [];
  for (const run of runs) {
    const own = lines.get(run.id);
    if (run.right.kind !== 'joint' || !own) continue;
    const next = nextWall(own.wall, walls);
    const partner = next && waiting.get(standKey(next.id, run));
    if (!next || !partner || partner.id === run.id) {
      const why = next ? `no run on wall ${next.label} joins it` : `wall ${own.wall.label} has no neighbor there`;
      problems.push(alone(run, 'right', why));
      continue;
    }
    waiting.delete(standKey(next.id, run));
    pairs.push([run, partner]);
  }
  for (const run of waiting.values()) problems.push(alone(run, 'left', 'no run joins it there'));
  return pairs;
}

const standKey = (wall: string, run: Run): string => `${run.side ?? 'front'} ${wall}`;

const nextWall = (wall: WallFrame, walls: RoomWalls): WallFrame | null =>
  wall.next === null ? null : (walls.byIndex[wall.next] ?? null);

const pairKey = (a: string, b: string): string => (a < b ? `${a}\u0000${b}` : `${b}\u0000${a}`);

/** The joint as chosen; a plain miter, with a sentence, where the choice cannot be made. */
function jointOf(
  left: RunLines,
  right: RunLines,
  choice: JointChoice | null,
  problems: LayProblem[],
): CornerJoint | null {
  const chosen = cornerJoint(left, right, choice);
  if ('why' in chosen) {
    const plain = choice && choice.kind !== 'miter' ? cornerJoint(left, right, null) : chosen;
    const instead = 'joint' in plain ? '. A miter is laid instead.' : '.';
    problems.push(badJoint(left.id, right.id, `${chosen.why}${instead}`));
    return 'joint' in plain ? plain.joint : null;
  }
  const corner = toDegrees(chosen.joint.corner);
  if (corner < SHARPEST || corner > WIDEST) {
    problems.push({
      code: 'joint-sharp',
      severity: 'warn',
      message:
        `The corner between runs ${left.id} and ${right.id} is ${degrees(corner)}. ` +
        `Joints are meant for ${SHARPEST} to ${WIDEST} degrees: check this one on site.`,
      at: { run: left.id, joint: `${left.id}-${right.id}` },
    });
  }
  return chosen.joint;
}

function alone(run: Run, side: EndSide, why: string): LayProblem {
  return {
    code: 'joint-alone',
    message: `Run ${run.id} should end on a joint at its ${side}, but ${why}. It is cut square at the wall's end.`,
    at: { run: run.id, wall: run.wall },
  };
}

function badJoint(a: string, b: string, why: string): LayProblem {
  return {
    code: 'joint-impossible',
    message: `Runs ${a} and ${b} cannot be joined as chosen: ${why}`,
    at: { run: a, joint: `${a}-${b}` },
  };
}
