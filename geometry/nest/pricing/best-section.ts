import { FIT } from '../model/tolerance';
import type { Lane, Section } from '../plan/pattern';
import type { DepthRows } from '../row/depth-rows';
import { fillLane } from './fill-lane';
import type { LanePlans } from './lane-plans';
import type { SectionRelaxer } from './section-lanes';

export interface ValuedSection {
  readonly section: Section;
  readonly items: readonly number[];
  readonly value: number;
  readonly work: number;
}

/**
 * A section that really exists, of at most `room`: the relaxed section's fullest lanes first, then what the items still
 * left can give, lane by lane, until the depth is used.
 */
export function bestSection(
  plans: LanePlans,
  relaxer: SectionRelaxer,
  rowsAt: (depth: number) => DepthRows,
  shallow: readonly number[],
  room: number,
  value: readonly number[],
  demand: readonly number[],
  kerf: number,
  depth: number,
): ValuedSection | null {
  const relaxed = relaxer.relax(room, value, demand);
  const net = value.map((v, i) => Math.max(0, v - relaxed.penalty[i]!));
  const ranked = relaxed.lanes.filter((lane) => lane.x > 1e-6).sort((a, b) => b.x - a.x);
  const left = [...demand];
  const lanes: Lane[] = [];
  const items: number[] = [];
  let { work } = relaxed;
  let length = 0;
  let free = depth;

  function take(laneDepth: number, held: readonly number[]): void {
    const rows = rowsAt(laneDepth);
    held.forEach((i) => left[i]!--);
    lanes.push({ depth: laneDepth, entries: rows.arrange(held) });
    items.push(...held);
    length = Math.max(length, rows.length(held));
    free -= laneDepth + kerf;
  }

  for (const lane of ranked) if (lane.depth <= free + FIT && stillThere(lane.items, left)) take(lane.depth, lane.items);
  for (;;) {
    const offers = plans.depths
      .filter((d) => d <= free + FIT)
      .map((d) => ({ depth: d, ...fillLane(rowsAt(d), shallow, room, value, left) }))
      .filter((o) => o.items.length > 0)
      .sort((a, b) => rate(b, net, kerf) - rate(a, net, kerf) || b.value - a.value);
    work += offers.reduce((sum, o) => sum + o.work, 0);
    if (!offers[0]) break;
    take(offers[0].depth, offers[0].items);
  }
  if (lanes.length === 0) return null;
  return { section: { length, lanes }, items, value: items.reduce((sum, i) => sum + value[i]!, 0), work };
}

const rate = (lane: { depth: number; items: readonly number[] }, net: readonly number[], kerf: number): number =>
  lane.items.reduce((sum, i) => sum + net[i]!, 0) / (lane.depth + kerf);

function stillThere(items: readonly number[], left: readonly number[]): boolean {
  const need = new Map<number, number>();
  for (const i of items) need.set(i, (need.get(i) ?? 0) + 1);
  return [...need].every(([i, n]) => left[i]! >= n);
}
