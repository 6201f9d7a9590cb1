import { kitchen, KITCHENS } from '@/scripts/bench/kitchens';
import { layoutsOfDrag, liveChain } from '@/scripts/bench/live-chain-moves';

const SEEDS = [1, 2, 3];

describe.each(KITCHENS)('a kitchen of $walls walls and $pieces pieces', (size) => {
  const plans = SEEDS.map((seed) => liveChain(kitchen(seed, size)));

  it('has that many walls and pieces, with a run on every wall but the one with the doors', () => {
    for (const plan of plans) {
      expect(plan.room!.walls).toHaveLength(size.walls);
      expect(plan.pieces).toHaveLength(size.pieces);
      expect(plan.tops.runs).toHaveLength(size.walls - 1);
      expect(plan.joints).toHaveLength(size.walls - 2);
    }
  });

  it('is laid without a problem, out of square, with spare readings', () => {
    for (const plan of plans) {
      expect(plan.roomError).toBeNull();
      expect(plan.tops.problems).toEqual([]);
      expect(plan.room!.dof).toBe(3 + Math.floor(size.walls / 4));
      const offSquare = plan.room!.corners.map(({ angleDeg }) => Math.abs((angleDeg % 180) - 90));
      expect(Math.max(...offSquare)).toBeGreaterThan(0.3);
    }
  });

  it('comes out the same from the same seed', () => {
    expect(kitchen(2, size)).toEqual(kitchen(2, size));
    expect(kitchen(2, size)).not.toEqual(kitchen(3, size));
  });
});

it('slides the first cutout by 1/16 in a frame along its wall, all pieces staying', () => {
  const plans = layoutsOfDrag(kitchen(1, { walls: 12, pieces: 20 })).map(liveChain);
  // The first wall runs along +x.
  const lefts = plans.map((plan) => Math.min(...plan.cutouts[0]!.outline.map(([x]) => x)));
  lefts.slice(1).forEach((left, i) => expect(left - lefts[i]!).toBeCloseTo(1 / 16, 9));
  for (const plan of plans) expect(plan.pieces).toHaveLength(20);
});
