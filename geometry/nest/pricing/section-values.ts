import type { Problem } from '../model/problem';
import { FIT } from '../model/tolerance';
import type { DepthRows } from '../row/depth-rows';
import { createSectionRelaxer, type RelaxedSection, type SectionRelaxer } from './section-lanes';
import { bestLaneSet, lanePlans, type LanePlans } from './lane-plans';
import { rowSizes, type RowSizes } from './row-sizes';

/**
 * Upper bounds on what a section can hold. The quick one is a table by length in which lanes are valued apart: each item once
 * in a lane, but perhaps in several lanes. The sharp one is what the relaxed section is worth.
 */
export interface SectionValues {
  readonly plans: LanePlans;
  readonly relaxer: SectionRelaxer;
  update(value: readonly number[], demand: readonly number[]): void;
  /** The quick bound for a section of at most `room`, rounded up to cells; 0 when there is no room. */
  most(room: number): number;
  /** The sharper bound; not sharper than needed to be at or under `enough`. */
  exact(room: number, enough: number): number;
  /** Penalties that prove every sharper bound given since the last update. */
  penalties(): (readonly number[])[];
  /** The relaxed section of this length for the values of the last update. */
  relaxedAt(room: number): RelaxedSection;
}

interface KnownSection {
  readonly room: number;
  readonly relaxed: RelaxedSection;
  /** The bound was worked out to the end. */
  readonly sharp: boolean;
}

interface LaneKind {
  readonly sizes: RowSizes;
  /** Items that lie in a lane of this depth. */
  readonly items: readonly number[];
}

export function createSectionValues(
  problem: Problem,
  rows: DepthRows,
  rowsAt: (depth: number) => DepthRows,
  cell: number,
  cells: number,
): SectionValues {
  const plans = lanePlans(problem, rows);
  const kinds = plans.depths.map((depth): LaneKind => {
    const lane = rowsAt(depth);
    const items = rows.shallow.filter((i) => lane.shapes[i]);
    return { items, sizes: rowSizes(lane, items, problem.kerf) };
  });
  const values = new Float64Array(cells);
  const longest = Math.max(0, ...kinds.map((k) => k.sizes.ends));
  const table = new Float64Array(cells + Math.ceil((longest + FIT) / cell) + 2);
  const byLane = kinds.map(() => new Float64Array(cells));
  const relaxer = createSectionRelaxer(plans, rowsAt, rows.shallow);
  /** Sections looked at for these values, shortest first. */
  const known: KnownSection[] = [];
  let current: { value: readonly number[]; demand: readonly number[] } = { value: [], demand: [] };

  function update(value: readonly number[], demand: readonly number[]): void {
    known.length = 0;
    current = { value, demand };
    if (kinds.length === 0) return;
    kinds.forEach(({ items, sizes }, k) => {
      fillTable(table, items, sizes.size, value, demand, cell);
      readTable(table, byLane[k]!, sizes.ends, cell);
    });
    addLanes(plans, byLane, values);
  }

  const most = (room: number): number =>
    room <= 0 ? 0 : values[Math.min(cells - 1, Math.floor((room + FIT) / cell))]!;

  /** A longer section is worth no less: what is known of one bounds this one, and its penalties are nearly right. */
  function exact(room: number, enough: number): number {
    const quick = most(room);
    if (quick <= enough) return quick;
    const at = known.findIndex((k) => k.room >= room);
    const longer = known[at];
    if (longer && longer.relaxed.bound <= enough) return Math.min(quick, longer.relaxed.bound);
    if (longer?.room === room && longer.sharp) return Math.min(quick, longer.relaxed.bound);
    const guess = (longer ?? known[known.length - 1])?.relaxed.penalty;
    const relaxed = relaxer.relax(room, current.value, current.demand, enough, guess);
    const found = { room, relaxed, sharp: relaxed.bound > enough };
    if (longer?.room === room) known[at] = found;
    else known.splice(at < 0 ? known.length : at, 0, found);
    return Math.min(quick, relaxed.bound);
  }

  function relaxedAt(room: number): RelaxedSection {
    const found = known.find((k) => k.room === room && k.sharp);
    return found?.relaxed ?? relaxer.relax(room, current.value, current.demand);
  }

  return { plans, relaxer, update, most, exact, penalties: () => known.map((k) => k.relaxed.penalty), relaxedAt };
}

/** Best total value of items, each at most `demand` times, by cells of room; sizes are rounded down, so the bound holds. */
function fillTable(
  table: Float64Array,
  items: readonly number[],
  size: readonly number[],
  value: readonly number[],
  demand: readonly number[],
  cell: number,
): void {
  table.fill(0);
  for (const i of items) {
    const worth = value[i]!;
    if (worth <= 0 || !demand[i]) continue;
    const step = Math.floor(size[i]! / cell);
    const copies = Math.min(demand[i]!, Math.ceil(table.length / Math.max(1, step)));
    for (let n = 0; n < copies; n++)
      for (let c = table.length - 1; c >= step; c--) {
        const more = table[c - step]! + worth;
        if (more > table[c]!) table[c] = more;
      }
  }
}

/** Entry q of the answer holds for every room under (q + 1) cells. */
function readTable(table: Float64Array, out: Float64Array, ends: number, cell: number): void {
  for (let q = 0; q < out.length; q++) {
    const c = Math.floor(((q + 1) * cell + FIT + ends) / cell);
    out[q] = table[Math.max(0, Math.min(table.length - 1, c))]!;
  }
}

/** What the best lanes side by side are worth, by cells of room. */
function addLanes(plans: LanePlans, byLane: readonly Float64Array[], values: Float64Array): void {
  const at = byLane.map(() => 0);
  for (let q = 0; q < values.length; q++) {
    for (let k = 0; k < at.length; k++) at[k] = byLane[k]![q]!;
    values[q] = bestLaneSet(plans, at);
  }
}
