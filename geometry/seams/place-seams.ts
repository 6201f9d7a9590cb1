import { extent, type Deck } from '../top/deck';
import { inches } from '../top/sentence';
import type { LayProblem } from '../top/types';
import { ripPlaces, rowsOf } from './deck-rows';
import { divide, fewest, seamPlace, seamPlaces, type SeamPlace, type Span } from './divide-row';
import { zoneAt } from './free-stretches';
import { deepest, longestPiece } from './long-stock';
import { readPins } from './pins';
import type { PlannedSeam, SeamGround, SeamPlan } from './seam-plan';
import { seamZones, visibleAt, within, type Hole, type Row, type Zone } from './seam-zones';

/** Float noise a depth may be over, inches. */
const SLACK = 1e-6;
/** More seams than lengths call for that are tried before the rules are given up. */
const MORE_SEAMS = 2;
/** Seams of neighbouring rows of an island stand at least this far apart, inches. Common practice. */
const STAGGER = 12;

/**
 * Decides where a deck is cut: along the grain where it is deeper than every slab, across it where a row is longer than
 * the longest slab or than what can be carried in, and wherever a seam is pinned.
 */
export function placeSeams(ground: SeamGround): SeamPlan {
  const { deck, holes, limits } = ground;
  const [from, to] = extent(deck);
  const slab = deepest(ground.stock);
  const tooDeep = deck.depth > slab + SLACK;
  const fromRack = tooDeep && to - from <= ground.carried && ground.whole.takeFromRack(to - from, deck.depth);
  const rips = fromRack || !tooDeep ? [] : ripPlaces(deck, slab, holes, limits);
  const problems: LayProblem[] = [];
  const seams: PlannedSeam[] = rips.map((y, i) => ({
    kind: 'edge',
    row: i + 1,
    bottom: y,
    top: y,
    at: y,
    visible: edgeVisible(deck, holes, y),
    inCutout: null,
    pinned: false,
  }));
  const longest: number[] = [];
  let before: readonly number[] = [];
  const cross = rowsOf(deck, rips).map((row, index) => {
    longest.push(fromRack ? Infinity : rowLimit(ground, row));
    const placed = placeInRow(ground, row, index, before, longest[index]!, problems);
    const pins = new Set(placed.pins);
    for (const x of placed.xs) {
      const { bottom, top } = row;
      const pinned = pins.has(x);
      seams.push({ kind: 'cross', row: index, bottom, top, at: x, ...visibleAt(row, holes, x), pinned });
    }
    before = placed.xs;
    return before;
  });
  return { cut: { rows: rips, cross }, seams, longest, problems };
}

/** Seams of one row, own x. A row that can stay whole and has no pins is not looked at. */
function placeInRow(
  ground: SeamGround,
  row: Row,
  index: number,
  before: readonly number[],
  longest: number,
  problems: LayProblem[],
): { readonly xs: readonly number[]; readonly pins: readonly number[] } {
  const pinned = index === 0 && ground.pins.length > 0;
  if (!pinned && row.to - row.from <= longest) return { xs: [], pins: [] };
  const zones = [...seamZones(row, ground.holes, ground.supports, ground.limits), ...before.map(staggerZone)];
  const pins = pinned ? readPins(ground, row, zones, problems) : [];
  return { xs: divideRow(ground, row, zones, pins, longest, problems).map(({ x }) => x), pins };
}

function staggerZone(x: number): Zone {
  return { from: x - STAGGER, to: x + STAGGER, why: within(STAGGER, 'a seam in the next row') };
}

/** Longest piece a row may be cut into, or Infinity when it can stay whole. */
function rowLimit({ stock, whole, carried }: SeamGround, row: Row): number {
  const length = row.to - row.from;
  const depth = row.top - row.bottom;
  if (length > carried) return Math.min(carried, longestPiece(stock, depth));
  return whole.take(length, depth) ? Infinity : longestPiece(stock, depth);
}

function divideRow(
  ground: SeamGround,
  row: Row,
  zones: readonly Zone[],
  pins: readonly number[],
  longest: number,
  problems: LayProblem[],
): readonly SeamPlace[] {
  const marks = [row.from, ...pins, row.to];
  const placed: SeamPlace[] = [];
  for (let i = 1; i < marks.length; i++) {
    const span = { from: marks[i - 1]!, to: marks[i]!, longest, shortest: ground.limits.shortestPiece };
    placed.push(...divideSpan(ground, row, zones, span, problems));
    if (i < marks.length - 1) placed.push(seamPlace(row, ground.holes, marks[i]!));
  }
  return placed;
}

function divideSpan(
  ground: SeamGround,
  row: Row,
  zones: readonly Zone[],
  span: Span,
  problems: LayProblem[],
): readonly SeamPlace[] {
  const least = fewest(span);
  if (least === 0) return [];
  for (let count = least; count <= least + MORE_SEAMS; count++) {
    const found = divide(span, seamPlaces(row, ground.holes, zones, span, count), count);
    if (found) return found.places;
  }
  return forced(ground, row, zones, span, least, problems);
}

/** No allowed set exists: the least bad one, and a sentence about every rule it breaks. */
function forced(
  ground: SeamGround,
  row: Row,
  zones: readonly Zone[],
  span: Span,
  least: number,
  problems: LayProblem[],
): readonly SeamPlace[] {
  const ends: Zone[] = [
    { from: -Infinity, to: row.insideFrom, why: () => '' },
    { from: row.insideTo, to: Infinity, why: () => '' },
  ];
  const open = { ...span, shortest: 0 };
  const spread = Array.from({ length: least }, (_, i) => span.from + ((span.to - span.from) * (i + 1)) / (least + 1));
  const places = seamPlaces(row, ground.holes, ends, open, least, spread).map((place) =>
    zoneAt(zones, place.x) ? { ...place, cost: place.cost + BROKEN_RULE } : place,
  );
  const found = divide(open, places, least)?.places ?? spread.map((x) => seamPlace(row, ground.holes, x));
  for (const { x } of found) {
    const zone = zoneAt(zones, x);
    problems.push({
      code: 'seam-no-place',
      severity: 'warn',
      message:
        `Top ${ground.deck.id} has to be cut, but no allowed place is left: ` +
        `the seam at ${inches(ground.deck.sign * x, ground.step)} is ${zone?.why(ground.step) ?? 'too near another seam'}.`,
      at: { run: ground.deck.id },
    });
  }
  return found;
}

/** A broken rule outweighs any length of visible seam, inches. */
const BROKEN_RULE = 1000;

/** Inches of an edge seam outside cutouts. */
function edgeVisible(deck: Deck, holes: readonly Hole[], y: number): number {
  const turned = (outline: Hole['outline']) => outline.map(([x, v]) => [v, x] as const);
  const inside = (outline: Hole['outline']) => {
    const row = { deck, bottom: -Infinity, top: Infinity, from: 0, to: 0, insideFrom: 0, insideTo: 0 };
    return visibleAt({ ...row, deck: { ...deck, shape: 'free', outline: turned(outline) } }, [], y).visible;
  };
  return holes.reduce((sum, hole) => sum - inside(hole.outline), inside(deck.outline));
}
