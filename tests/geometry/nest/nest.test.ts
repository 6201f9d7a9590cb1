import { nest } from '@/geometry/nest/nest';
import { mixedInstance } from '@/scripts/bench/nest-instances';
import { checkBound } from '@/shared/nest-check/bound/check-bound';
import { checkPlan } from '@/shared/nest-check/check-plan';
import { instance, planOf, rectangle, run, slab, trapezoid } from '@/tests/helpers/nest-builder';

const long = (id: string, length: number, price: number) => slab({ id, length, price });

describe('nest: rows and kerfs', () => {
  it('lays 47 1/2 and 47 3/8 in on one 96 in slab: 1/2 + 47 1/2 + 1/8 + 47 3/8 + 1/2 is 96 exactly', () => {
    const plan = planOf(instance({ parts: [run('A', 47.5), run('B', 47.375)] }));
    expect(plan.slabs).toHaveLength(1);
    expect(plan.proved).toBe(true);
  });

  it('needs two slabs when one of them is 1/64 in longer', () => {
    const plan = planOf(instance({ parts: [run('A', 47.5), run('B', 47.375 + 1 / 64)] }));
    expect([plan.slabs.length, plan.proved]).toEqual([2, true]);
  });

  it('makes both ends of a 45 degree pair with one cut when one part may be turned over', () => {
    const parts = [
      { id: 'P', outline: trapezoid(40, 0, 1) },
      { id: 'Q', outline: trapezoid(40, -1, 0) },
    ];
    const plan = planOf(instance({ parts, stock: [long('S96', 96, 100), long('S120', 120, 130)] }));
    expect(plan.slabs.map((s) => s.stock)).toEqual(['S96']);
    const shared = plan.slabs[0]!.cuts.filter((c) => c.shared);
    // Square to a cut at 45 degrees the kerf is 1/8, along the slab 1/8 x sqrt 2.
    expect(shared).toHaveLength(1);
    expect(Math.abs(shared[0]!.angle - 90)).toBeCloseTo(45, 9);
    expect(shared[0]!.kind === 'crosscut' && shared[0]!.frontFar - shared[0]!.front).toBeCloseTo(0.125 * Math.SQRT2, 9);
  });

  it('loses the square of the depth at that corner when turning over is forbidden', () => {
    const parts = [
      { id: 'P', outline: trapezoid(40, 0, 1), turnOver: false },
      { id: 'Q', outline: trapezoid(40, -1, 0), turnOver: false },
    ];
    const given = instance({ parts, stock: [long('S96', 96, 100), long('S107', 107, 130)] });
    // Mid-lengths 80, half a depth at each end that leans: 80 + 25 + 1/8, and the trims, is 106 1/8.
    expect(planOf(given).slabs.map((s) => s.stock)).toEqual(['S107']);
  });
});

