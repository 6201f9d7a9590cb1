import { SAME_SLOPE } from '../model/tolerance';
import { endGap } from './kerf';

/** What a row needs to know of one part at the row's own depth: mid-depth length, slopes dx/dy of its ends, allowed moves. */
export interface RowShape {
  readonly mid: number;
  readonly left: number;
  readonly right: number;
  readonly turn: boolean;
  readonly over: boolean;
}

/** A part in a row: `move` bit 1 = turned end for end, bit 2 = turned over. */
export interface RowEntry {
  readonly item: number;
  readonly move: number;
}

export interface RowGaps {
  /** Least total of all gaps of a row of these items, ends of the slab included, over all orders and allowed moves. */
  gap(items: readonly number[]): number;
  /** An order with that total, left to right. */
  arrange(items: readonly number[]): RowEntry[];
}

/** Ends of a part after a move: turning swaps them, turning over changes their signs. */
export function movedEnds(shape: RowShape, move: number): readonly [left: number, right: number] {
  const sign = move & 2 ? -1 : 1;
  return move & 1 ? [sign * shape.right, sign * shape.left] : [sign * shape.left, sign * shape.right];
}

/** The moves that make a difference to the ends, plainest first. */
export function usefulMoves(shape: RowShape): number[] {
  const moves: number[] = [];
  const seen: (readonly [number, number])[] = [];
  for (let move = 0; move < 4; move++) {
    if ((move & 1 && !shape.turn) || (move & 2 && !shape.over)) continue;
    const ends = movedEnds(shape, move);
    if (seen.some((s) => Math.abs(s[0] - ends[0]) < SAME_SLOPE && Math.abs(s[1] - ends[1]) < SAME_SLOPE)) continue;
    seen.push(ends);
    moves.push(move);
  }
  return moves;
}

interface EndClass {
  readonly moves: readonly number[];
  readonly ends: readonly (readonly [number, number])[];
}

/** Best way to go on from a state: total gap to come, and the class and move that come next (-1 at the end of the row). */
interface Step {
  readonly total: number;
  readonly next: number;
  readonly move: number;
}

/**
 * Gap totals of rows at one depth. Square parts never need more than one kerf each, so only the others are ordered; the
 * best order depends on the multiset of their end pairs alone and is remembered by it.
 *
 * @param shapes - by item index; null where the item cannot lie in this row
 * @param depth - depth of the row, inches
 */
export function createRowGaps(shapes: readonly (RowShape | null)[], depth: number, kerf: number): RowGaps {
  const half = depth / 2;
  const classes: EndClass[] = [];
  const classOf = shapes.map((shape) => (shape && !isSquare(shape) ? findClass(classes, shape) : -1));
  const steps = new Map<string, Step>();
  const totals = new Map<string, number>();

  function best(counts: number[], last: number | null): Step {
    const key = `${counts.join()}|${last}`;
    const known = steps.get(key);
    if (known) return known;
    let step: Step = { total: last === null ? 0 : Math.abs(last) * half, next: -1, move: 0 };
    let least = Infinity;
    for (let c = 0; c < classes.length; c++) {
      if (!counts[c]) continue;
      counts[c]!--;
      classes[c]!.ends.forEach(([left, right], i) => {
        const before = last === null ? Math.abs(left) * half : endGap(last, left, half, kerf);
        const total = before + best(counts, right).total;
        if (total < least - 1e-12) {
          least = total;
          step = { total, next: c, move: classes[c]!.moves[i]! };
        }
      });
      counts[c]!++;
    }
    steps.set(key, step);
    return step;
  }

  function countAngled(items: readonly number[]): number[] {
    const counts = new Array<number>(classes.length).fill(0);
    for (const i of items) if (classOf[i]! >= 0) counts[classOf[i]!]!++;
    return counts;
  }

  function gap(items: readonly number[]): number {
    const angled: number[] = [];
    for (const i of items) if (classOf[i]! >= 0) angled.push(classOf[i]!);
    if (angled.length === 0) return Math.max(0, items.length - 1) * kerf;
    const key = angled.sort((a, b) => a - b).join();
    let total = totals.get(key);
    if (total === undefined) totals.set(key, (total = best(countAngled(items), null).total));
    return total + (items.length - angled.length) * kerf;
  }

  function arrange(items: readonly number[]): RowEntry[] {
    const square = items.filter((i) => classOf[i]! < 0).map((item) => ({ item, move: 0 }));
    const waiting = items.filter((i) => classOf[i]! >= 0);
    const counts = countAngled(items);
    const row: RowEntry[] = [];
    let last: number | null = null;
    while (row.length + square.length < items.length) {
      const { next, move }: Step = best(counts, last);
      const at = waiting.findIndex((i) => classOf[i] === next);
      const item = waiting.splice(at, 1)[0]!;
      counts[next]!--;
      row.push({ item, move });
      last = movedEnds(shapes[item]!, move)[1];
    }
    if (row.length === 0) return square;
    const first = movedEnds(shapes[row[0]!.item]!, row[0]!.move)[0];
    // Square parts go where the row begins or ends squarer, so that they share their cut with a neighbour.
    return Math.abs(first) <= Math.abs(last!) ? [...square, ...row] : [...row, ...square];
  }

  return { gap, arrange };
}

const isSquare = (shape: RowShape): boolean => Math.abs(shape.left) < SAME_SLOPE && Math.abs(shape.right) < SAME_SLOPE;

function findClass(classes: EndClass[], shape: RowShape): number {
  const moves = usefulMoves(shape);
  const ends = moves.map((move) => movedEnds(shape, move));
  const found = classes.findIndex(
    (c) =>
      c.moves.join() === moves.join() &&
      c.ends.every(([l, r], i) => Math.abs(l - ends[i]![0]) < SAME_SLOPE && Math.abs(r - ends[i]![1]) < SAME_SLOPE),
  );
  if (found >= 0) return found;
  classes.push({ moves, ends });
  return classes.length - 1;
}
