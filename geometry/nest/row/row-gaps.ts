import { SAME_SLOPE } from '../model/tolerance';
import { createOrderFinder, type LaidEnds } from './best-order';

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

/**
 * Gap totals of rows at one depth. Square parts never need more than one kerf each, so only the others are ordered; the
 * best order depends on the multiset of their end pairs alone and is remembered by it.
 *
 * @param shapes - by item index; null where the item cannot lie in this row
 * @param depth - depth of the row, inches
 */
export function createRowGaps(shapes: readonly (RowShape | null)[], depth: number, kerf: number): RowGaps {
  const classes: LaidEnds[][] = [];
  const classOf = shapes.map((shape) => (shape && !isSquare(shape) ? findClass(classes, shape) : -1));
  const finder = createOrderFinder(classes, depth / 2, kerf);
  const totals = new Map<number | string, number>();

  function gap(items: readonly number[]): number {
    let angled: number[] | null = null;
    for (const i of items) if (classOf[i]! >= 0) (angled ??= []).push(classOf[i]!);
    if (!angled) return Math.max(0, items.length - 1) * kerf;
    angled.sort((a, b) => a - b);
    const key = keyOf(angled);
    let total = totals.get(key);
    if (total === undefined) totals.set(key, (total = finder.total(angled)));
    return total + (items.length - angled.length) * kerf;
  }

  function arrange(items: readonly number[]): RowEntry[] {
    const square = items.filter((i) => classOf[i]! < 0).map((item) => ({ item, move: 0 }));
    const angled = items.filter((i) => classOf[i]! >= 0);
    if (angled.length === 0) return square;
    const order = finder.order(angled.map((i) => classOf[i]!));
    const row = order.map(({ place, move }): RowEntry => ({ item: angled[place]!, move }));
    const ends = row.map(({ item, move }) => movedEnds(shapes[item]!, move));
    // Square parts go where the row begins or ends squarer, so that they share their cut with a neighbour.
    return Math.abs(ends[0]![0]) <= Math.abs(ends[ends.length - 1]![1]) ? [...square, ...row] : [...row, ...square];
  }

  return { gap, arrange };
}

/** Up to six classes fit in the exact part of a number; longer lists are joined. */
function keyOf(angled: readonly number[]): number | string {
  if (angled.length > 6 || angled[angled.length - 1]! >= 255) return angled.join();
  let key = 0;
  for (const c of angled) key = key * 256 + c + 1;
  return key;
}

const isSquare = (shape: RowShape): boolean => Math.abs(shape.left) < SAME_SLOPE && Math.abs(shape.right) < SAME_SLOPE;

function findClass(classes: LaidEnds[][], shape: RowShape): number {
  const ways = usefulMoves(shape).map((move): LaidEnds => {
    const [left, right] = movedEnds(shape, move);
    return { move, left, right };
  });
  const found = classes.findIndex(
    (c) =>
      c.length === ways.length &&
      c.every(
        ({ move, left, right }, i) =>
          move === ways[i]!.move &&
          Math.abs(left - ways[i]!.left) < SAME_SLOPE &&
          Math.abs(right - ways[i]!.right) < SAME_SLOPE,
      ),
  );
  if (found >= 0) return found;
  classes.push(ways);
  return classes.length - 1;
}
