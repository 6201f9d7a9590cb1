import { sectionLoads } from '@/geometry/wood/section-loads';
import { cornerKitchen } from '../findings/kitchen';

describe('sectionLoads', () => {
  it('adds up what is glued in the shop: 40 and 40 lb take four people, apart one each', () => {
    const loads = (assembled: 'shop' | 'site') => {
      const context = cornerKitchen({ walls: [50, 50], joint: { assembled } });
      return sectionLoads(
        context.tops,
        context.pieces.map((piece) => ({ ...piece, weight: 40 })),
      );
    };
    expect(loads('shop')).toMatchObject([{ letters: ['P', 'Q'], weightLb: 80, hands: { people: 4 } }]);
    expect(loads('site').map((load) => [load.letters, load.weightLb, load.hands.people])).toEqual([
      [['P'], 40, 1],
      [['Q'], 40, 1],
    ]);
  });

  it('spans from corner to corner in the room', () => {
    const [load] = sectionLoads(cornerKitchen({ walls: [50, 50] }).tops, cornerKitchen({ walls: [50, 50] }).pieces);
    // Two 50 in legs at a right angle, front corners 25 1/4 in off the walls: from (0, -25.25) to (24.75, -50) and so on.
    expect(load!.span).toBeCloseTo(Math.hypot(49.75, 49.75), 9);
  });
});
