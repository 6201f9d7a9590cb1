import type { Base, Cutout, CutoutKind, Run } from '../core/layout';
import { wallLabel } from '../core/layout';
import { solvedRoom } from '../top/solved-room';
import type { LaidRun, Piece, TopJoint, TopSeam } from '../top/types';
import type { WallFrame } from '../top/wall-frame';
import { wallFrames } from '../top/wall-frame';
import type { Cabinets } from '../wood/under';
import type { FindingContext } from './context';
import type { Finding } from './types';
import { sizeText } from './words';

/** The context with what several rules ask for, worked out once. */
export interface Facts extends FindingContext, Cabinets {
  readonly walls: readonly WallFrame[];
  readonly runById: ReadonlyMap<string, Run>;
  readonly laidById: ReadonlyMap<string, LaidRun>;
  readonly runsByWall: ReadonlyMap<string, readonly LaidRun[]>;
  /** Pieces, seams and drawn cutouts of a run or island. */
  readonly piecesOn: ReadonlyMap<string, readonly Piece[]>;
  readonly seamsOn: ReadonlyMap<string, readonly TopSeam[]>;
  readonly cutoutsOn: ReadonlyMap<string, readonly Cutout[]>;
  readonly cutoutById: ReadonlyMap<string, Cutout>;
}

/** One rule: everything it finds, nothing when all is well. */
export type Rule = (facts: Facts) => readonly Finding[];

export function factsOf(context: FindingContext): Facts {
  const { layout, fit, tops } = context;
  const walls = fit ? wallFrames(solvedRoom(fit, layout.room)).byIndex.filter((wall) => wall !== undefined) : [];
  return {
    ...context,
    walls,
    wallById: new Map(walls.map((wall) => [wall.id, wall])),
    runById: new Map(layout.runs.map((run) => [run.id, run])),
    laidById: new Map(tops.runs.map((run) => [run.id, run])),
    basesByWall: groupBy(layout.bases, (base) => base.wall),
    runsByWall: groupBy(tops.runs, (run) => run.wall),
    piecesOn: groupBy(tops.pieces, (piece) => piece.on),
    seamsOn: groupBy(tops.seams, (seam) => seam.on),
    cutoutsOn: groupBy(layout.cutouts, (cutout) => cutout.on),
    cutoutById: new Map(layout.cutouts.map((cutout) => [cutout.id, cutout])),
  };
}

function groupBy<T>(items: readonly T[], keyOf: (item: T) => string): ReadonlyMap<string, readonly T[]> {
  const groups = new Map<string, T[]>();
  for (const item of items) {
    const key = keyOf(item);
    const group = groups.get(key);
    if (group) group.push(item);
    else groups.set(key, [item]);
  }
  return groups;
}

/** A length as it is read off the tape, in the layout's step: "8 1/4 in". */
export const size = (facts: Pick<Facts, 'layout'>, inches: number): string => sizeText(inches, facts.layout.step);

/** Label of a wall by its id: A, B, C … */
export function wallName(facts: Facts, id: string): string {
  const index = facts.layout.room.walls.findIndex((wall) => wall.id === id);
  return index < 0 ? id : wallLabel(index);
}

/** "A-B" for a corner between two walls. */
export const cornerName = (facts: Facts, between: readonly [string, string]): string =>
  `${wallName(facts, between[0])}-${wallName(facts, between[1])}`;

/** Letters of the pieces of a run or island. */
export const lettersOn = (facts: Facts, on: string): readonly string[] =>
  (facts.piecesOn.get(on) ?? []).map((piece) => piece.letter);

/** "the top on wall A (P, Q)", "the island (U)". */
export function runName(facts: Facts, id: string): string {
  const letters = lettersOn(facts, id).join(', ');
  const run = facts.laidById.get(id);
  return `${run ? `the top on wall ${wallName(facts, run.wall)}` : 'the island'}${letters && ` (${letters})`}`;
}

/** "Joint P to Q". */
export const jointName = (joint: Pick<TopJoint, 'letters'>): string =>
  `Joint ${joint.letters[0]} to ${joint.letters[1]}`;

const CUTOUT_WORDS: Readonly<Record<CutoutKind, string>> = {
  sink: 'sink',
  cooktop: 'cooktop',
  tap: 'tap hole',
  notch: 'notch',
  free: 'cutout',
};

/** What was typed for a cutout, or its kind: "the sink". */
export function cutoutName(
  facts: Pick<Facts, 'cutoutById'>,
  cutout: { readonly id: string; readonly kind: CutoutKind },
): string {
  const typed = facts.cutoutById.get(cutout.id)?.label;
  return typed || `the ${CUTOUT_WORDS[cutout.kind]}`;
}

/** Bases along a run's wall; none for an island. */
export const basesUnder = (facts: Facts, run: LaidRun): readonly Base[] => facts.basesByWall.get(run.wall) ?? [];

/** Ids of the walls that a joint's two runs stand on. */
export const wallsOf = (facts: Facts, joint: Pick<TopJoint, 'between'>): readonly string[] =>
  joint.between.flatMap((id) => facts.laidById.get(id)?.wall ?? []);
