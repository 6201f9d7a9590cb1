import type { Layout, Step } from '../core/layout';
import type { Polygon } from '../core/point';
import { area, boundingBox } from '../core/polygon';
import { boxPairs } from './box-pairs';
import { outlineToRoom, stripOutline, type Deck } from './deck';
import type { BarePiece } from './deck-pieces';
import { cutoutName, type LaidCutout } from './lay-cutouts';
import type { LaidRuns } from './lay-runs';
import { lengthInside, overlapDepth } from './overlap';
import { inches } from './sentence';
import type { LayProblem } from './types';
import { footOn } from './wall-frame';

/** Tops that overlap by less than this only touch, inches: far under a saw's reach, far over rounding. */
const TOUCH = 1e-4;
/** A wall may stand this far inside a top before it is in its way, inches: the clearance is typed, the wall is taped. */
const IN_THE_WAY = 1 / 64;

/** Sentences about tops that lie on each other or in a wall, and joints that are longer than the edge they lie on. */
export function checkDecks(laid: LaidRuns, decks: readonly Deck[], step: Step): readonly LayProblem[] {
  const outlines = decks.map((deck) => outlineToRoom(deck.frame, deck.outline));
  const walls = laid.walls.byIndex.flatMap((wall) => wall ?? []);
  const boxes = [...outlines, ...walls.map((wall) => [wall.start, wall.end])].map(boundingBox);
  const wallOf = new Map(laid.runs.map((run) => [run.id, run.wall]));
  const problems: LayProblem[] = [];
  for (const [i, j] of boxPairs(boxes)) {
    const deck = decks[i];
    if (!deck) continue;
    const other = decks[j];
    if (other) {
      const deep = overlapDepth(outlines[i]!, outlines[j]!);
      if (deep > TOUCH) problems.push(overlapProblem(deck, other, deep, step));
      continue;
    }
    const wall = walls[j - decks.length]!;
    if (wallOf.get(deck.id) === wall.id) continue;
    // The wing of a diagonal stands in front of the run, away from any wall.
    const body =
      deck.shape === 'strip'
        ? outlineToRoom(
            deck.frame,
            stripOutline({ ...deck.left, wing: null }, { ...deck.right, wing: null }, deck.depth),
          )
        : outlines[i]!;
    const blocked = deck.shape === 'free' ? 0 : lengthInside(body, wall.start, wall.end, IN_THE_WAY);
    if (blocked > IN_THE_WAY) {
      problems.push({
        code: 'top-in-wall',
        message: `${topName(deck)} lies across ${inches(blocked, step)} of wall ${wall.label}.`,
        at: { run: deck.id, wall: wall.id },
      });
    }
  }
  return [...problems, ...shortFaces(laid, step)];
}

const topName = (deck: Deck): string => `${deck.kind === 'island' ? 'Island' : 'Run'} ${deck.id}`;

function overlapProblem(a: Deck, b: Deck, deep: number, step: Step): LayProblem {
  return {
    code: 'tops-overlap',
    message: `${topName(a)} and ${b.kind} ${b.id} lie on each other by ${inches(Math.max(deep, 1 / 16), step)}.`,
    at: { run: a.id, joint: `${a.id}-${b.id}` },
  };
}

/** A run that goes through has to be long enough for the whole end of the other to stand against. */
function shortFaces({ joints, runs, walls }: LaidRuns, step: Step): readonly LayProblem[] {
  const byId = new Map(runs.map((run) => [run.id, run]));
  return joints.flatMap((joint): LayProblem[] => {
    const run = joint.through === undefined ? undefined : byId.get(joint.through);
    const wall = run && walls.byId.get(run.wall);
    if (!run || !wall) return [];
    const face = [footOn(wall, joint.from), footOn(wall, joint.to)] as const;
    const inside = joint.corner < Math.PI;
    const [from, to] = inside ? [run.frontFrom, run.frontTo] : [run.backFrom, run.backTo];
    const missing = Math.max(from - Math.min(...face), Math.max(...face) - to);
    if (missing <= TOUCH) return [];
    const [a, b] = joint.between;
    const other = joint.through === a ? b : a;
    const message = `Run ${run.id} is ${inches(missing, step)} too short to stand against the whole end of run ${other}.`;
    return [{ code: 'joint-short-face', message, at: { run: run.id, joint: `${a}-${b}` } }];
  });
}

/** Part of a cutout that may lie outside its pieces before it counts as over the edge, square inches. */
const OUTSIDE = 0.01;

/** Sentences about cutouts that reach past their top's edge, where they may not, or into each other. */
export function checkCutouts(
  cutouts: readonly LaidCutout[],
  pieces: readonly BarePiece[],
  layout: Layout,
): readonly LayProblem[] {
  const cutArea = new Map<string, number>();
  for (const piece of pieces) {
    for (const { id, outline } of piece.cutouts) cutArea.set(id, (cutArea.get(id) ?? 0) + area(outline));
  }
  const problems = cutouts.flatMap((laid) => edgeProblem(laid, cutArea.get(laid.id) ?? 0, layout.step));
  const rooms = cutouts.map((laid): Polygon => laid.placed.outline);
  for (const [i, j] of boxPairs(rooms.map(boundingBox))) {
    const [a, b] = [cutouts[i]!, cutouts[j]!];
    if (overlapDepth(rooms[i]!, rooms[j]!) <= TOUCH) continue;
    problems.push({
      code: 'cutouts-overlap',
      message: `${cutoutName(a.cutout)} and ${cutoutName(b.cutout)} run into each other on top ${a.deck.id}.`,
      at: { cutout: a.id, run: a.deck.id },
    });
  }
  return problems;
}

function edgeProblem({ cutout, deck, box, outline, id }: LaidCutout, inside: number, step: Step): LayProblem[] {
  const at = { cutout: id, run: deck.id };
  const name = cutoutName(cutout);
  if (inside <= OUTSIDE) return [{ code: 'cutout-off-top', message: `${name} lies off top ${deck.id}.`, at }];
  if (cutout.kind === 'notch' || cutout.kind === 'free' || cutout.mount === 'apron') return [];
  if (area(outline) - inside <= OUTSIDE) return [];
  const past = Math.max(-box.minY, box.maxY - deck.depth);
  const how =
    past > 0
      ? `reaches ${inches(past, step)} past the ${-box.minY === past ? 'front' : 'back'} edge`
      : 'reaches past the end';
  return [{ code: 'cutout-over-edge', message: `${name} ${how} of top ${deck.id}.`, at }];
}