describe('nest: stock', () => {
  it('takes the rack piece that costs nothing before it buys a slab', () => {
    const rack = slab({ id: 'R', length: 41, price: 0, count: 1, trim: 0 });
    const plan = planOf(instance({ parts: [run('A', 40)], stock: [slab(), rack] }));
    expect([plan.slabs[0]!.stock, plan.cost, plan.proved]).toEqual(['R', 0, true]);
  });

  it('keeps a part clear of a defect: 38 in of a 41 in piece with 3 in of crack, not 38 1/8', () => {
    const rack = slab({ id: 'R', length: 41, price: 0, count: 1, trim: 0, defects: [{ x: 0, y: 0, w: 3, h: 25 }] });
    const stock = [slab(), rack];
    expect(planOf(instance({ parts: [run('A', 38)], stock })).slabs[0]!.stock).toBe('R');
    expect(planOf(instance({ parts: [run('A', 38.125)], stock })).slabs[0]!.stock).toBe('S96');
  });

  it('lets a slanted end lie beside a defect in one corner', () => {
    const knot = { x: 0, y: 20, w: 5, h: 5 };
    const rack = slab({ id: 'R', length: 62, price: 0, count: 1, trim: 0, defects: [knot] });
    // Its left end leans from 25 in at the front to 0 at the back, or the other way round once turned over.
    const given = instance({ parts: [{ id: 'A', outline: trapezoid(49, 1, 0) }], stock: [slab(), rack] });
    const plan = planOf(given);
    expect(plan.slabs[0]!.stock).toBe('R');
    expect(checkPlan(given, plan)).toEqual([]);
  });

  it('cuts a 39 in deep island from the deeper slab and the runs from the usual one', () => {
    const stock = [slab(), slab({ id: 'deep', depth: 40, price: 70_000 })];
    const parts = [run('A', 90), { id: 'I', outline: rectangle(72, 39) }];
    const given = instance({ parts, stock });
    const plan = planOf(given);
    expect(plan.slabs.map((s) => s.stock).sort()).toEqual(['S96', 'deep']);
    expect(checkPlan(given, plan)).toEqual([]);
  });

  it('rips six 4 in strips side by side from one 25 in slab: 6 x 4 + 5 x 1/8 is 24 5/8', () => {
    const strips = { id: 's', count: 6, outline: rectangle(90, 4) };
    const plan = planOf(instance({ parts: [strips] }));
    expect([plan.slabs.length, plan.proved]).toEqual([1, true]);
    expect(plan.slabs[0]!.cuts.filter((c) => c.kind === 'rip')).toHaveLength(6);
    expect(planOf(instance({ parts: [{ ...strips, count: 7 }] })).slabs).toHaveLength(2);
  });

  it('needs fewer slabs for two jobs together than for each alone', () => {
    const one = [run('A', 60), run('B', 60)];
    const other = [run('C', 34), run('D', 34)];
    const alone = [one, other].map((parts) => planOf(instance({ parts })).slabs.length);
    expect(alone).toEqual([2, 1]);
    expect(planOf(instance({ parts: [...one, ...other] })).slabs).toHaveLength(2);
  });
});

describe('nest: groups and choices', () => {
  const three = [run('A', 20), run('B', 30), run('C', 25)];

  it('lays a group next to each other in its order, none turned over', () => {
    const given = instance({ parts: [...three, run('D', 15)], groups: [{ id: 'g', parts: ['C', 'A', 'B'] }] });
    const plan = planOf(given);
    expect(checkPlan(given, plan)).toEqual([]);
    const order = [...plan.slabs[0]!.parts]
      .sort((a, b) => a.x - b.x)
      .map((p) => p.id)
      .join('');
    expect(order).toMatch(/CAB|BAC/);
  });

  it('keeps two mirror-image ends apart in a group that without it would share a cut', () => {
    const parts = [
      { id: 'P', outline: trapezoid(40, 0, 1) },
      { id: 'Q', outline: trapezoid(40, -1, 0) },
    ];
    const stock = [long('S96', 96, 100), long('S107', 107, 130)];
    const plan = planOf(instance({ parts, stock, groups: [{ id: 'g', parts: ['P', 'Q'] }] }));
    expect(plan.slabs.map((s) => s.stock)).toEqual(['S107']);
  });

  it('cuts the option that needs the cheaper slabs, and only that', () => {
    const parts = [run('A', 80), run('B', 46), run('C', 34), run('D', 48), run('E', 60)];
    const choices = [{ id: 'seam', options: [['A'], ['B', 'C']] }];
    const plan = planOf(instance({ parts, choices }));
    // 46 + 48 and 34 + 60 fill two slabs; with the 80 in part it takes three.
    expect(plan.slabs.flatMap((s) => s.parts.map((p) => p.id)).sort()).toEqual(['B', 'C', 'D', 'E']);
    expect([plan.slabs.length, plan.choices, plan.proved]).toEqual([2, [{ id: 'seam', option: 1 }], true]);
  });

  it('ties a group to those of its parts that are cut', () => {
    const choices = [{ id: 'seam', options: [['A'], ['B']] }];
    const groups = [{ id: 'g', parts: ['A', 'B', 'C'] }];
    const given = instance({ parts: three, choices, groups });
    const plan = planOf(given);
    expect([...checkPlan(given, plan), ...checkBound(given, plan)]).toEqual([]);
    expect(plan.slabs.flatMap((s) => s.parts)).toHaveLength(2);
  });
});

