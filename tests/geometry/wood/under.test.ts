import type { Base } from '@/geometry/core/layout';
import { wallFrames } from '@/geometry/top/wall-frame';
import { accessBelow, baseReach, cabinetsOf, carriesTop, liesOver, standsUnder } from '@/geometry/wood/under';
import { room } from '@/tests/helpers/tops-builder';

const WALLS = [...wallFrames(room([100, 80], [90])).byId.values()];
const base = (overrides: Partial<Base>): Base => ({
  id: 'b',
  wall: 'A',
  from: 60,
  to: 'end',
  kind: 'corner base',
  depth: 24,
  access: 'open',
  ...overrides,
});

/** Miter of two 25 in tops in the corner of walls A and B at (100, 0). */
const JOINT = [
  [99.75, -0.25],
  [74.75, -25.25],
] as const;

const access = (bases: readonly Base[]) => accessBelow(cabinetsOf(WALLS, bases), ['A', 'B'], ...JOINT);

describe('baseReach', () => {
  it('runs to the wall\'s adjusted end for "end"', () => {
    expect(baseReach(WALLS[0]!, base({}))).toEqual([60, 100]);
    expect(baseReach(WALLS[0]!, base({ to: 84 }))).toEqual([60, 84]);
  });
});

describe('liesOver', () => {
  it('holds from side to side and from the wall to the front of the base', () => {
    const wall = WALLS[0]!;
    expect(liesOver(wall, base({}), [61, -23])).toBe(true);
    expect(liesOver(wall, base({}), [59, -23])).toBe(false);
    expect(liesOver(wall, base({}), [61, -25])).toBe(false);
    expect(liesOver(wall, base({}), [61, -25], 2)).toBe(true);
  });
});

describe('accessBelow', () => {
  it('is open over a corner base that a hand gets into', () => {
    expect(access([base({})])).toBe('open');
  });

  it('is none when the base under any part of the joint is closed', () => {
    expect(access([base({ access: 'none' })])).toBe('none');
  });

  it('is not drawn when nothing stands there', () => {
    expect(access([])).toBe('not drawn');
    expect(access([base({ from: 0, to: 40 })])).toBe('not drawn');
  });

  it('takes one open base where two overlap', () => {
    expect(access([base({ access: 'none' }), base({ id: 'c' })])).toBe('open');
  });

  it('looks through windows and pipes', () => {
    expect(access([base({ kind: 'window', access: 'none' })])).toBe('not drawn');
  });
});

describe('carriesTop', () => {
  it('counts cabinets and no appliance', () => {
    expect(carriesTop(base({ kind: 'sink base' }))).toBe(true);
    expect(carriesTop(base({ kind: 'dishwasher' }))).toBe(false);
    expect(standsUnder(base({ kind: 'dishwasher' }))).toBe(true);
    expect(standsUnder(base({ kind: 'pipe' }))).toBe(false);
  });
});
