import { createLinearProgram, type LpRow } from '../lp/simplex';
import type { DepthRows } from '../row/depth-rows';
import { fillLane } from './fill-lane';
import { bestLaneSet, type LanePlans } from './lane-plans';

/** Rounds of new lanes for one section; later ones change nothing that shows. */
const MOST_ROUNDS = 40;

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

/**
 * The most valuable section of a length when lanes may be used in fractions but no item more often than `demand`: a linear
 * program over lanes, which are added as they are asked for.
 */
export function relaxSection(
  plans: LanePlans,
  rowsAt: (depth: number) => DepthRows,
  shallow: readonly number[],
  room: number,
  value: readonly number[],
  demand: readonly number[],
): RelaxedSection {
  const items = shallow.filter((i) => demand[i]! > 0 && value[i]! > 0);
  const rowOf = new Map(items.map((i, r) => [i, r]));
  const kinds = plans.depths.length;
  const limits: LpRow[] = [...items.map((i) => demand[i]!), ...plans.depths.map(() => 0), 1].map((rhs) => ({
    sense: '<=',
    rhs,
    penalty: 0,
  }));
  const program = createLinearProgram(limits);
  const sets =
    plans.sets ?? plans.depths.map((_, k) => plans.depths.map((__, j) => (j === k ? 1 / plans.share[k]! : 0)));
  for (const set of sets) {
    const used = set.flatMap((n, k) => (n > 0 ? [k] : []));
    program.addColumn(
      0,
      [...used.map((k) => items.length + k), items.length + kinds],
      [...used.map((k) => -set[k]!), 1],
    );
  }
  const lanes: { depth: number; items: readonly number[] }[] = [];
  let answer = program.solve();
  let work = 0;
  let bound = Infinity;
  let penalty = value;
  for (let round = 0; round < MOST_ROUNDS; round++) {
    const net = value.map(() => 0);
    items.forEach((i, r) => (net[i] = value[i]! - Math.min(value[i]!, Math.max(0, -answer.duals[r]!))));
    const back = items.reduce((sum, i) => sum + (value[i]! - net[i]!) * demand[i]!, 0);
    const best = plans.depths.map((depth) => fillLane(rowsAt(depth), items, room, net, demand));
    const proved =
      back +
      bestLaneSet(
        plans,
        best.map((lane) => lane.bound),
      );
    if (proved < bound) {
      bound = proved;
      penalty = value.map((v, i) => v - net[i]!);
    }
    let added = false;
    best.forEach((lane, k) => {
      work += lane.work;
      if (lane.value <= -answer.duals[items.length + k]! + 1e-6) return;
      const counts = new Map<number, number>();
      for (const i of lane.items) counts.set(i, (counts.get(i) ?? 0) + 1);
      const worth = lane.items.reduce((sum, i) => sum + value[i]!, 0);
      const used = [...counts.keys()];
      program.addColumn(
        -worth,
        [...used.map((i) => rowOf.get(i)!), items.length + k],
        [...used.map((i) => counts.get(i)!), 1],
      );
      lanes.push({ depth: plans.depths[k]!, items: lane.items });
      added = true;
    });
    if (!added) break;
    answer = program.solve();
  }
  const fractions = answer.x.slice(sets.length);
  return { penalty, bound, work, lanes: lanes.map((lane, n) => ({ ...lane, x: fractions[n]! })) };
}
