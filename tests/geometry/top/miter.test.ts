import fc from 'fast-check';
import { toDegrees, toRadians } from '@/geometry/core/angle';
import { miter } from '@/geometry/top/miter';

const miterDeg = (cornerDeg: number, left: number, right: number) => {
  const m = miter(toRadians(cornerDeg), left, right);
  return { ...m, left: toDegrees(m.left), right: toDegrees(m.right) };
};

describe('miter', () => {
  // Miter angles of regular frames, 180 / N off square, as shop tables print them (square 45, hexagon 30, octagon 22.5).
  it.each([
    [3, 60],
    [4, 45],
    [5, 36],
    [6, 30],
    [7, 25.7143],
    [8, 22.5],
    [9, 20],
    [10, 18],
    [12, 15],
    [16, 11.25],
  ])('cuts a frame of %i equal sides %d degrees off square', (sides, offSquare) => {
    expect(90 - miterDeg(180 - 360 / sides, 3, 3).left).toBeCloseTo(offSquare, 4);
  });

  // Miter length w / sin(t / 2), from the right triangle over half the corner.
  it('is 35.3553 long for two 25 in tops at 90 degrees and 27.0598 at 135', () => {
    expect(miterDeg(90, 25, 25).length).toBeCloseTo(35.3553, 4);
    expect(miterDeg(135, 25, 25).length).toBeCloseTo(27.0598, 4);
  });

  // Common practice: on a square corner a 25 in top is set back 25 in along its front edge.
  it('sets a 25 in top back 25 in at 45 degrees and makes the joint width x sqrt 2', () => {
    const m = miterDeg(90, 25, 25);
    expect(m.left).toBeCloseTo(45, 12);
    expect(m.setBackLeft).toBeCloseTo(25, 12);
    expect(m.length).toBeCloseTo(25 * Math.SQRT2, 12);
  });

  // Unequal widths: tan(alpha_a) = a sin(t) / (b + a cos(t)), length sqrt(a^2 + b^2 + 2ab cos t) / sin t.
  it.each([
    [25, 30, 90, 39.8056, 50.1944, 39.0512],
    [25.5, 36, 90, 35.3112, 54.6888, 44.1163],
    [25.5, 30, 135, 56.4246, 78.5754, 30.6064],
  ])('joins %d and %d in tops at %d degrees', (a, b, corner, left, right, length) => {
    const m = miterDeg(corner, a, b);
    expect(m.left).toBeCloseTo(left, 4);
    expect(m.right).toBeCloseTo(right, 4);
    expect(m.length).toBeCloseTo(length, 4);
  });

  it('adds half a turn at an outside corner: 135 degrees each way at 270, front longer by 25', () => {
    const m = miterDeg(270, 25, 25);
    expect(m.left).toBeCloseTo(135, 12);
    expect(m.right).toBeCloseTo(135, 12);
    expect(m.setBackLeft).toBeCloseTo(-25, 12);
  });

  it('gives both tops the same face at any corner and any depths', () => {
    const corner = fc.oneof(
      fc.double({ min: 20, max: 174, noNaN: true }),
      fc.double({ min: 186, max: 340, noNaN: true }),
    );
    const depth = fc.double({ min: 4, max: 60, noNaN: true });
    fc.assert(
      fc.property(corner, depth, depth, (t, w1, w2) => {
        const m = miter(toRadians(t), w1, w2);
        expect(m.left).toBeGreaterThan(0);
        expect(m.right).toBeGreaterThan(0);
        expect(m.length).toBeGreaterThanOrEqual(Math.max(w1, w2) * (1 - 1e-12));
        expect(w2 / Math.sin(m.right)).toBeCloseTo(m.length, 6);
        expect(
          Math.sqrt(w1 * w1 + w2 * w2 + 2 * w1 * w2 * Math.cos(toRadians(t))) / Math.abs(Math.sin(toRadians(t))),
        ).toBeCloseTo(m.length, 6);
        const mirrored = miter(toRadians(t), w2, w1);
        expect(mirrored.left).toBeCloseTo(m.right, 10);
        expect(mirrored.setBackLeft).toBeCloseTo(m.setBackRight, 6);
      }),
      { seed: 20261, numRuns: 500 },
    );
  });
});
