import { LinearProgram, type LpAnswer, type LpRow } from '../lp/simplex';
import { FIT } from '../model/tolerance';
import type { DepthRows } from '../row/depth-rows';
import { fillLane, type FilledLane } from './fill-lane';
import { bestLaneSet, type LanePlans } from './lane-plans';

/** Rounds of new lanes for one section; later ones change nothing that shows. */
const MOST_ROUNDS = 12;
/** Lanes with which a program begins, and with which it begins anew: sections need much the same ones. */
const MOST_LANES = 80;
const TOO_MANY_LANES = 160;
/** Programs kept, each for other numbers of copies. */
const MOST_PROGRAMS = 4;
/** Cents that a lane costs where it must not be used: never worth it. */
const BARRED = 1;
const NOTHING = 1e-6;

export interface LaneUse {
  readonly depth: number;
  readonly items: readonly number[];
  /** Fraction of a lane in the relaxed section. */
  readonly x: number;
}

export interface RelaxedSection {
  /** By item: what an item loses for each lane it lies in, when a section may hold each copy once. */
  readonly penalty: readonly number[];
  /** No section of this length is worth more (by the lanes' duals, so it holds even if the rounds did not suffice). */
  readonly bound: number;
  readonly lanes: readonly LaneUse[];
  readonly work: number;
}

interface KnownLane {
  readonly kind: number;
  readonly items: readonly number[];
  readonly length: number;
}

/** A linear program over lanes for certain numbers of copies; it goes on from where the last section left it. */
interface LaneProgram {
  readonly demand: readonly number[];
  readonly lp: LinearProgram;
  readonly lanes: KnownLane[];
}

export interface SectionRelaxer {
  /**
   * The most valuable section of a length when lanes may be used in fractions but no item more often than `demand`: a
   * linear program over lanes, which are added as they are asked for.
   *
   * @param enough - stops as soon as the bound is at or under this
   * @param guess - penalties to begin with, those of a section of nearly this length
   */
  relax(
    room: number,
    value: readonly number[],
    demand: readonly number[],
    enough?: number,
    guess?: readonly number[],
  ): RelaxedSection;
}

