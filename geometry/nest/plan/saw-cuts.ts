import { toDegrees } from '../../core/angle';
import { FIT, SAME_SLOPE } from '../model/tolerance';
import { flattestBetween, kerfAlong } from '../row/kerf';
import type { NestCrosscut, NestRip } from '../types';
import type { Leaf, RipNode, RowLine, RowNode } from './cut-tree';
import { leafOutline } from './leaf-outline';

type Named = 'n' | 'pieces' | 'left' | 'right' | 'shared';

/** A saw cut before it has a number and the parts are known that get an edge from it. */
export type BareCut = Omit<NestCrosscut, Named> | Omit<NestRip, Named>;

/** Which side of the kerf the line to keep to is on. */
type Keep = 'near' | 'far';

/**
 * The saw cuts that take a slab apart, in order: each goes right through what lies on the bench. Crosscuts of the whole
 * slab come first, from left to right; then each section's rips, then the crosscuts of its lanes.
 */
export function sawCuts(tree: RowNode, kerf: number): BareCut[] {
  const cuts: BareCut[] = [];
  cutRow(tree, kerf, cuts);
  return cuts;
}

function cutRow(row: RowNode, kerf: number, out: BareCut[]): void {
  const half = row.depth / 2;
  const cut = (line: RowLine, keep: Keep): void => void out.push(crosscut(row, line, keep, kerf));
  row.pieces.forEach((piece, i) => {
    const before = row.pieces[i - 1];
    if (before) cutBetween(before.right, piece.left, half, kerf, cut);
    else if (!isEdge(piece.left, row.from)) cut(piece.left, 'far');
    if (i === row.pieces.length - 1 && !isEdge(piece.right, row.to)) cut(piece.right, 'near');
  });
  for (const { left, right, node } of row.pieces)
    if (node.kind === 'part' && !node.member.shape.exact) finish(node, [left, right], row, kerf, out);
  for (const { node } of row.pieces) if (node.kind === 'rips') cutLanes(node, kerf, out);
}

function crosscut(row: RowNode, { at, slope }: RowLine, keep: Keep, kerf: number): BareCut {
  const width = kerfAlong(kerf, slope);
  const near = keep === 'far' ? at - width : at;
  const lean = (slope * row.depth) / 2;
  return {
    kind: 'crosscut',
    front: near - lean,
    back: near + lean,
    frontFar: near - lean + width,
    backFar: near + lean + width,
    yFront: row.y,
    yBack: row.y + row.depth,
    angle: toDegrees(Math.atan2(1, slope)),
    kerfSide: keep === 'far' ? 'left' : 'right',
  };
}

const isEdge = (line: RowLine, x: number): boolean =>
  Math.abs(line.slope) < SAME_SLOPE && Math.abs(line.at - x) <= 2 * FIT;

/** One cut where one serves both ends; else the cut that frees both pieces first, then what is left to do on each. */
function cutBetween(
  end: RowLine,
  begin: RowLine,
  half: number,
  kerf: number,
  cut: (line: RowLine, keep: Keep) => void,
): void {
  const lean = Math.abs(end.slope - begin.slope) * half;
  const gap = begin.at - end.at + 2 * FIT;
  if (lean <= SAME_SLOPE * half && gap <= kerfAlong(kerf, end.slope) + 4 * FIT) {
    cut(end, 'near');
  } else if (gap >= lean + kerfAlong(kerf, end.slope)) {
    cut(end, 'near');
    cut(begin, 'far');
  } else if (gap >= lean + kerfAlong(kerf, begin.slope)) {
    cut(begin, 'far');
    cut(end, 'near');
  } else {
    const slope = flattestBetween(end.slope, begin.slope);
    cut({ at: end.at + Math.abs(end.slope - slope) * half, slope }, 'near');
    cut(end, 'near');
    cut(begin, 'far');
  }
}

function cutLanes(node: RipNode, kerf: number, out: BareCut[]): void {
  const rip = (line: number, keep: Keep): void => {
    const across = keep === 'far' ? line - kerf : line;
    out.push({
      kind: 'rip',
      across,
      acrossFar: across + kerf,
      from: node.from,
      to: node.to,
      angle: 0,
      kerfSide: keep === 'far' ? 'left' : 'right',
    });
  };
  let y = node.y;
  node.lanes.forEach((lane, i) => {
    const parted = lane.y - y <= kerf + 2 * FIT;
    if (i > 0) rip(y, 'near');
    if (i > 0 ? !parted : lane.y > y + 2 * FIT) rip(lane.y, 'far');
    y = lane.y + lane.depth;
  });
  if (y < node.y + node.depth - 2 * FIT) rip(y, 'near');
  for (const lane of node.lanes) cutRow(lane, kerf, out);
}

/** Cuts along those ends of a part that are not yet ends of the wood it lies in; its front and back are. */
function finish(leaf: Leaf, ends: readonly RowLine[], row: RowNode, kerf: number, out: BareCut[]): void {
  const outline = leafOutline(leaf);
  const middle = row.y + row.depth / 2;
  outline.forEach(([x, y], i) => {
    const [nx, ny] = outline[(i + 1) % outline.length]!;
    if (Math.abs(ny - y) <= FIT) return;
    const slope = (nx - x) / (ny - y);
    const at = x + slope * (middle - y);
    if (ends.some((e) => Math.abs(e.at - at) <= 2 * FIT && Math.abs(e.slope - slope) * row.depth <= 2 * FIT)) return;
    const [low, high] = ny > y ? [y, ny] : [ny, y];
    const band = { ...row, y: low, depth: high - low };
    out.push(crosscut(band, { at: (x + nx) / 2, slope }, ny > y ? 'near' : 'far', kerf));
  });
}
