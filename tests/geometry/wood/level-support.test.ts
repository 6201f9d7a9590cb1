import type { Base } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import { wallFrames } from '@/geometry/top/wall-frame';
import { backsplashHeight, bracketNeeds, ledgerNeeds, plumbGap, shimsOf } from '@/geometry/wood/level-support';
import { cabinetsOf } from '@/geometry/wood/under';
import { JOINT, layout, room, run } from '@/tests/helpers/tops-builder';

const SHAPE = room([100, 80], [90]);
const WALLS = [...wallFrames(SHAPE).byId.values()];
const base = (overrides: Partial<Base>): Base => ({
  id: 'b',
  wall: 'A',
  from: 0,
  to: 76,
  kind: 'cabinet',
  depth: 24,
  access: 'open',
  ...overrides,
});

const CORNER = layTops(
  layout({
    runs: [run('1', 'A', { right: JOINT }), run('2', 'B', { left: JOINT })],
    joints: [{ between: ['1', '2'], kind: 'miter', assembled: 'shop' }],
  }),
  SHAPE,
  DEFAULT_SETTINGS,
);

const ledgers = (bases: readonly Base[]) => ledgerNeeds(CORNER.joints[0]!, ['A', 'B'], cabinetsOf(WALLS, bases));

describe('shimsOf', () => {
  it('lists the bases that need one, thickest first', () => {
    const bases = [base({ id: 'a', shim: 0.125 }), base({ id: 'b' }), base({ id: 'c', shim: 0.25 })];
    expect(shimsOf(bases)).toEqual([
      { base: 'c', thickness: 0.25 },
      { base: 'a', thickness: 0.125 },
    ]);
  });
});

describe('bracketNeeds', () => {
  it('spans a 24 in dishwasher and asks for a bracket over 24 1/16', () => {
    expect(bracketNeeds(cabinetsOf(WALLS, [base({ kind: 'dishwasher', from: 30, to: 54 })]))).toEqual([]);
    expect(bracketNeeds(cabinetsOf(WALLS, [base({ kind: 'dishwasher', from: 30, to: 54.0625 })]))).toMatchObject([
      { kind: 'bracket', wall: 'A', from: 30, to: 54.0625 },
    ]);
  });

  it('asks for none over a cabinet', () => {
    expect(bracketNeeds(cabinetsOf(WALLS, [base({ to: 90 })]))).toEqual([]);
  });
});

describe('ledgerNeeds', () => {
  it('asks for a ledger over the 24 in that a blind corner has no cabinet', () => {
    expect(ledgers([base({})])).toEqual([{ kind: 'ledger', wall: 'A', from: 76, to: 100, base: null }]);
  });

  it('asks for none with a base in the corner, with nothing drawn, or past 30 in of bare wall', () => {
    expect(ledgers([base({}), base({ id: 'c', from: 76, to: 'end', kind: 'corner base' })])).toEqual([]);
    expect(ledgers([])).toEqual([]);
    expect(ledgers([base({ to: 70 })])).toHaveLength(1);
    expect(ledgers([base({ to: 69.9 })])).toEqual([]);
  });
});

describe('plumbGap', () => {
  it('opens 1/8 in over a 4 in backsplash on a wall that leans 3/8 in a foot', () => {
    expect(plumbGap({ outOfPlumb: 0.375 }, 4)).toBeCloseTo(0.125, 12);
    expect(plumbGap({ outOfPlumb: -0.375 }, 4)).toBeCloseTo(-0.125, 12);
    expect(plumbGap({}, 4)).toBe(0);
  });
});

describe('backsplashHeight', () => {
  it('is that of the strips drawn, 4 in without any', () => {
    const strip = { id: 's', label: 'Backsplash left', length: 60, width: 6, thickness: 0.75, count: 1 };
    expect(backsplashHeight({ strips: [strip] })).toBe(6);
    expect(backsplashHeight({ strips: [{ ...strip, label: 'shelf' }] })).toBe(4);
  });
});
