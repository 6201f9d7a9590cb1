import { LinearProgram, type LpAnswer, type LpRow } from '../lp/simplex';
import { FIT } from '../model/tolerance';
import type { DepthRows } from '../row/depth-rows';
import { fillLane, type FilledLane } from './fill-lane';
import { bestLaneSet, type LanePlans } from './lane-plans';

/** Rounds of new lanes for one section; later ones change nothing that shows. */
const MOST_ROUNDS = 40;
/** Lanes remembered from one section to the next: sections of a slab need much the same ones. */
const MOST_LANES = 80;
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

  /** Limits by item, then the number of lanes of each kind, then one section. */
  function createProgram(items: readonly number[], demand: readonly number[]): LinearProgram {
    const limits: LpRow[] = items.map((i) => ({ sense: '<=', rhs: demand[i]!, penalty: 0 }));
    for (let k = 0; k < kinds; k++) limits.push({ sense: '<=', rhs: 0, penalty: 0 });
    limits.push({ sense: '<=', rhs: 1, penalty: 0 });
    const program = new LinearProgram(limits);
    for (const set of sets) {
      const rows = [items.length + kinds];
      const factors = [1];
      set.forEach((n, k) => {
        if (n <= 0) return;
        rows.push(items.length + k);
        factors.push(-n);
      });
      program.addColumn(0, rows, factors);
    }
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
    const program = createProgram(items, demand);
    const used: KnownLane[] = [];
    const rowOf = new Map<number, number>();
    items.forEach((i, row) => rowOf.set(i, row));
    const add = (lane: KnownLane): void => {
      addLane(program, lane, rowOf, items.length, value);
      used.push(lane);
    };
    for (const lane of known) if (lane.length <= room + FIT && isWanted(lane.items, value, demand)) add(lane);
    let answer = program.solve();
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
      const fresh = newLanes(best, answer, items.length, lanes);
      if (fresh.length === 0) break;
      fresh.forEach(add);
      answer = program.solve();
    }
    remember(used, answer, sets.length);
    const fractions = answer.x.slice(sets.length);
    return {
      penalty,
      bound,
      work,
      lanes: used.map((lane, n) => ({ depth: plans.depths[lane.kind]!, items: lane.items, x: fractions[n] ?? 0 })),
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
  function remember(used: readonly KnownLane[], answer: LpAnswer, offset: number): void {
    const inUse = used.filter((_, n) => (answer.x[offset + n] ?? 0) > NOTHING);
    const rest = used.filter((_, n) => !((answer.x[offset + n] ?? 0) > NOTHING));
    const others = known.filter((lane) => !used.includes(lane));
    known = [...inUse, ...rest, ...others].slice(0, MOST_LANES);
  }

  return { relax };
}

function addLane(
  program: LinearProgram,
  lane: KnownLane,
  rowOf: ReadonlyMap<number, number>,
  items: number,
  value: readonly number[],
): void {
  const rows: number[] = [];
  const factors: number[] = [];
  let worth = 0;
  for (const i of lane.items) {
    const row = rowOf.get(i)!;
    const at = rows.indexOf(row);
    worth += value[i]!;
    if (at >= 0) factors[at]!++;
    else {
      rows.push(row);
      factors.push(1);
    }
  }
  rows.push(items + lane.kind);
  factors.push(1);
  program.addColumn(-worth, rows, factors);
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

function isWanted(items: readonly number[], value: readonly number[], demand: readonly number[]): boolean {
  for (const i of items) {
    if (!(value[i]! > 0)) return false;
    let copies = 0;
    for (const j of items) if (j === i) copies++;
    if (copies > demand[i]!) return false;
  }
  return true;
}
