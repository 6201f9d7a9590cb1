import { distanceTo, hitTest, middleOf, type HitTarget } from '@/components/canvas/hit-test';

const VIEW = { scale: 4, x: 100, y: 100 };

const wall: HitTarget = { id: 'wall', shape: { kind: 'segment', from: [0, 0], to: [50, 0] } };
const piece: HitTarget = {
  id: 'piece',
  shape: {
    kind: 'area',
    outline: [
      [0, -25],
      [50, -25],
      [50, 0],
      [0, 0],
    ],
  },
  rank: 1,
};
const handle: HitTarget = { id: 'handle', shape: { kind: 'point', at: [25, -30] }, rank: 2 };

describe('hitTest', () => {
  it('reaches 22 px around a line and no further', () => {
    expect(hitTest([wall], VIEW, [200, 121])?.id).toBe('wall');
    expect(hitTest([wall], VIEW, [200, 123])).toBeNull();
    expect(hitTest([wall], VIEW, [100 - 22, 100])?.id).toBe('wall');
    expect(hitTest([wall], VIEW, [100 - 23, 100])).toBeNull();
  });

  it('takes the seam handle over the piece over the wall', () => {
    const all = [handle, wall, piece];
    expect(hitTest(all, VIEW, [200, 215])?.id).toBe('handle');
    expect(hitTest(all, VIEW, [200, 104])?.id).toBe('piece');
    expect(hitTest(all, VIEW, [200, 95])?.id).toBe('piece');
    expect(hitTest(all, VIEW, [400, 400])).toBeNull();
  });

  it('takes the nearest of one rank, and of two on one spot the one painted last', () => {
    const near: HitTarget = { id: 'near', shape: { kind: 'point', at: [10, 0] } };
    const far: HitTarget = { id: 'far', shape: { kind: 'point', at: [14, 0] } };
    const over: HitTarget = { id: 'over', shape: { kind: 'point', at: [10, 0] } };
    expect(hitTest([near, far], VIEW, [141, 100])?.id).toBe('near');
    expect(hitTest([near, far], VIEW, [155, 100])?.id).toBe('far');
    expect(hitTest([near, over], VIEW, [140, 100])?.id).toBe('over');
  });
});

describe('distanceTo', () => {
  it('is 0 inside an area, and px to its edge outside', () => {
    expect(distanceTo(piece.shape, VIEW, [200, 150])).toBe(0);
    expect(distanceTo(piece.shape, VIEW, [90, 150])).toBe(10);
  });

  it('knows a dent of an L from its inside', () => {
    const l = {
      kind: 'area',
      outline: [
        [0, 0],
        [50, 0],
        [50, 10],
        [10, 10],
        [10, 40],
        [0, 40],
      ],
    } as const;
    expect(distanceTo(l, { scale: 1, x: 0, y: 0 }, [5, -30])).toBe(0);
    expect(distanceTo(l, { scale: 1, x: 0, y: 0 }, [30, -30])).toBe(20);
  });

  it('measures to a turned blade as it lies', () => {
    const blade = { kind: 'box', at: [0, 0], width: 80, height: 20, turn: Math.PI / 2 } as const;
    expect(distanceTo(blade, { scale: 1, x: 0, y: 0 }, [0, 38])).toBe(0);
    expect(distanceTo(blade, { scale: 1, x: 0, y: 0 }, [40, 0])).toBeCloseTo(30, 10);
  });

  it('turns a box the way the drawing turns: counter-clockwise with y up', () => {
    const blade = { kind: 'box', at: [0, 0], width: 80, height: 2, turn: Math.PI / 4 } as const;
    expect(distanceTo(blade, { scale: 1, x: 0, y: 0 }, [20, -20])).toBeCloseTo(0, 10);
    expect(distanceTo(blade, { scale: 1, x: 0, y: 0 }, [20, 20])).toBeGreaterThan(20);
  });
});

describe('middleOf', () => {
  it('is the middle of a line and of an outline', () => {
    expect(middleOf(wall.shape)).toEqual([25, 0]);
    expect(middleOf(piece.shape)).toEqual([25, -12.5]);
  });
});
