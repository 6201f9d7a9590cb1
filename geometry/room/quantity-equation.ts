import type { NetworkMark, NetworkQuantity } from './network';

/**
 * A quantity made ready for many evaluations. Coordinates stand as x0, y0, x1, y1, ...; `slots` names the coordinates
 * it depends on, a coordinate may appear twice and its derivatives then add up.
 */
export interface QuantityEquation {
  readonly slots: readonly number[];
  /** True when values that differ by whole turns are the same. */
  readonly angular: boolean;
  /** Gives the value and, when `gradient` is there, writes the derivative for every slot. */
  evaluate(coordinates: Float64Array, gradient?: Float64Array): number;
}

const TURN = 2 * Math.PI;

/** The equation of a quantity, with analytic derivatives. */
export function quantityEquation(quantity: NetworkQuantity): QuantityEquation {
  if (quantity.kind === 'distance') return distanceEquation(quantity.from, quantity.to);
  if (quantity.kind === 'bearing') return bearingEquation(quantity.from, quantity.to);
  return angleEquation(quantity.at, quantity.from, quantity.to);
}

const xy = (point: number): readonly [number, number] => [2 * point, 2 * point + 1];

function bearingEquation(from: number, to: number): QuantityEquation {
  return {
    slots: [...xy(from), ...xy(to)],
    angular: true,
    evaluate(c, gradient) {
      const dx = c[2 * to]! - c[2 * from]!;
      const dy = c[2 * to + 1]! - c[2 * from + 1]!;
      if (gradient) writeBearing(gradient, 0, 2, dx, dy, 1);
      return positive(Math.atan2(dy, dx));
    },
  };
}

function angleEquation(at: number, from: number, to: number): QuantityEquation {
  return {
    slots: [...xy(at), ...xy(from), ...xy(at), ...xy(to)],
    angular: true,
    evaluate(c, gradient) {
      const x = c[2 * at]!;
      const y = c[2 * at + 1]!;
      const fx = c[2 * from]! - x;
      const fy = c[2 * from + 1]! - y;
      const tx = c[2 * to]! - x;
      const ty = c[2 * to + 1]! - y;
      if (gradient) {
        writeBearing(gradient, 0, 2, fx, fy, -1);
        writeBearing(gradient, 4, 6, tx, ty, 1);
      }
      return positive(Math.atan2(fx * ty - fy * tx, fx * tx + fy * ty));
    },
  };
}

/** Derivative of the direction of (dx, dy): (-dy, dx) / d^2 at its head, the opposite at its tail. */
function writeBearing(g: Float64Array, tail: number, head: number, dx: number, dy: number, sign: number): void {
  const d2 = dx * dx + dy * dy;
  g[head] = (-sign * dy) / d2;
  g[head + 1] = (sign * dx) / d2;
  g[tail] = -g[head]!;
  g[tail + 1] = -g[head + 1]!;
}

const positive = (angle: number): number => (angle < 0 ? angle + TURN : angle);

function distanceEquation(from: NetworkMark, to: NetworkMark): QuantityEquation {
  const fromSlots = markSlots(from);
  const a: [number, number] = [0, 0];
  const b: [number, number] = [0, 0];
  return {
    slots: [...fromSlots, ...markSlots(to)],
    angular: false,
    evaluate(c, gradient) {
      place(from, c, a);
      place(to, c, b);
      const dx = b[0] - a[0];
      const dy = b[1] - a[1];
      const d = Math.hypot(dx, dy);
      if (gradient) {
        writeMark(from, c, gradient, 0, -dx / d, -dy / d);
        writeMark(to, c, gradient, fromSlots.length, dx / d, dy / d);
      }
      return d;
    },
  };
}

function markSlots(mark: NetworkMark): readonly number[] {
  return mark.toward === undefined ? xy(mark.point) : [...xy(mark.point), ...xy(mark.toward)];
}

function place(mark: NetworkMark, c: Float64Array, out: [number, number]): void {
  const x = c[2 * mark.point]!;
  const y = c[2 * mark.point + 1]!;
  if (mark.toward === undefined) {
    out[0] = x;
    out[1] = y;
    return;
  }
  const dx = c[2 * mark.toward]! - x;
  const dy = c[2 * mark.toward + 1]! - y;
  const share = (mark.at ?? 0) / Math.hypot(dx, dy);
  out[0] = x + dx * share;
  out[1] = y + dy * share;
}

/** Carries the derivative (gx, gy) at a mark back to its points: only the part across the wall turns with the far one. */
function writeMark(mark: NetworkMark, c: Float64Array, g: Float64Array, start: number, gx: number, gy: number): void {
  g[start] = gx;
  g[start + 1] = gy;
  if (mark.toward === undefined) return;
  const dx = c[2 * mark.toward]! - c[2 * mark.point]!;
  const dy = c[2 * mark.toward + 1]! - c[2 * mark.point + 1]!;
  const wall = Math.hypot(dx, dy);
  const ux = dx / wall;
  const uy = dy / wall;
  const along = gx * ux + gy * uy;
  const share = (mark.at ?? 0) / wall;
  const hx = (gx - along * ux) * share;
  const hy = (gy - along * uy) * share;
  g[start] = gx - hx;
  g[start + 1] = gy - hy;
  g[start + 2] = hx;
  g[start + 3] = hy;
}