describe('nest: what is left over', () => {
  it('leaves one offcut of 38 3/8 in rather than two short ones', () => {
    const parts = [run('A', 56.5), run('B', 50), run('C', 44)];
    const given = instance({ parts });
    const plan = planOf(given);
    const kept = plan.slabs.flatMap((s) => s.offcuts.filter((o) => o.keep)).map((o) => o.length);
    // B and C fill one slab; A leaves 96 - 1 - 56 1/2 - 1/8.
    expect(kept).toEqual([expect.closeTo(38.375, 9)]);
  });

  it('parts two ends that lean to different sides by two cuts where there is room, and not by three', () => {
    const parts = [
      { id: 'P', outline: trapezoid(30, 0, 0.3), turn: false, turnOver: false },
      { id: 'Q', outline: trapezoid(30, -0.4, 0), turn: false, turnOver: false },
    ];
    const [only] = planOf(instance({ parts, stock: [slab({ length: 80 })] })).slabs;
    expect(only!.cuts.filter((c) => c.kind === 'crosscut' && Math.abs(c.angle - 90) > 0.1)).toHaveLength(2);
    expect(only!.cuts).toHaveLength(4);
  });
});

describe('nest: the search', () => {
  it('gives the same plan for the same instance and work limit', () => {
    for (const limit of [3_000, 60_000]) {
      const [a, b] = [1, 2].map(() => JSON.stringify(nest(mixedInstance(3, 10, 10, 2), { workLimit: limit })));
      expect(a).toBe(b);
    }
  });

  it('gives a valid plan at once when told to stop before it begins', () => {
    const given = mixedInstance(4, 20, 40, 0);
    const plan = nest(given, { stop: () => true });
    expect('error' in plan ? plan.error : checkPlan(given, plan)).toEqual([]);
  });

  it('tells of ever cheaper plans, each of them valid', () => {
    const given = mixedInstance(1, 12, 4, 0);
    const costs: number[] = [];
    planOf(given);
    nest(given, {
      workLimit: 100_000,
      onBetter: (plan, lower) => {
        costs.push(plan.cost);
        expect(checkPlan(given, plan)).toEqual([]);
        expect(lower).toBeLessThanOrEqual(plan.cost);
      },
    });
    expect(costs.length).toBeGreaterThan(1);
    expect(costs).toEqual([...costs].sort((a, b) => b - a));
  });

  it('proves 20 runs, and the proof stands when it is worked out again', () => {
    for (const seed of [11, 12]) {
      const given = mixedInstance(seed, 20, 0, 0);
      const plan = planOf(given);
      expect([seed, plan.proved]).toEqual([seed, true]);
      expect([...checkPlan(given, plan), ...checkBound(given, plan)]).toEqual([]);
    }
  });

  it('proves runs with strips and offcuts, and the proof stands', () => {
    for (const seed of [21, 22]) {
      const given = mixedInstance(seed, 10, 6, 4);
      const plan = planOf(given);
      expect([seed, plan.proved]).toEqual([seed, true]);
      expect([...checkPlan(given, plan), ...checkBound(given, plan)]).toEqual([]);
    }
  });

  it('prices a part at what it costs in slabs: two to a slab are half a slab each', () => {
    const plan = planOf(instance({ parts: [{ ...run('A', 46), count: 4 }] }));
    expect(plan.priceTags).toEqual([{ id: 'A', cents: expect.closeTo(18_950, 3) }]);
  });

  it('proves nothing beyond areas about a part that is no trapezoid', () => {
    const clipped = { id: 'I', outline: [[0, 0], [40, 0], [40, 25], [8, 25], [0, 17]] as const }; // prettier-ignore
    const given = instance({ parts: [clipped, run('A', 60)] });
    const plan = planOf(given);
    expect([plan.provedScope, plan.certificate.kind]).toEqual(['any', 'area']);
    expect(checkPlan(given, plan)).toEqual([]);
  });
});
