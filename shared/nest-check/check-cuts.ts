import type { Point, Polygon } from '@/geometry/core/point';
import type { NestCut, NestInstance, NestPlanSlab, NestSlab } from '@/geometry/nest/types';
import { CHECK_TOLERANCE as E, type NestFinding, type NestFindingCode } from './finding';
import { isLaid, type LaidPart } from './laid-part';
import { areaOf, beyond, clip, edgesOf, flip, type HalfPlane, leftOf, mostBeyond, spanOf } from './polygons';

/** The two sides of a kerf: what stays on the near side (left, front) and what on the far side. */
interface Sides {
  readonly near: HalfPlane;
  readonly far: HalfPlane;
  /** Middle of the line to keep to: it lies in the wood that is cut. */
  readonly keep: Point;
}

/** Saws the slab in thought, cut by cut, and looks at what each piece of wood has become in the end. */
export function checkCuts(
  instance: NestInstance,
  slab: NestPlanSlab,
  stock: NestSlab,
  laid: readonly (LaidPart | null)[],
  index: number,
): NestFinding[] {
  const found: NestFinding[] = [];
  const say = (code: NestFindingCode, text: string): void => {
    found.push({ code, slab: index, text: `Slab ${index + 1} (${stock.id}): ${text}` });
  };
  let wood: Polygon[] = [[[0, 0], [stock.length, 0], [stock.length, stock.depth], [0, stock.depth]]]; // prettier-ignore
  let ripped = false;
  slab.cuts.forEach((cut, i) => {
    if (cut.n !== i + 1) say('cut_numbering', `cut ${i + 1} is numbered ${cut.n}.`);
    checkCutItself(cut, instance.kerf, say);
    const sides = sidesOf(cut);
    const blank = wood.find((piece) => edgesOf(piece).every(([p, q]) => beyond(leftOf(p, q), sides.keep) <= E));
    if (!blank) return say('cut_misses_wood', `cut ${cut.n} does not go through any piece that is left.`);
    const { minX, maxX, minY, maxY } = spanOf(blank);
    const wholeDepth = minY <= E && maxY >= stock.depth - E;
    if (cut.kind === 'rip') ripped = true;
    else if (ripped && wholeDepth) say('crosscut_after_rip', `cut ${cut.n} crosscuts the whole depth after a rip.`);
    if (cut.kind === 'rip' && (cut.from > minX + E || cut.to < maxX - E))
      say('cut_too_short', `cut ${cut.n} does not go right through the piece on the bench.`);
    if (cut.kind === 'crosscut' && (cut.yFront < minY - E || cut.yBack > maxY + E))
      say('cut_too_short', `cut ${cut.n} is marked beyond the edges of the piece on the bench.`);
    for (const part of laid.filter(isLaid)) {
      if (!within(part.outline, blank)) continue;
      if (mostBeyond(sides.near, part.outline) > E && mostBeyond(sides.far, part.outline) > E)
        say('cut_through_part', `cut ${cut.n} goes through part ${part.part.id}.`);
    }
    wood = wood.flatMap((piece) => (piece === blank ? [clip(piece, sides.near), clip(piece, sides.far)] : [piece]));
    wood = wood.filter((piece) => areaOf(piece) > E * E);
    checkNames(cut, laid, sides, say);
  });
  checkOutcome(wood, laid.filter(isLaid), say);
  checkOffcuts(instance, slab, stock, wood, laid.filter(isLaid), say);
  return found;
}

type Say = (code: NestFindingCode, text: string) => void;

function checkCutItself(cut: NestCut, kerf: number, say: Say): void {
  if (cut.kind === 'rip') {
    if (Math.abs(cut.acrossFar - cut.across - kerf) > E) say('cut_wrong_width', `cut ${cut.n} is not one kerf wide.`);
    return;
  }
  const rise = cut.yBack - cut.yFront;
  const run = cut.back - cut.front;
  const width = ((cut.frontFar - cut.front) * rise) / Math.hypot(rise, run);
  if (Math.abs(width - kerf) > E || Math.abs(cut.backFar - cut.frontFar - run) > E)
    say('cut_wrong_width', `cut ${cut.n} is not one kerf wide.`);
  if (Math.abs((Math.atan2(rise, run) * 180) / Math.PI - cut.angle) > 0.01)
    say('cut_wrong_angle', `cut ${cut.n} says ${cut.angle} degrees and its marks say otherwise.`);
}

