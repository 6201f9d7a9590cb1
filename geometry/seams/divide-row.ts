import { freeStretches, type Stretch } from './free-stretches';
import { visibleAt, type Hole, type Row, type Zone } from './seam-zones';

/** A place for a seam with what it costs: visible inches and penalties. */
export interface SeamPlace {
  readonly x: number;
  readonly visible: number;
  readonly cost: number;
}

/** A stretch of a row between two fixed places, with what a piece of it may measure. */
export interface Span {
  /** Long points of the ends, or fixed seams; own x. */
  readonly from: number;
  readonly to: number;
  readonly longest: number;
  readonly shortest: number;
}

/** Penalty for every inch off a cutout's middle, in inches of visible seam: the middle wins where all else is equal. */
const OFF_MIDDLE = 0.02;
/** A cooktop's heat and its thin strips work on a seam: as bad as these inches more of it in view. */
const AT_COOKTOP = 6;
/** Penalty for every inch a piece differs from an even share: only where nothing else decides. */
const UNEVEN = 0.002;
/** Places tried where nothing draws a seam, inches apart. */
const GRID = 4;
/** Float noise that a length may be over, inches. */
const SLACK = 1e-6;

/**
 * Places worth trying for `count` seams: the ends of every allowed stretch, the middles of cutouts, even shares, the
 * furthest each seam can stand from either end, and a grid between.
 *
 * @param extra - further places, taken where they are allowed
 */
export function seamPlaces(
  row: Row,
  holes: readonly Hole[],
  zones: readonly Zone[],
  span: Span,
  count: number,
  extra: readonly number[] = [],
): readonly SeamPlace[] {
  const [first, last] = [span.to - span.longest * count, span.from + span.longest * count];
  const free = freeStretches(zones, Math.max(span.from, first), Math.min(span.to, last));
  const xs: number[] = [...chain(free, span, count)];
  for (const [from, to] of free) {
    xs.push(from, to);
    for (let x = Math.ceil(from / GRID) * GRID; x < to; x += GRID) xs.push(x);
  }
  const even = (span.to - span.from) / (count + 1);
  const wanted = [...extra, ...holes.map(({ box }) => (box.minX + box.maxX) / 2)];
  for (let n = 1; n <= count; n++) wanted.push(Math.round(span.from + n * even));
  for (const x of wanted) if (free.some(([from, to]) => x >= from && x <= to)) xs.push(x);
  xs.sort((a, b) => a - b);
  return xs.filter((x, i) => i === 0 || x - xs[i - 1]! > SLACK).map((x) => seamPlace(row, holes, x));
}

/** Seams as far apart as they can be, from the left and from the right: if any set of `count` exists, one of these does. */
function chain(free: readonly Stretch[], { from, to, longest }: Span, count: number): readonly number[] {
  const xs: number[] = [];
  let [left, right] = [from, to];
  for (let n = 0; n < count; n++) {
    const reach = left + longest;
    const back = right - longest;
    let [next, previous] = [-Infinity, Infinity];
    for (const [a, b] of free) {
      if (a <= reach) next = Math.max(next, Math.min(b, reach));
      if (b >= back) previous = Math.min(previous, Math.max(a, back));
    }
    if (next > left) xs.push((left = next));
    if (previous < right) xs.push((right = previous));
  }
  return xs;
}

/** What a seam at x would cost. */
export function seamPlace(row: Row, holes: readonly Hole[], x: number): SeamPlace {
  const { visible, inCutout } = visibleAt(row, holes, x);
  if (!inCutout) return { x, visible, cost: visible };
  const hole = holes.find(({ cutout }) => cutout === inCutout);
  const middle = hole ? (hole.box.minX + hole.box.maxX) / 2 : x;
  const heat = inCutout.cutout.kind === 'cooktop' ? AT_COOKTOP : 0;
  return { x, visible, cost: visible + heat + OFF_MIDDLE * Math.abs(x - middle) };
}

export interface Division {
  readonly places: readonly SeamPlace[];
  readonly cost: number;
}

/**
 * Best set of exactly `count` seams, or null when none keeps every piece between its shortest and longest. Dynamic
 * programme over the places: cost grows with count x places x places within one piece's length.
 */
export function divide(span: Span, places: readonly SeamPlace[], count: number): Division | null {
  const even = (span.to - span.from) / (count + 1);
  const piece = (length: number) =>
    length > span.longest + SLACK || length < span.shortest - SLACK ? Infinity : UNEVEN * Math.abs(length - even);
  let costs = places.map((p) => p.cost + piece(p.x - span.from));
  const before: number[][] = [];
  for (let n = 1; n < count; n++) {
    const best = new Array<number>(places.length).fill(-1);
    const next = places.map((p, i) => {
      let low = Infinity;
      for (let j = i - 1; j >= 0 && p.x - places[j]!.x <= span.longest + SLACK; j--) {
        const cost = costs[j]! + piece(p.x - places[j]!.x);
        if (cost < low) [low, best[i]] = [cost, j];
      }
      return low + p.cost;
    });
    before.push(best);
    costs = next;
  }
  let last = -1;
  let cost = Infinity;
  places.forEach((p, i) => {
    const total = costs[i]! + piece(span.to - p.x);
    if (total < cost) [cost, last] = [total, i];
  });
  if (last < 0) return null;
  const chosen: SeamPlace[] = [];
  for (let n = count - 1, i = last; i >= 0; n--) {
    chosen.unshift(places[i]!);
    i = n > 0 ? before[n - 1]![i]! : -1;
  }
  return { places: chosen, cost };
}

/** Fewest seams that lengths alone call for. */
export function fewest(span: Span): number {
  if (span.longest === Infinity) return 0;
  return Math.max(0, Math.ceil((span.to - span.from - SLACK) / span.longest) - 1);
}
