import type { Layout, Run, RunEnd } from '../core/layout';
import { along, scale } from '../core/vector';
import type { JointEnd, RunLines } from './corner-joint';
import { layJoints, type JointEnds, type LaidJoint } from './lay-joints';
import { outlineToRoom, SAME_POINT, stripOutline, toOwn, type Deck, type DeckEnd } from './deck';
import { layEnd, type EndSide } from './run-end';
import { runLines } from './run-lines';
import { inches } from './sentence';
import type { SolvedRoom } from './solved-room';
import type { LaidRun, LayProblem } from './types';
import { wallFrames, type RoomWalls } from './wall-frame';

export interface LaidRuns {
  readonly runs: readonly LaidRun[];
  readonly decks: readonly Deck[];
  readonly joints: readonly LaidJoint[];
  readonly problems: readonly LayProblem[];
  readonly walls: RoomWalls;
}

/** A back edge that stands this far past the last wall is seen, inches: more than an overhang. */
const PAST_WALL = 3;

/**
 * Lays every run along its wall, with its ends at the room's own angles.
 *
 * @returns the runs that could be laid, their decks (own axes), the joints between them, and a sentence for whatever
 *   could not be laid or looks wrong; nothing is dropped in silence
 */
export function layRuns(layout: Layout, room: SolvedRoom): LaidRuns {
  const walls = wallFrames(room);
  const problems: LayProblem[] = [];
  const lines = new Map<string, RunLines>();
  for (const run of layout.runs) {
    const laid = runLines(run, walls, layout, problems);
    if (laid) lines.set(run.id, laid);
  }
  const { joints, ends, problems: jointProblems } = layJoints(layout, room, lines, walls);
  problems.push(...jointProblems);
  const runs: LaidRun[] = [];
  const decks: Deck[] = [];
  for (const run of layout.runs) {
    const own = lines.get(run.id);
    if (!own) continue;
    const laid = layOne(run, own, ends, walls, layout, problems);
    if (!laid) continue;
    runs.push(laid.run);
    decks.push(laid.deck);
  }
  const standing = new Set(runs.map((run) => run.id));
  return { runs, decks, joints: joints.filter((j) => j.between.every((id) => standing.has(id))), problems, walls };
}

function layOne(
  run: Run,
  own: RunLines,
  joints: JointEnds,
  walls: RoomWalls,
  layout: Layout,
  problems: LayProblem[],
): { run: LaidRun; deck: Deck } | null {
  const endOf = (side: EndSide): JointEnd => {
    const joined = joints[side].get(run.id);
    if (joined) return joined;
    const laid = layEnd(run, own, side, walls, layout.step);
    if (laid.problem) problems.push(laid.problem);
    return laid.at;
  };
  const left = endOf('left');
  const right = endOf('right');
  if (right.back - left.back < -SAME_POINT || right.front - left.front < -SAME_POINT) {
    const edge = right.back - left.back < right.front - left.front ? 'back' : 'front';
    problems.push({
      code: 'run-too-short',
      message: `Run ${run.id} has no ${edge} edge left between its two ends: its depth of ${inches(run.depth, layout.step)} does not fit this wall.`,
      at: { run: run.id, wall: run.wall },
    });
    return null;
  }
  const deck = runDeck(run, own, left, right, joints);
  return {
    run: {
      id: run.id,
      wall: run.wall,
      back: own.back,
      front: own.front,
      depth: run.depth,
      left: run.left,
      right: run.right,
      outline: outlineToRoom(deck.frame, deck.outline),
      backFrom: left.back,
      backTo: right.back,
      frontFrom: left.front,
      frontTo: right.front,
    },
    deck,
  };
}

function runDeck(run: Run, own: RunLines, left: JointEnd, right: JointEnd, joints: JointEnds): Deck {
  const { wall, sign, standoff, depth } = own;
  const frame = {
    origin: along(wall.start, wall.inward, sign * (standoff + depth)),
    x: scale(wall.along, sign),
    y: scale(wall.inward, -sign),
  };
  const deckEnd = (end: RunEnd, at: JointEnd, side: EndSide): DeckEnd => ({
    kind: end.kind,
    back: sign * at.back,
    front: sign * at.front,
    wing: at.wing && toOwn(frame, at.wing),
    finished: end.kind === 'open' || end.kind === 'appliance' || joints.stepped.has(`${run.id} ${side}`),
    radius: end.kind === 'open' ? end.radius : 0,
  });
  const [a, b] = [deckEnd(run.left, left, 'left'), deckEnd(run.right, right, 'right')];
  const [first, last] = sign === 1 ? [a, b] : [b, a];
  const pastChainEnd =
    (wall.next === null && right.back > wall.length + PAST_WALL) || (wall.previous === null && left.back < -PAST_WALL);
  return {
    id: run.id,
    kind: 'run',
    frame,
    sign,
    depth,
    outline: stripOutline(first, last, depth),
    shape: 'strip',
    left: first,
    right: last,
    frontSeen: true,
    backSeen: pastChainEnd,
  };
}
