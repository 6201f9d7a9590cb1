import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { fastenersOfTops } from '@/geometry/wood/fasteners';
import { materialsList } from '@/geometry/wood/materials-list';
import { predrillMap } from '@/geometry/wood/predrill';
import { cornerKitchen, kitchen } from '../findings/kitchen';

const list = (context: ReturnType<typeof kitchen>) => {
  const fasteners = fastenersOfTops(context.tops, [], [], DEFAULT_SETTINGS.screws, 0.5);
  return { fasteners, ...materialsList(context.layout, context.tops, context.joints, fasteners, DEFAULT_SETTINGS) };
};

describe('materialsList', () => {
  it('seals both faces and the edges of 60 x 25 x 1 1/2 in once and the upper face twice more: 0.48 qt of oil', () => {
    const { sealedSqFt, finishQuarts, coats } = list(kitchen({ walls: [60] }));
    // 2 x 1500 + 170 x 1.5 = 3255 sq in; then 2 x 1500; 100 sq ft a quart and a tenth to spare.
    expect(sealedSqFt).toBeCloseTo(3255 / 144, 9);
    expect(coats).toBe(3);
    expect(finishQuarts).toBeCloseTo((1.1 * (3255 + 3000)) / 144 / 100, 9);
  });

  it('counts screws, connectors, glue, and drawbolts only for joints closed on site', () => {
    const shop = list(cornerKitchen());
    const site = list(cornerKitchen({ joint: { assembled: 'site' } }));
    expect(shop.screws).toBe(shop.fasteners.length);
    expect([shop.connectors, shop.drawbolts]).toEqual([6, 0]);
    expect(site.drawbolts).toBe(3);
    expect(shop.glueOunces).toBeCloseTo(0.26, 2);
  });

  it('needs no finish for bare wood', () => {
    expect(list(kitchen({ layout: { finish: { kind: 'none' } } }))).toMatchObject({ coats: 0, finishQuarts: 0 });
  });
});

describe('predrillMap', () => {
  it('drills the front line 1 in deep with 0.114 in in maple, and leaves the slotted line alone', () => {
    const { fasteners } = list(kitchen({ walls: [60] }));
    const holes = predrillMap(fasteners, { length: 2.5, bite: 1, left: 0.5 }, 'hard maple', DEFAULT_SETTINGS.screws);
    expect(holes).toHaveLength(fasteners.filter((f) => f.row === 'front').length);
    expect(holes.every((hole) => hole.y === 2.5 && hole.depth === 1)).toBe(true);
    expect(holes[0]!.diameter).toBeCloseTo(0.114, 9);
  });

  it('treats a wood that is not in the table as a hard one', () => {
    const { fasteners } = list(kitchen({ walls: [60] }));
    const diameter = (species: string) =>
      predrillMap(fasteners, { length: 2.5, bite: 1, left: 0.5 }, species, DEFAULT_SETTINGS.screws)[0]!.diameter;
    expect(diameter('driftwood')).toBe(diameter('hard maple'));
    expect(diameter('cherry')).toBeCloseTo((0.7 * 2 * 0.19) / 3, 9);
    expect(diameter('african mahogany')).toBeNull();
  });
});
