import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layTops } from '@/geometry/seams/lay-tops';
import { drawboltsAlong } from '@/geometry/wood/drawbolts';
import { jointWood, legsOf, seamConnectors } from '@/geometry/wood/joint-wood';
import { JOINT, layout, room, run } from '@/tests/helpers/tops-builder';

const MOVEMENT = { emc: { make: 8, summer: 11, winter: 6 }, coefficient: 0.0025 };

const corner = (assembled: 'shop' | 'site') =>
  layTops(
    layout({
      runs: [run('1', 'A', { right: JOINT }), run('2', 'B', { left: JOINT })],
      joints: [{ between: ['1', '2'], kind: 'miter', assembled }],
    }),
    room([80, 90], [90]),
    DEFAULT_SETTINGS,
  );

describe('jointWood', () => {
  it('gives opening, swing and connectors of a 25 in square corner: J is 35 11/32, the longer leg 89 3/4', () => {
    const tops = corner('shop');
    const wood = jointWood(tops.joints[0]!, tops, MOVEMENT, DEFAULT_SETTINGS);
    expect(wood.seasonal).toBeCloseTo(0.0075 * 25 * Math.SQRT2, 9);
    expect(wood.swing).toBeCloseTo(0.0075 * 89.75, 9);
    expect(wood.connectors).toHaveLength(6);
    expect(wood.connectors[0]).toBe(3);
  });

  it('keeps the connectors of a site joint clear of its drawbolts', () => {
    const tops = corner('site');
    const joint = tops.joints[0]!;
    const { connectors } = jointWood(joint, tops, MOVEMENT, DEFAULT_SETTINGS);
    const clear = DEFAULT_SETTINGS.connectors.fromHardware + DEFAULT_SETTINGS.connectors.width / 2;
    for (const bolt of drawboltsAlong(joint.length)) {
      for (const at of connectors) expect(Math.abs(at - bolt)).toBeGreaterThanOrEqual(clear - 1e-9);
    }
    expect(connectors.length).toBeGreaterThan(2);
  });
});

describe('legsOf', () => {
  it('measures both runs from the corner to their far ends, and 0 for a run that is not there', () => {
    const tops = corner('shop');
    const [first, second] = legsOf(tops.joints[0]!, tops.runs);
    expect([first, second]).toEqual([79.75, 89.75]);
    expect(legsOf({ between: ['9', '1'] }, tops.runs)[0]).toBe(0);
  });
});

describe('seamConnectors', () => {
  it('leaves a seam through a sink without any in its 2 in strips, and spaces a plain seam from both ends', () => {
    const sink = {
      outline: [
        [35, -23.25],
        [65, -23.25],
        [65, -2.25],
        [35, -2.25],
      ] as const,
    };
    const seam = { from: [50, -0.25], to: [50, -25.25] } as const;
    const placed = { ...corner('shop'), cutouts: [{ ...sink } as never] };
    expect(seamConnectors(seam, placed, DEFAULT_SETTINGS)).toEqual([]);
    expect(seamConnectors(seam, { cutouts: [] }, DEFAULT_SETTINGS)).toEqual([3, 9, 12.5, 16, 22]);
  });
});
