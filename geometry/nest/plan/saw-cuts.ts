import { toDegrees } from '../../core/angle';
import type { Polygon } from '../../core/point';
import { FIT, SAME_SLOPE } from '../model/tolerance';
import { flattestBetween, kerfAlong } from '../row/kerf';
import type { NestCrosscut, NestCut, NestRip } from '../types';
import type { Leaf, RipNode, RowLine, RowNode } from './cut-tree';
import { leafOutline } from './leaf-outline';

/** A saw cut before it has a number; parts are named by their leaf. */
type Draft = (
  Omit<NestCrosscut, 'n' | 'pieces' | 'left' | 'right'> | Omit<NestRip, 'n' | 'pieces' | 'left' | 'right'>
) & {
  readonly near: Leaf | null;
  readonly far: Leaf | null;
};

/**
 * The saw cuts that take a slab apart, in order: each goes right through what lies on the bench. Crosscuts of the whole
 * slab come first, from left to right; then each section's rips, then the crosscuts of its lanes.
 *
 * @param names - ids and order of the leaves in the slab's list of parts
 */
export function sawCuts(
  tree: RowNode,
  kerf: number,
  names: ReadonlyMap<Leaf, { readonly index: number; readonly id: string }>,
): NestCut[] {
  const drafts: Draft[] = [];
  cutRow(tree, kerf, drafts);
  return drafts.map(({ near, far, ...cut }, i): NestCut => {
    const left = near && names.get(near)!;
    const right = far && names.get(far)!;
    const pieces = [left, right].flatMap((p) => (p ? [p.id] : []));
    return { ...cut, n: i + 1, pieces, left: left?.index ?? null, right: right?.index ?? null };
  });
}

const leafOf = (node: Leaf | RipNode): Leaf | null => (node.kind === 'part' ? node : null);

function cutRow(row: RowNode, kerf: number, out: Draft[]): void {
  const half = row.depth / 2;
  const cut = (near: Leaf | null, far: Leaf | null, line: RowLine, keep: 'near' | 'far' | 'both'): void => {
    const width = kerfAlong(kerf, line.slope);
    const at = keep === 'far' ? line.at - width : line.at;
    const lean = line.slope * half;
    out.push({
      kind: 'crosscut',
      near,
      far,
      front: at - lean,
      back: at + lean,
      frontFar: at - lean + width,
      backFar: at + lean + width,
      yFront: row.y,
      yBack: row.y + row.depth,
      angle: toDegrees(Math.atan2(1, line.slope)),
      shared: keep === 'both',
      kerfSide: keep === 'far' ? 'left' : 'right',
    });
  };
  row.pieces.forEach((piece, i) => {
    const before = row.pieces[i - 1];
    const leaf = leafOf(piece.node);
    if (before) cutBetween(before.right, leafOf(before.node), piece.left, leaf, half, kerf, cut);
    else if (!isEdge(piece.left, row.from)) cut(null, leaf, piece.left, 'far');
    if (i === row.pieces.length - 1 && !isEdge(piece.right, row.to)) cut(leaf, null, piece.right, 'near');
  });
  for (const { left, right, node } of row.pieces) {
    if (node.kind === 'rips') cutLanes(node, kerf, out);
    else if (!node.member.shape.exact || node.member.shape.depth < row.depth - FIT)
      finish(node, [left, right], row, kerf, out);
  }
}

const isEdge = (line: RowLine, x: number): boolean =>
  Math.abs(line.slope) < SAME_SLOPE && Math.abs(line.at - x) <= 2 * FIT;

/** One cut where one serves both ends; else the cut that frees both pieces first, then what is left to do on each. */
function cutBetween(
  end: RowLine,
  near: Leaf | null,
  begin: RowLine,
  far: Leaf | null,
  half: number,
  kerf: number,
  cut: (near: Leaf | null, far: Leaf | null, line: RowLine, keep: 'near' | 'far' | 'both') => void,
): void {
  const lean = Math.abs(end.slope - begin.slope) * half;
  const gap = begin.at - end.at;
  const slack = 2 * FIT;
  if (Math.abs(end.slope - begin.slope) < SAME_SLOPE && gap <= kerfAlong(kerf, end.slope) + slack) {
    cut(near, far, end, 'both');
  } else if (gap + slack >= lean + kerfAlong(kerf, end.slope)) {
    cut(near, null, end, 'near');
    cut(null, far, begin, 'far');
  } else if (gap + slack >= lean + kerfAlong(kerf, begin.slope)) {
    cut(null, far, begin, 'far');
    cut(near, null, end, 'near');
  } else {
    const slope = flattestBetween(end.slope, begin.slope);
    cut(null, null, { at: end.at + Math.abs(end.slope - slope) * half, slope }, 'near');
    cut(near, null, end, 'near');
    cut(null, far, begin, 'far');
  }
}

