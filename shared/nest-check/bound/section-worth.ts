import type { BoundPart } from './bound-parts';
import { asRowPart, CLASS_FIT, createRowMeasure, type RowPart } from './row-length';

/** Copies of a part that may be cut, and what one is worth. */
export interface Offer {
  readonly part: BoundPart;
  readonly count: number;
  readonly worth: number;
}

/** Bounds what a section of a given length can be worth; at most as sharp as needed to be at or under `enough`. */
export type SectionBound = (room: number, enough: number) => number;

/**
 * Under each list of penalties (and under none) every lane is filled as well as can be by itself; the best lanes that fit
 * side by side, with the penalties brought back, bound the section. The least of these bounds is given.
 */
export function createSectionBound(
  offers: readonly Offer[],
  depth: number,
  kerf: number,
  penalties: readonly ReadonlyMap<string, number>[],
): SectionBound {
  const shallow = offers.filter((o) => o.part.depth < depth - CLASS_FIT && o.worth > 0);
  const depths = [...new Set(shallow.map((o) => o.part.depth))].sort((a, b) => a - b);
  const lanes = depths.map((d) => ({ depth: d, measure: createRowMeasure(d, kerf) }));
  const known = new Map<string, number>();

  function under(list: number, room: number): number {
    const key = `${list}/${room}`;
    const before = known.get(key);
    if (before !== undefined) return before;
    const lost = (o: Offer): number => Math.min(o.worth, list < 0 ? 0 : (penalties[list]!.get(o.part.key) ?? 0));
    const back = shallow.reduce((sum, o) => sum + o.count * lost(o), 0);
    const worth = lanes.map((lane) =>
      bestLane(
        shallow.flatMap((o) => {
          const part = asRowPart(o.part, lane.depth);
          return part && o.worth > lost(o) ? [{ part, count: o.count, worth: o.worth - lost(o) }] : [];
        }),
        room,
        lane.measure,
      ),
    );
    const bound = back + sideBySide(depths, worth, depth, kerf);
    known.set(key, bound);
    return bound;
  }

  return (room, enough) => {
    if (room <= 0 || shallow.length === 0) return 0;
    let bound = under(-1, room);
    for (let list = 0; list < penalties.length && bound > enough; list++) bound = Math.min(bound, under(list, room));
    return bound;
  };
}

interface LaneOffer {
  readonly part: RowPart;
  readonly count: number;
  readonly worth: number;
}

/** The most one lane can be worth: tries the parts with the most worth for their length first. */
function bestLane(offers: readonly LaneOffer[], room: number, measure: (parts: readonly RowPart[]) => number): number {
  const sorted = [...offers].sort((a, b) => b.worth / b.part.mid - a.worth / a.part.mid);
  let most = 0;
  const visit = (from: number, held: readonly RowPart[], worth: number, used: number): void => {
    most = Math.max(most, worth);
    for (let i = from; i < sorted.length; i++) {
      const { part, count, worth: each } = sorted[i]!;
      if (worth + ((room + CLASS_FIT - used) * each) / part.mid <= most) return;
      for (let n = 1; n <= count; n++) {
        const now = [...held, ...new Array<RowPart>(n).fill(part)];
        const length = measure(now);
        if (length > room + CLASS_FIT) break;
        visit(i + 1, now, worth + n * each, length);
      }
    }
  };
  visit(0, [], 0, 0);
  return most;
}

/** The most that lanes of these depths can be worth together within the section's depth. */
function sideBySide(depths: readonly number[], worth: readonly number[], depth: number, kerf: number): number {
  const known = new Map<string, number>();
  const fill = (from: number, free: number): number => {
    const key = `${from}/${free.toFixed(6)}`;
    const before = known.get(key);
    if (before !== undefined) return before;
    let most = 0;
    for (let k = from; k < depths.length; k++)
      if (depths[k]! <= free + CLASS_FIT) most = Math.max(most, worth[k]! + fill(k, free - depths[k]! - kerf));
    known.set(key, most);
    return most;
  };
  return fill(0, depth);
}
