import type { SeamLimits } from '../core/settings';
import type { Polygon } from '../core/point';
import { endAt, type Deck, type DeckEnd } from '../top/deck';
import { freeStretches } from './free-stretches';
import type { Hole, Row, Zone } from './seam-zones';

/** Narrowest row worth gluing on, inches. Common practice. */
const NARROWEST_ROW = 3;
/** Float noise a depth may be over, inches. */
const SLACK = 1e-6;

/**
 * Where a deck deeper than every slab is ripped, own y, rising. The front rows take the slab's whole depth; a rip keeps
 * clear of the long sides of cutouts and leaves no narrow row.
 *
 * @param deepest - depth of the deepest slab, inches; Infinity when nothing is known
 */
export function ripPlaces(deck: Deck, deepest: number, holes: readonly Hole[], limits: SeamLimits): readonly number[] {
  const count = deck.depth <= deepest + SLACK ? 1 : Math.ceil((deck.depth - SLACK) / deepest);
  const zones = holes.flatMap(({ box, cutout }): Zone[] => {
    const inside = cutout.placed.radius + limits.insideCutout;
    const why = () => 'along a cutout';
    return [
      { from: box.minY - limits.strip, to: box.minY + inside, why },
      { from: box.maxY - inside, to: box.maxY + limits.strip, why },
    ];
  });
  const rips: number[] = [];
  for (let left = count - 1; left > 0; left--) {
    const last = rips[rips.length - 1] ?? 0;
    const high = Math.min(last + deepest, deck.depth - NARROWEST_ROW);
    const low = Math.min(high, Math.max(deck.depth - deepest * left, last + NARROWEST_ROW));
    const free = freeStretches(zones, low, high);
    rips.push(free.length > 0 ? free[free.length - 1]![1] : high);
  }
  return rips;
}

/** The rows between the rips with their long and short points. */
export function rowsOf(deck: Deck, rips: readonly number[]): readonly Row[] {
  return [...rips, deck.depth].map((top, i) => {
    const bottom = rips[i - 1] ?? 0;
    if (deck.shape !== 'strip') {
      const [from, to] = bandExtent(deck.outline, bottom, top);
      return { deck, bottom, top, from, to, insideFrom: from, insideTo: to };
    }
    const left = endPoints(deck.left, deck.depth, bottom, top);
    const right = endPoints(deck.right, deck.depth, bottom, top);
    return {
      deck,
      bottom,
      top,
      from: Math.min(...left),
      to: Math.max(...right),
      insideFrom: Math.max(...left),
      insideTo: Math.min(...right),
    };
  });
}

function endPoints(end: DeckEnd, depth: number, bottom: number, top: number): readonly number[] {
  const back = endAt(end, depth, top);
  if (bottom > 0) return [back, endAt(end, depth, bottom)];
  return end.wing ? [back, end.front, end.wing[0]] : [back, end.front];
}

/** Smallest and largest x of an outline between two heights. */
function bandExtent(outline: Polygon, bottom: number, top: number): readonly [number, number] {
  let min = Infinity;
  let max = -Infinity;
  const see = (x: number) => {
    min = Math.min(min, x);
    max = Math.max(max, x);
  };
  outline.forEach((a, i) => {
    const b = outline[(i + 1) % outline.length]!;
    if (a[1] >= bottom && a[1] <= top) see(a[0]);
    for (const y of [bottom, top]) {
      if (a[1] < y !== b[1] < y) see(a[0] + ((b[0] - a[0]) * (y - a[1])) / (b[1] - a[1]));
    }
  });
  return [min, max];
}
