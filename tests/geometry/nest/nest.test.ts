import { nest } from '@/geometry/nest/nest';
import type { NestInstance, NestPlan } from '@/geometry/nest/types';
import { mixedInstance, rectangle, uInstance } from '@/scripts/bench/nest-instances';
import { createRandom } from '@/scripts/bench/random';
import { checkBound } from '@/shared/nest-check/bound/check-bound';
import { checkPlan } from '@/shared/nest-check/check-plan';

function planOf(instance: NestInstance, workLimit?: number): NestPlan {
  const plan = nest(instance, workLimit === undefined ? {} : { workLimit });
  if ('error' in plan) throw new Error(plan.error.message);
  return plan;
}

/** One slab length, square runs of full depth, no kerf and no trim: bin packing in one dimension. */
function bins(capacity: number, lengths: readonly number[]): NestInstance {
  return {
    id: `bins-${capacity}-${lengths.join('-')}`,
    kerf: 0,
    trim: 0,
    reuseMin: 18,
    stock: [{ id: 'bin', length: capacity, depth: 25, price: 100, count: null }],
    parts: lengths.map((length, i) => ({ id: `p${i}`, outline: rectangle(length, 25) })),
  };
}

/** Fewest bins by trying every way: each length into every open bin or a new one. */
function fewestBins(capacity: number, lengths: readonly number[]): number {
  let best = lengths.length;
  const put = (i: number, rooms: number[]): void => {
    if (rooms.length >= best) return;
    if (i === lengths.length) {
      best = rooms.length;
      return;
    }
    for (let bin = 0; bin < rooms.length; bin++) {
      if (rooms[bin]! < lengths[i]!) continue;
      rooms[bin]! -= lengths[i]!;
      put(i + 1, rooms);
      rooms[bin]! += lengths[i]!;
    }
    rooms.push(capacity - lengths[i]!);
    put(i + 1, rooms);
    rooms.pop();
  };
  put(0, []);
  return best;
}

describe('nest', () => {
  it('packs Falkenauer triplets, made afresh by his rule, into n / 3 bins and proves it', () => {
    // E. Falkenauer, 1996: triplets that fill a bin of 1000 exactly (ranges from memory); thirds of n are optimal.
    for (const seed of [1, 2, 3]) {
      const random = createRandom(seed);
      const lengths = Array.from({ length: 5 }, () => {
        const a = random.whole(380, 490);
        const b = random.whole(Math.ceil((1000 - a) / 2), 1000 - a - 250);
        return [a, b, 1000 - a - b];
      }).flat();
      const plan = planOf(bins(1000, lengths));
      expect(plan.slabs).toHaveLength(5);
      expect(plan).toMatchObject({ proved: true, lowerBound: 500 });
    }
  });

  it('never says proved of more slabs than an exhaustive search needs (120 tiny cases)', () => {
    const random = createRandom(7);
    let proved = 0;
    for (let n = 0; n < 120; n++) {
      const lengths = Array.from({ length: random.whole(2, 7) }, () => random.whole(20, 95));
      const plan = planOf(bins(120, lengths));
      const fewest = fewestBins(120, lengths);
      expect(plan.lowerBound).toBeLessThanOrEqual(fewest * 100);
      expect(plan.cost).toBeGreaterThanOrEqual(fewest * 100);
      if (!plan.proved) continue;
      proved++;
      expect(plan.slabs).toHaveLength(fewest);
    }
    expect(proved).toBeGreaterThan(100);
  });

  it.each([
    ['a U of three', [1, 2, 3, 4, 5, 6].map(uInstance)],
    ['eight runs', [1, 2, 3].map((seed) => mixedInstance(seed, 8, 0, 0))],
    ['runs, strips and offcuts with defects', [1, 2, 3].map((seed) => mixedInstance(seed, 6, 5, 4))],
  ])('gives plans of %s that the independent checker holds true, with the bound worked out again', (_what, all) => {
    for (const instance of all) {
      const plan = planOf(instance);
      expect(checkPlan(instance, plan)).toEqual([]);
      expect(plan.proved).toBe(plan.cost === plan.lowerBound);
    }
  });

  it('gives the same plan of the same instance and limit', () => {
    const instance = mixedInstance(5, 10, 6, 2);
    expect(planOf(instance, 200_000)).toEqual(planOf(instance, 200_000));
  });

  it('says that there are not enough slabs, and checks bounds of short and plentiful stock', () => {
    const short = bins(96, [60, 50, 40, 30]);
    const one = { ...short, stock: [{ ...short.stock[0]!, count: 1 }] };
    expect(nest(one)).toMatchObject({ error: { code: 'not_enough_stock' } });
    for (const instance of [short, uInstance(2), mixedInstance(1, 8, 0, 0)]) {
      const plan = nest(instance, { evidence: true });
      expect('error' in plan ? plan.error : checkBound(instance, plan)).toEqual([]);
    }
  });

  it('says which part fits no slab', () => {
    const result = nest(bins(96, [40, 130]));
    expect(result).toMatchObject({ error: { code: 'part_fits_no_slab' } });
    if ('error' in result) expect(result.error.message).toMatch(/p1/);
  });
});

describe('the independent checker', () => {
  const instance = uInstance(3);
  const plan = planOf(instance);
  const first = plan.slabs[0]!;
  const withFirst = (change: Partial<(typeof plan.slabs)[number]>): NestPlan => ({
    ...plan,
    slabs: [{ ...first, ...change }, ...plan.slabs.slice(1)],
  });
  const moved = (by: { x?: number; y?: number }) =>
    withFirst({
      parts: first.parts.map((part, i) =>
        i === 0 ? { ...part, x: part.x + (by.x ?? 0), y: part.y + (by.y ?? 0) } : part,
      ),
    });

  it('finds nothing wrong with a true plan', () => {
    expect(checkPlan(instance, plan)).toEqual([]);
  });

  it.each([
    ['a part moved into the trim', () => moved({ x: -0.3 })],
    ['a part that sticks out at the back', () => moved({ y: 1 })],
    ['a part that is missing', () => withFirst({ parts: first.parts.slice(1) })],
    ['a part that is laid twice', () => withFirst({ parts: [...first.parts, first.parts[0]!] })],
    ['a part nobody asked for', () => withFirst({ parts: [{ ...first.parts[0]!, id: 'X' }, ...first.parts.slice(1)] })],
    ['a slab nobody sells', () => withFirst({ stock: 'no such slab' })],
    ['a plan without its saw cuts', () => withFirst({ cuts: [] })],
    ['a cost that does not add up', () => ({ ...plan, cost: plan.cost - 100 })],
    ['a bound above what its evidence gives', () => ({ ...plan, lowerBound: plan.lowerBound + 10_000 })],
    ['a proof where cost and bound differ', () => ({ ...plan, lowerBound: plan.lowerBound - 100, proved: true })],
  ])('refuses %s', (_what, broken) => {
    expect(checkPlan(instance, broken()).length).toBeGreaterThan(0);
  });
});