function sidesOf(cut: NestCut): Sides {
  const [a, b, c, d]: Point[] =
    cut.kind === 'rip'
      ? [[cut.to, cut.across], [cut.from, cut.across], [cut.to, cut.acrossFar], [cut.from, cut.acrossFar]] // prettier-ignore
      : [[cut.front, cut.yFront], [cut.back, cut.yBack], [cut.frontFar, cut.yFront], [cut.backFar, cut.yBack]]; // prettier-ignore
  const [p, q] = cut.kerfSide === 'right' ? [a!, b!] : [c!, d!];
  return { near: leftOf(a!, b!), far: flip(leftOf(c!, d!)), keep: [(p[0] + q[0]) / 2, (p[1] + q[1]) / 2] };
}

const within = (inner: Polygon, outer: Polygon): boolean =>
  edgesOf(outer).every(([p, q]) => mostBeyond(leftOf(p, q), inner) <= E);

/** An edge of the part lies on the edge of this side of the kerf. */
const hasEdgeOn = (plane: HalfPlane, part: LaidPart): boolean =>
  edgesOf(part.outline).some(([p, q]) => Math.abs(beyond(plane, p)) <= 2 * E && Math.abs(beyond(plane, q)) <= 2 * E);

function checkNames(cut: NestCut, laid: readonly (LaidPart | null)[], { near, far }: Sides, say: Say): void {
  const left = cut.left === null ? null : laid[cut.left];
  const right = cut.right === null ? null : laid[cut.right];
  const wrong =
    (cut.left !== null && !(left && hasEdgeOn(near, left))) ||
    (cut.right !== null && !(right && hasEdgeOn(far, right)));
  const named = [left, right].flatMap((p) => (p ? [p.part.id] : []));
  if (wrong || named.some((id) => !cut.pieces.includes(id)))
    say('cut_names_wrong_piece', `cut ${cut.n} names a part that gets no edge from it.`);
  else if (cut.shared !== (left !== null && right !== null))
    say('cut_shared_wrong', `cut ${cut.n} is ${cut.shared ? '' : 'not '}called shared.`);
}

function checkOutcome(wood: readonly Polygon[], parts: readonly LaidPart[], say: Say): void {
  for (const part of parts) {
    const piece = wood.find((w) => within(part.outline, w));
    if (!piece) continue;
    const others = parts.filter((p) => p !== part && within(p.outline, piece));
    if (others.length > 0) say('parts_not_parted', `no cut parts ${part.part.id} from ${others[0]!.part.id}.`);
    else if (areaOf(piece) - areaOf(part.outline) > E * (perimeter(part.outline) + 1))
      say('part_not_freed', `part ${part.part.id} still has waste on it after the last cut.`);
  }
}

const perimeter = (outline: Polygon): number =>
  edgesOf(outline).reduce((sum, [p, q]) => sum + Math.hypot(q[0] - p[0], q[1] - p[1]), 0);

function checkOffcuts(
  instance: NestInstance,
  slab: NestPlanSlab,
  stock: NestSlab,
  wood: readonly Polygon[],
  parts: readonly LaidPart[],
  say: Say,
): void {
  slab.offcuts.forEach((offcut, i) => {
    const { x, y, length, depth } = offcut;
    const box: Polygon = [[x, y], [x + length, y], [x + length, y + depth], [x, y + depth]]; // prettier-ignore
    const piece = wood.find((w) => within(box, w));
    if (!piece || parts.some((p) => within(p.outline, piece)) || !within(offcut.outline, piece))
      return say('offcut_not_there', `offcut ${i + 1} is not among what the cuts leave.`);
    const clear = (stock.defects ?? []).every(
      (d) => d.x >= x + length - E || d.x + d.w <= x + E || d.y >= y + depth - E || d.y + d.h <= y + E,
    );
    const whole = depth >= stock.depth - E && clear;
    if (offcut.keep && !(whole && length >= instance.reuseMin - E))
      say('offcut_keep_wrong', `offcut ${i + 1} is to be kept and is too small or has a defect.`);
    if (!offcut.keep && whole && length >= instance.reuseMin + E)
      say('offcut_keep_wrong', `offcut ${i + 1} is large enough to keep.`);
  });
}
