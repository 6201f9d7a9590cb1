import { openingAtEnd, suggestTriangle, tapeForAngle } from '@/geometry/room/corners';

describe('openingAtEnd', () => {
  it('opens a 35.355 in joint by 0.0617 in for a tenth of a degree', () => {
    expect(openingAtEnd(0.1, 35.355)).toBeCloseTo(0.0617, 4);
  });
});

describe('suggestTriangle', () => {
  it('suggests 36, 48 and 60 in on long walls, the long mark on the longer wall', () => {
    expect(suggestTriangle(96, 120)).toEqual({ left: 36, right: 48, squareTape: 60 });
    expect(suggestTriangle(120, 96)).toEqual({ left: 48, right: 36, squareTape: 60 });
  });

  it('shrinks to what fits: 18, 24 and 30 in beside a 20 in wall', () => {
    expect(suggestTriangle(20, 90)).toEqual({ left: 18, right: 24, squareTape: 30 });
    expect(suggestTriangle(90, 20)).toEqual({ left: 24, right: 18, squareTape: 30 });
    expect(suggestTriangle(30, 30)).toEqual({ left: 21, right: 28, squareTape: 35 });
  });

  it('suggests nothing where not even 3 and 4 in fit', () => {
    expect(suggestTriangle(2.5, 90)).toBeNull();
    expect(suggestTriangle(3.5, 3.5)).toBeNull();
  });

  it('always suggests a right angle', () => {
    for (const [l, r] of [
      [96, 120],
      [20, 90],
      [13, 7],
      [40, 40],
    ] as const) {
      const t = suggestTriangle(l, r)!;
      expect(tapeForAngle(t.left, t.right, 90)).toBeCloseTo(t.squareTape, 12);
      expect(t.left).toBeLessThanOrEqual(l);
      expect(t.right).toBeLessThanOrEqual(r);
    }
  });
});

describe('tapeForAngle', () => {
  it('gives sqrt(36^2 + 48^2 - 2 36 48 cos t)', () => {
    expect(tapeForAngle(36, 48, 90)).toBeCloseTo(60, 12);
    expect(tapeForAngle(36, 36, 60)).toBeCloseTo(36, 12);
    expect(tapeForAngle(36, 48, 91)).toBeCloseTo(Math.sqrt(3600 - 3456 * Math.cos((91 * Math.PI) / 180)), 12);
  });
});