function cutLanes(node: RipNode, kerf: number, out: Draft[]): void {
  const rip = (across: number, near: Leaf | null, far: Leaf | null, keep: 'near' | 'far' | 'both'): void => {
    out.push(ripDraft(across, node, kerf, near, far, keep));
  };
  let y = node.y;
  let last: Leaf | null = null;
  node.lanes.forEach((lane, i) => {
    const leaf = wholeLane(lane);
    if (i > 0) {
      const shared = lane.y - y <= kerf + 2 * FIT;
      rip(y, last, shared ? leaf : null, shared ? 'both' : 'near');
      if (!shared) rip(lane.y, null, leaf, 'far');
    } else if (lane.y > y + 2 * FIT) rip(lane.y, null, leaf, 'far');
    y = lane.y + lane.depth;
    last = leaf;
  });
  if (y < node.y + node.depth - 2 * FIT) rip(y, last, null, 'near');
  for (const lane of node.lanes) cutRow(lane, kerf, out);
}

/** The part that a lane is, when it is one part from end to end. */
function wholeLane(lane: RowNode): Leaf | null {
  const [only] = lane.pieces;
  return lane.pieces.length === 1 && only && only.node.kind === 'part' ? only.node : null;
}

function ripDraft(
  line: number,
  reach: { readonly from: number; readonly to: number },
  kerf: number,
  near: Leaf | null,
  far: Leaf | null,
  keep: 'near' | 'far' | 'both',
): Draft {
  const across = keep === 'far' ? line - kerf : line;
  return {
    kind: 'rip',
    near,
    far,
    across,
    acrossFar: across + kerf,
    from: reach.from,
    to: reach.to,
    angle: 0,
    shared: keep === 'both' && near !== null && far !== null,
    kerfSide: keep === 'far' ? 'left' : 'right',
  };
}

/** Cuts along those edges of a part that are not yet edges of the wood it lies in. */
function finish(leaf: Leaf, ends: readonly RowLine[], row: RowNode, kerf: number, out: Draft[]): void {
  const outline = leafOutline(leaf);
  const middle = row.y + row.depth / 2;
  outline.forEach(([x, y], i) => {
    const [nx, ny] = outline[(i + 1) % outline.length]!;
    const rise = ny - y;
    if (Math.abs(rise) <= FIT) {
      const isTop = nx < x;
      if (Math.abs(y - (isTop ? row.y + row.depth : row.y)) <= 2 * FIT) return;
      out.push(ripDraft(y, spanOf(outline), kerf, isTop ? leaf : null, isTop ? null : leaf, isTop ? 'near' : 'far'));
      return;
    }
    const slope = (nx - x) / rise;
    const at = x + slope * (middle - y);
    if (ends.some((e) => Math.abs(e.at - at) <= 2 * FIT && Math.abs(e.slope - slope) * row.depth <= 2 * FIT)) return;
    const isRight = rise > 0;
    const width = kerfAlong(kerf, slope);
    const [low, high] = isRight
      ? ([
          [x, y],
          [nx, ny],
        ] as const)
      : ([
          [nx, ny],
          [x, y],
        ] as const);
    const shift = isRight ? 0 : -width;
    out.push({
      kind: 'crosscut',
      near: isRight ? leaf : null,
      far: isRight ? null : leaf,
      front: low[0] + shift,
      back: high[0] + shift,
      frontFar: low[0] + shift + width,
      backFar: high[0] + shift + width,
      yFront: low[1],
      yBack: high[1],
      angle: toDegrees(Math.atan2(1, slope)),
      shared: false,
      kerfSide: isRight ? 'right' : 'left',
    });
  });
}

function spanOf(outline: Polygon): { from: number; to: number } {
  const xs = outline.map((p) => p[0]);
  return { from: Math.min(...xs), to: Math.max(...xs) };
}
