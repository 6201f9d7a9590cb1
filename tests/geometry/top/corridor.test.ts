import fc from 'fast-check';
import { longestRoundCorner, passesCorner } from '@/geometry/top/corridor';

describe('longestRoundCorner', () => {
  // The ladder round a corner, L = (a^(2/3) + b^(2/3))^(3/2): calculus texts print 9.87 ft for halls of 3 and 4 ft.
  it.each([
    [3, 4, 9.8657],
    [1, 1, 2 * Math.SQRT2],
    [27, 64, 125],
  ])('carries a ladder round halls of %d and %d', (a, b, length) => {
    expect(longestRoundCorner(a, b, 0)).toBeCloseTo(length, 4);
  });

  it('matches the published value at a turn of 31 degrees and finds the shorter least one', () => {
    // Moretti, College Mathematics Journal 33(3) 2002: halls 8 and 3, width 1, at t = 31 degrees L = 12.8927.
    const t = (31 * Math.PI) / 180;
    const there = 8 / Math.cos(t) + 3 / Math.sin(t) - 1 / (Math.sin(t) * Math.cos(t));
    expect(there).toBeCloseTo(12.8927, 4);
    expect(longestRoundCorner(8, 3, 1)).toBeCloseTo(12.8563, 4);
  });

  it.each([
    [36, 36, 25.5, 50.8234],
    [36, 42, 25.5, 59.0222],
    [36, 36, 1.5, 98.8234],
    [42, 42, 25, 68.7939],
  ])('halls of %d and %d let a piece %d wide round up to %d long', (a, b, width, length) => {
    expect(longestRoundCorner(a, b, width)).toBeCloseTo(length, 4);
  });

  it('never beats any single turn and does not care which hall comes first', () => {
    const hall = fc.double({ min: 20, max: 90, noNaN: true });
    fc.assert(
      fc.property(
        hall,
        hall,
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.double({ min: 0.01, max: 1.56, noNaN: true }),
        (a, b, share, t) => {
          const width = share * Math.min(a, b) * 0.999;
          const longest = longestRoundCorner(a, b, width);
          const here = a / Math.cos(t) + b / Math.sin(t) - width / (Math.sin(t) * Math.cos(t));
          expect(longest).toBeLessThanOrEqual(Math.max(0, here) + 1e-9);
          expect(longestRoundCorner(b, a, width)).toBeCloseTo(longest, 6);
        },
      ),
      { seed: 5, numRuns: 300 },
    );
  });

  it('lets nothing as wide as a hall turn, but lets a short piece slide across', () => {
    expect(longestRoundCorner(36, 36, 36)).toBe(0);
    expect(passesCorner(36, 42, 40, 30)).toBe(true);
    expect(passesCorner(36, 36, 36, 36)).toBe(true);
    expect(passesCorner(36, 36, 51, 25.5)).toBe(false);
  });
});
