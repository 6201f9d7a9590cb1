import { toRadians } from '../core/angle';
import type { JointChoice, JointKind } from '../core/layout';
import { intersect, type Line } from '../core/line';
import type { Point } from '../core/point';
import { along, distance, rotate, scale } from '../core/vector';
import { miter } from './miter';
import { footOn, interiorAngle, type WallFrame } from './wall-frame';

/** A run's two long lines before its ends are known. Room axes, directed as its wall. */
export interface RunLines {
  readonly id: string;
  readonly wall: WallFrame;
  /** 1 on the room side of the wall line, -1 on the far side. */
  readonly sign: 1 | -1;
  /** Back line off the wall line, inches. */
  readonly standoff: number;
  readonly depth: number;
  readonly back: Line;
  readonly front: Line;
}

/** Where a run ends on a joint, inches along its own wall. */
export interface JointEnd {
  readonly back: number;
  readonly front: number;
  /** Front end of the joint when a diagonal carries it past the front edge, room axes. */
  readonly wing: Point | null;
}

/** A joint at a wall corner. Angles radians, room axes. */
export interface CornerJoint {
  readonly kind: JointKind | 'square' | 'step';
  readonly corner: number;
  readonly angles: readonly [number, number];
  readonly length: number;
  /** Back and front end of the face that both runs share. */
  readonly from: Point;
  readonly to: Point;
  readonly left: JointEnd;
  readonly right: JointEnd;
  readonly through?: string;
}

/** A wall that turns less than this has no miter: the runs meet square, or in a step. */
export const STRAIGHT_WITHIN = toRadians(5);

/** Front corners nearer than this are one corner, inches. */
const FLUSH = 1e-9;

export type CornerJointResult = { readonly joint: CornerJoint } | { readonly why: string };

/**
 * The joint of two runs on neighbouring walls, any corner, any two depths.
 *
 * @param left, right - the runs on the left-hand and the right-hand wall of the corner, as seen from the room
 * @param choice - kind of joint, or null for a plain miter
 * @returns the joint, or in words why there is none
 */
export function cornerJoint(left: RunLines, right: RunLines, choice: JointChoice | null): CornerJointResult {
  const seen = interiorAngle(left.wall, right.wall);
  const corner = left.sign === 1 ? seen : 2 * Math.PI - seen;
  if (Math.abs(corner - Math.PI) <= STRAIGHT_WITHIN + 1e-12) return { joint: straightJoint(left, right, corner) };
  const meet = intersect(left.back, right.back);
  if (!meet) return { why: 'their back edges never meet' };
  if (choice?.kind === 'butt') return buttJoint(left, right, corner, choice.through ?? left.id);
  const plain = miterJoint(left, right, corner, meet);
  return choice?.kind === 'diagonal' ? diagonalJoint(left, right, plain, choice) : { joint: plain };
}

/** Direction at `angle` from the left-hand run's back line, turning onto the tops. */
function polar(left: RunLines, angle: number): Point {
  return rotate(scale(left.wall.along, -1), left.sign * angle);
}

function endOn(run: RunLines, back: Point, front: Point, wing: Point | null = null): JointEnd {
  return { back: footOn(run.wall, back), front: footOn(run.wall, front), wing };
}

function miterJoint(left: RunLines, right: RunLines, corner: number, meet: Point): CornerJoint {
  const faces = miter(corner, left.depth, right.depth);
  const to = along(meet, polar(left, faces.left), faces.length);
  return {
    kind: 'miter',
    corner,
    angles: [faces.left, faces.right],
    length: faces.length,
    from: meet,
    to,
    left: endOn(left, meet, to),
    right: endOn(right, meet, to),
  };
}

/** Along the line that halves the corner, so that both faces are the same; the part where both have wood is the joint. */
function straightJoint(left: RunLines, right: RunLines, corner: number): CornerJoint {
  const half = corner / 2;
  const line = (off: number) => along(left.wall.end, polar(left, half), off / Math.sin(half));
  const [leftBack, rightBack] = [left.standoff, right.standoff];
  const [leftFront, rightFront] = [leftBack + left.depth, rightBack + right.depth];
  const flush = Math.abs(leftBack - rightBack) < FLUSH && Math.abs(leftFront - rightFront) < FLUSH;
  const from = line(Math.max(leftBack, rightBack));
  const to = line(Math.min(leftFront, rightFront));
  return {
    kind: flush ? 'square' : 'step',
    corner,
    angles: [half, half],
    length: distance(from, to),
    from,
    to,
    left: endOn(left, line(leftBack), line(leftFront)),
    right: endOn(right, line(rightBack), line(rightFront)),
  };
}

/**
 * One run goes through, the other ends against it. At an inside corner the through run goes on to the other's back line
 * and the other stops at its front line; at an outside corner it goes on to the other's front line and the other stops
 * at its back line.
 */
function buttJoint(left: RunLines, right: RunLines, corner: number, throughId: string): CornerJointResult {
  if (throughId !== left.id && throughId !== right.id) return { why: `run ${throughId} is not one of the two` };
  const through = throughId === left.id ? left : right;
  const other = through === left ? right : left;
  const inside = corner < Math.PI;
  const stop = inside ? other.back : other.front;
  const face = inside ? through.front : through.back;
  const [throughBack, throughFront] = [intersect(through.back, stop), intersect(through.front, stop)];
  const [from, to] = [intersect(other.back, face), intersect(other.front, face)];
  if (!throughBack || !throughFront || !from || !to) return { why: 'their edges never meet' };
  const throughEnd = endOn(through, throughBack, throughFront);
  const otherEnd = endOn(other, from, to);
  const cut = inside ? corner : corner - Math.PI;
  return {
    joint: {
      kind: 'butt',
      corner,
      angles: [cut, cut],
      length: distance(from, to),
      from,
      to,
      left: through === left ? throughEnd : otherEnd,
      right: through === left ? otherEnd : throughEnd,
      through: throughId,
    },
  };
}

/** A straight front across an inside corner; the miter runs on past the fronts' corner and stops at it. */
function diagonalJoint(left: RunLines, right: RunLines, plain: CornerJoint, choice: JointChoice): CornerJointResult {
  const { corner, to: fronts, from: meet } = plain;
  if (corner >= Math.PI) return { why: 'a diagonal front needs an inside corner' };
  const width = choice.width ?? 0;
  if (!(width > 0)) return { why: 'the diagonal front has no width' };
  const atLeft = choice.angle === undefined ? (Math.PI - corner) / 2 : toRadians(choice.angle);
  const atRight = Math.PI - corner - atLeft;
  if (!(atLeft > 0 && atRight > 0)) {
    return { why: `a diagonal at ${choice.angle} degrees does not cross a corner this wide` };
  }
  const sine = Math.sin(corner);
  const a = along(fronts, left.wall.along, (-width * Math.sin(atRight)) / sine);
  const b = along(fronts, right.wall.along, (width * Math.sin(atLeft)) / sine);
  const direction = polar(left, plain.angles[0]);
  const wing = intersect(
    { origin: meet, direction },
    { origin: a, direction: [(b[0] - a[0]) / width, (b[1] - a[1]) / width] },
  );
  if (!wing) return { why: 'the miter never meets the diagonal' };
  return {
    joint: {
      ...plain,
      kind: 'diagonal',
      length: distance(meet, wing),
      to: wing,
      left: endOn(left, meet, a, wing),
      right: endOn(right, meet, b, wing),
    },
  };
}