export function createSectionRelaxer(
  plans: LanePlans,
  rowsAt: (depth: number) => DepthRows,
  shallow: readonly number[],
): SectionRelaxer {
  const lanes = plans.depths.map(rowsAt);
  const kinds = lanes.length;
  const sets = plans.sets ?? lanes.map((_, k) => lanes.map((__, j) => (j === k ? 1 / plans.share[k]! : 0)));
  let known: KnownLane[] = [];
  let programs: LaneProgram[] = [];
  const rowOf = new Map(shallow.map((i, row) => [i, row]));

  /** Limits by item, then the number of lanes of each kind, then one section. */
  function createProgram(demand: readonly number[]): LaneProgram {
    const items = shallow.length;
    const limits: LpRow[] = shallow.map((i) => ({ sense: '<=', rhs: demand[i]!, penalty: 0 }));
    for (let k = 0; k < kinds; k++) limits.push({ sense: '<=', rhs: 0, penalty: 0 });
    limits.push({ sense: '<=', rhs: 1, penalty: 0 });
    const lp = new LinearProgram(limits);
    for (const set of sets) {
      const rows = [items + kinds];
      const factors = [1];
      set.forEach((n, k) => {
        if (n <= 0) return;
        rows.push(items + k);
        factors.push(-n);
      });
      lp.addColumn(0, rows, factors);
    }
    const program: LaneProgram = { demand: [...demand], lp, lanes: [] };
    for (const lane of known) if (isWithin(lane.items, demand)) addLane(program, lane, rowOf, items);
    return program;
  }

  /** The program for these copies, priced for a section of this length. */
  function programFor(room: number, value: readonly number[], demand: readonly number[]): LaneProgram {
    let program = programs.find((p) => shallow.every((i) => p.demand[i] === demand[i]));
    if (!program || program.lanes.length > TOO_MANY_LANES) {
      const old = program;
      program = createProgram(demand);
      programs = [program, ...programs.filter((p) => p !== old)].slice(0, MOST_PROGRAMS);
    }
    const { lp, lanes: added } = program;
    added.forEach((lane, n) =>
      lp.setCost(sets.length + n, lane.length <= room + FIT ? -worthOf(lane.items, value) : BARRED),
    );
    return program;
  }

  function relax(
    room: number,
    value: readonly number[],
    demand: readonly number[],
    enough = -Infinity,
    guess: readonly number[] | null = null,
  ): RelaxedSection {
    const items = shallow.filter((i) => demand[i]! > 0 && value[i]! > 0);
    if (guess) {
      const { bound, work } = underPenalty(items, room, value, demand, (i) => guess[i]!);
      if (bound <= enough) return { penalty: guess, bound, work, lanes: [] };
    }
    const program = programFor(room, value, demand);
    let answer = program.lp.solve();
    let bound = Infinity;
    let penalty = value;
    let work = 0;
    for (let round = 0; round < MOST_ROUNDS; round++) {
      const {
        best,
        bound: proved,
        ...rest
      } = underPenalty(items, room, value, demand, (i) => Math.max(0, -answer.duals[rowOf.get(i)!]!));
      work += rest.work;
      if (proved < bound) {
        bound = proved;
        penalty = rest.penalty;
      }
      if (bound <= enough) break;
      const fresh = newLanes(best, answer, shallow.length, lanes);
      if (fresh.length === 0) break;
      for (const lane of fresh) {
        const column = addLane(program, lane, rowOf, shallow.length);
        program.lp.setCost(column, -worthOf(lane.items, value));
      }
      answer = program.lp.solve();
    }
    const fractions = answer.x.slice(sets.length);
    remember(program.lanes, fractions);
    return {
      penalty,
      bound,
      work,
      lanes: program.lanes.flatMap((lane, n) =>
        fractions[n]! > NOTHING ? [{ depth: plans.depths[lane.kind]!, items: lane.items, x: fractions[n]! }] : [],
      ),
    };
  }

  /** What the best lanes are worth when items lose a penalty for each lane they lie in, and what that proves of the section. */
  function underPenalty(
    items: readonly number[],
    room: number,
    value: readonly number[],
    demand: readonly number[],
    penaltyOf: (item: number) => number,
  ): { best: FilledLane[]; bound: number; penalty: number[]; work: number } {
    const net = value.map(() => 0);
    const penalty = value.map(() => 0);
    let back = 0;
    for (const i of items) {
      const lost = Math.min(value[i]!, penaltyOf(i));
      penalty[i] = lost;
      net[i] = value[i]! - lost;
      back += lost * demand[i]!;
    }
    const best = lanes.map((rows) => fillLane(rows, items, room, net, demand));
    const worth = bestLaneSet(
      plans,
      best.map((lane) => lane.bound),
    );
    return { best, bound: back + worth, penalty, work: best.reduce((sum, lane) => sum + lane.work, 0) };
  }

  /** Lanes in use come first, so that those never used are the first to be forgotten. */
  function remember(all: readonly KnownLane[], fractions: readonly number[]): void {
    const inUse = all.filter((_, n) => fractions[n]! > NOTHING);
    const held = new Set(inUse);
    known = [...inUse, ...known.filter((lane) => !held.has(lane))].slice(0, MOST_LANES);
  }

  return { relax };
}

function addLane(
  { lp, lanes }: LaneProgram,
  lane: KnownLane,
  rowOf: ReadonlyMap<number, number>,
  items: number,
): number {
  const rows: number[] = [];
  const factors: number[] = [];
  for (const i of lane.items) {
    const row = rowOf.get(i)!;
    const at = rows.indexOf(row);
    if (at >= 0) factors[at]!++;
    else {
      rows.push(row);
      factors.push(1);
    }
  }
  rows.push(items + lane.kind);
  factors.push(1);
  lanes.push(lane);
  return lp.addColumn(BARRED, rows, factors);
}

/** What the items of a lane are worth; those worth nothing bar it, as it would be better without them. */
function worthOf(items: readonly number[], value: readonly number[]): number {
  let sum = 0;
  for (const i of items) {
    if (!(value[i]! > 0)) return -BARRED;
    sum += value[i]!;
  }
  return sum;
}

/** The lanes worth more than the program pays for one of their kind. */
function newLanes(
  best: readonly FilledLane[],
  answer: LpAnswer,
  items: number,
  lanes: readonly DepthRows[],
): KnownLane[] {
  return best.flatMap((lane, kind) =>
    lane.value > -answer.duals[items + kind]! + NOTHING
      ? [{ kind, items: lane.items, length: lanes[kind]!.length(lane.items) }]
      : [],
  );
}

function isWithin(items: readonly number[], demand: readonly number[]): boolean {
  for (const i of items) {
    let copies = 0;
    for (const j of items) if (j === i) copies++;
    if (copies > demand[i]!) return false;
  }
  return true;
}
