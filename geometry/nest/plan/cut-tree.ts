import { movedEnds } from '../row/row-gaps';
import type { Item, Member, Problem, Stock } from '../model/problem';
import { SAME_SIZE } from '../model/tolerance';
import { isFullDepth } from '../row/item-shapes';
import { roomyGap } from '../row/kerf';
import { rowPositions, type Band, type Stretch } from '../row/row-positions';
import { isSection, type Lane, type Pattern, type Slot } from './pattern';

/** A line across a row: x at the row's mid-depth and slope dx/dy. */
export interface RowLine {
  readonly at: number;
  readonly slope: number;
}

/** A part at its place, in slab axes. */
export interface Leaf {
  readonly kind: 'part';
  readonly member: Member;
  readonly item: number;
  /** Which copy of the item on this slab, and which of its members: names the part later. */
  readonly copy: number;
  readonly memberIndex: number;
  readonly x: number;
  readonly y: number;
  readonly turned: boolean;
  readonly over: boolean;
}

export interface RipNode {
  readonly kind: 'rips';
  readonly from: number;
  readonly to: number;
  readonly y: number;
  readonly depth: number;
  readonly lanes: readonly RowNode[];
}

/** A row of pieces between two square edges, crosscut from left to right. */
export interface RowNode {
  readonly kind: 'row';
  readonly from: number;
  readonly to: number;
  readonly y: number;
  readonly depth: number;
  readonly pieces: readonly { readonly left: RowLine; readonly right: RowLine; readonly node: Leaf | RipNode }[];
}

/** The order in which one slab comes apart, from the slab down to the parts; null when the pattern does not fit its slab. */
export function cutTree(problem: Problem, pattern: Pattern): RowNode | null {
  const stock = problem.stock[pattern.stock]!;
  const copies = new Map<number, number>();
  const build = createBuilder(problem, (item) => {
    const copy = copies.get(item) ?? 0;
    copies.set(item, copy + 1);
    return copy;
  });
  const stretches = pattern.slots.map((slot) => stretchOf(problem, slot, stock.depth));
  const band = { from: stock.trim, to: stock.slab.length - stock.trim, depth: stock.depth };
  const starts = startsOf(problem, stock, stretches, band);
  if (!starts) return null;
  const edges = { from: 0, to: stock.slab.length, y: 0, depth: stock.depth };
  return build.row(edges, pattern.slots, stretches, starts);
}

/** As tight as can be where an offcut worth keeping is left; with room for fewer cuts where none is. */
function startsOf(problem: Problem, { slab }: Stock, stretches: readonly Stretch[], band: Band): number[] | null {
  const tight = rowPositions(stretches, band, problem.kerf, slab.defects);
  if (!tight || slab.defects?.length) return tight;
  const last = stretches[stretches.length - 1]!;
  const end = tight[tight.length - 1]! + last.mid + Math.abs(last.right) * (band.depth / 2);
  if (band.to - end - problem.kerf >= problem.instance.reuseMin) return tight;
  return rowPositions(stretches, band, problem.kerf, [], roomyGap) ?? tight;
}

/** How long a slot is in a row of this depth, and its ends. */
export function stretchOf(problem: Problem, slot: Slot, depth: number): Stretch {
  if (isSection(slot)) return { mid: slot.length, left: 0, right: 0 };
  const item = problem.items[slot.item]!;
  if (!isFullDepth(item, depth)) return { mid: item.box, left: 0, right: 0 };
  const [left, right] = movedEnds(item, slot.move);
  return { mid: item.mid, left, right };
}

interface Edges {
  readonly from: number;
  readonly to: number;
  readonly y: number;
  readonly depth: number;
}

function createBuilder(problem: Problem, nextCopy: (item: number) => number) {
  const { kerf, items } = problem;

  function row(
    edges: Edges,
    slots: readonly Slot[],
    stretches: readonly Stretch[],
    starts: readonly number[],
  ): RowNode {
    const pieces = slots.flatMap((slot, i): RowNode['pieces'] => {
      const { mid, left, right } = stretches[i]!;
      const start = starts[i]!;
      if (isSection(slot)) {
        const node = section({ ...edges, from: start, to: start + mid }, slot.lanes);
        return [{ left: { at: start, slope: 0 }, right: { at: start + mid, slope: 0 }, node }];
      }
      const item = items[slot.item]!;
      const copy = nextCopy(slot.item);
      if (isFullDepth(item, edges.depth)) return laidMembers(item, slot.move, copy, start, edges);
      const box = { from: start, to: start + mid, y: edges.y, depth: edges.depth };
      const inner = { ...box, depth: item.depth };
      const lane: RowNode = {
        kind: 'row',
        ...inner,
        pieces: laidMembers(item, slot.move, copy, start + startOf(item, slot.move), inner),
      };
      return [
        {
          left: { at: start, slope: left },
          right: { at: start + mid, slope: right },
          node: { kind: 'rips', ...box, lanes: [lane] },
        },
      ];
    });
    return { kind: 'row', ...edges, pieces };
  }

  function section(edges: Edges, lanes: readonly Lane[]): RipNode {
    let y = edges.y;
    const rows = lanes.map((lane): RowNode => {
      const band = { from: edges.from, to: edges.to, y, depth: lane.depth };
      y += lane.depth + kerf;
      const stretches = lane.entries.map((e) => stretchOf(problem, e, lane.depth));
      const starts = rowPositions(stretches, band, kerf);
      if (!starts) throw new RangeError('a lane is longer than its section');
      return row(band, lane.entries, stretches, starts);
    });
    return { kind: 'rips', ...edges, lanes: rows };
  }

  return { row };
}

/** From the left side of the item's box to its start at mid-depth after a move. */
function startOf(item: Item, move: number): number {
  return move & 1 ? item.box - item.start - item.mid : item.start;
}

/** Members of an item that starts at `start` (mid-depth), as pieces of a row of the item's own depth. */
function laidMembers(item: Item, move: number, copy: number, start: number, edges: Edges): RowNode['pieces'] {
  const turned = (move & 1) === 1;
  const over = (move & 2) === 2;
  const even = item.members.every((m) => Math.abs(m.shape.depth - item.depth) < SAME_SIZE);
  const pieces = item.members.map((member, memberIndex): RowNode['pieces'][number] => {
    const { shape } = member;
    const at = start + (turned ? item.mid - member.at - shape.mid : member.at);
    const x = at - (turned ? shape.length - shape.start - shape.mid : shape.start);
    // A shallower member of a turned group stands at the back: the group keeps one edge forward.
    const y = turned && !even ? edges.y + item.depth - shape.depth : edges.y;
    const [left, right] = movedEnds({ ...shape, turn: true, over: true }, move);
    const leaf: Leaf = { kind: 'part', member, item: item.index, copy, memberIndex, x, y, turned, over };
    const piece = { left: { at, slope: left }, right: { at: at + shape.mid, slope: right }, node: leaf };
    if (even) return piece;
    const box = { from: x, to: x + shape.length, y: edges.y, depth: edges.depth };
    const lane: RowNode = { kind: 'row', ...box, y, depth: shape.depth, pieces: [piece] };
    return {
      left: { at: box.from, slope: 0 },
      right: { at: box.to, slope: 0 },
      node: { kind: 'rips', ...box, lanes: [lane] },
    };
  });
  return turned ? pieces.reverse() : pieces;
}
