import type { Polygon } from '../../core/point';
import { FIT } from '../model/tolerance';
import { kerfAlong } from '../row/kerf';
import type { NestDefect, NestOffcut, NestSlab } from '../types';
import type { RipNode, RowLine, RowNode } from './cut-tree';

/** Smaller pieces of waste are not worth a line on the sheet, inches. */
const LEAST_LENGTH = 6;
const LEAST_DEPTH = 2;

/** What is left of a slab, full-depth pieces first, the longest of them leading. The trim at a factory end is never counted. */
export function offcutsOf(tree: RowNode, slab: NestSlab, trim: number, kerf: number, reuseMin: number): NestOffcut[] {
  const found: NestOffcut[] = [];
  const usable = { ...tree, from: trim, to: slab.length - trim };
  rowGaps(usable, kerf, (left, right) => {
    const outline = quad(left, right, usable);
    const [x, end] = longestClear(left, right, usable, slab.defects ?? []);
    add(found, { x, y: 0, length: end - x, depth: slab.depth, keep: end - x >= reuseMin - FIT, outline });
  });
  tree.pieces.forEach(({ node }) => node.kind === 'rips' && laneWaste(node, kerf, found));
  return found.sort((a, b) => Number(b.keep) - Number(a.keep) || b.length * b.depth - a.length * a.depth);
}

/** Length of the longest full-depth offcut that is kept, or 0. */
export const longestKept = (offcuts: readonly NestOffcut[]): number =>
  offcuts.reduce((most, o) => (o.keep ? Math.max(most, o.length) : most), 0);

function add(found: NestOffcut[], offcut: NestOffcut): void {
  if (offcut.length >= LEAST_LENGTH && offcut.depth >= LEAST_DEPTH) found.push(offcut);
}

/** Calls back with the two lines of each stretch of a row that no piece and no kerf takes. */
function rowGaps(row: RowNode, kerf: number, give: (left: RowLine, right: RowLine) => void): void {
  let left: RowLine = { at: row.from, slope: 0 };
  for (const piece of row.pieces) {
    const { slope, at } = piece.left;
    give(left, { at: at - kerfAlong(kerf, slope), slope });
    left = { at: piece.right.at + kerfAlong(kerf, piece.right.slope), slope: piece.right.slope };
  }
  give(left, { at: row.to, slope: 0 });
}

function quad(left: RowLine, right: RowLine, { y, depth }: RowNode): Polygon {
  const half = depth / 2;
  return [
    [left.at - left.slope * half, y],
    [right.at - right.slope * half, y],
    [right.at + right.slope * half, y + depth],
    [left.at + left.slope * half, y + depth],
  ];
}

/** The longest square-ended stretch between two lines that no defect touches. */
function longestClear(left: RowLine, right: RowLine, row: RowNode, defects: readonly NestDefect[]): [number, number] {
  const half = row.depth / 2;
  const from = left.at + Math.abs(left.slope) * half;
  const to = right.at - Math.abs(right.slope) * half;
  const zones = defects.filter((d) => d.x < to && d.x + d.w > from).sort((a, b) => a.x - b.x);
  let best: [number, number] = [from, from];
  let start = from;
  for (const end of [...zones.map((d) => d.x), to]) {
    if (end - start > best[1] - best[0]) best = [start, end];
    const passed = zones.filter((d) => d.x <= end).map((d) => d.x + d.w);
    start = Math.max(start, ...passed);
  }
  return best;
}

function laneWaste(node: RipNode, kerf: number, found: NestOffcut[]): void {
  const rectangle = (x: number, y: number, length: number, depth: number): void =>
    add(found, {
      x,
      y,
      length,
      depth,
      keep: false,
      outline: [
        [x, y],
        [x + length, y],
        [x + length, y + depth],
        [x, y + depth],
      ],
    });
  const last = node.lanes[node.lanes.length - 1]!;
  const top = last.y + last.depth + kerf;
  rectangle(node.from, top, node.to - node.from, node.y + node.depth - top);
  for (const lane of node.lanes) {
    const end = lane.pieces[lane.pieces.length - 1]!.right;
    const x = end.at + Math.abs(end.slope) * (lane.depth / 2) + kerf;
    rectangle(x, lane.y, lane.to - x, lane.depth);
    for (const { node: inner } of lane.pieces) if (inner.kind === 'rips') laneWaste(inner, kerf, found);
  }
}
