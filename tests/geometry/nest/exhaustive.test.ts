import type { NestInstance, NestPart, NestSlab } from '@/geometry/nest/types';
import { nest } from '@/geometry/nest/nest';
import { checkBound } from '@/shared/nest-check/bound/check-bound';
import { checkPlan } from '@/shared/nest-check/check-plan';
import { createDraw, type Draw } from '@/scripts/bench/draw';
import { exhaustive } from '@/tests/helpers/nest-exhaustive';
import { instance, rectangle, trapezoid } from '@/tests/helpers/nest-builder';

const CASES = 500;

/** Up to five parts on up to three kinds of slab: few of each, angled ends, strips, one choice in every third case. */
function tinyInstance(seed: number): NestInstance {
  const draw = createDraw(seed);
  const count = draw.whole(2, 5);
  const parts = Array.from({ length: count }, (_, i) => part(draw, `p${i}`));
  const ids = parts.map((p) => p.id);
  const choices =
    seed % 3 === 0 && count > 2 ? [{ id: 'c', options: [[ids[0]!], [ids[1]!, ...(count > 4 ? [ids[2]!] : [])]] }] : [];
  const stock = Array.from({ length: draw.whole(1, 3) }, (_, i) => stockEntry(draw, i));
  return instance({ id: `tiny-${seed}`, kerf: draw.chance(0.8) ? 0.125 : 0, stock, parts, choices });
}

function part(draw: Draw, id: string): NestPart {
  const moves = { turn: draw.chance(0.8), turnOver: draw.chance(0.6) };
  if (draw.chance(0.25)) return { id, outline: rectangle(draw.between(6, 30), draw.whole(3, 9)), ...moves };
  const slope = (): number => (draw.chance(0.5) ? 0 : draw.between(-1.1, 1.1));
  return { id, outline: trapezoid(draw.between(28, 50), slope(), slope(), 12), ...moves };
}

function stockEntry(draw: Draw, i: number): NestSlab {
  const length = draw.between(70, 130);
  const isOffcut = draw.chance(0.3);
  return {
    id: `S${i}`,
    length,
    depth: 12,
    price: isOffcut ? draw.whole(0, 20) * 100 : Math.round(length * draw.between(2.5, 3.5)) * 100,
    count: isOffcut ? 1 : draw.chance(0.5) ? null : draw.whole(1, 3),
  };
}

describe('nest against trying everything', () => {
  const results = Array.from({ length: CASES }, (_, i) => {
    const given = tinyInstance(i + 1);
    return { given, truth: exhaustive(given).cost, plan: nest(given, { workLimit: 60_000, evidence: true }) };
  });
  const solved = results.flatMap(({ plan, ...rest }) => ('error' in plan ? [] : [{ ...rest, plan }]));

  it('finds a plan exactly when there is one', () => {
    const wrong = results.filter(({ plan, truth }) => 'error' in plan !== (truth === null));
    expect(wrong.map((r) => r.given.id)).toEqual([]);
    expect(solved.length).toBeGreaterThan(400);
  });

  it('never claims a bound above the cheapest plan, and never costs less than it', () => {
    const wrong = solved.filter(({ plan, truth }) => plan.lowerBound > truth! || plan.cost < truth!);
    expect(wrong.map((r) => [r.given.id, r.plan.lowerBound, r.truth, r.plan.cost])).toEqual([]);
  });

  it('finds and proves the cheapest plan of all 500', () => {
    const open = solved.filter(({ plan, truth }) => !plan.proved || plan.cost !== truth);
    expect(open.map((r) => [r.given.id, r.plan.lowerBound, r.truth, r.plan.cost])).toEqual([]);
  });

  it('passes the separate checker with every plan', () => {
    expect(solved.flatMap(({ given, plan }) => checkPlan(given, plan))).toEqual([]);
  });

  it('has every bound confirmed from its certificate alone', () => {
    expect(solved.flatMap(({ given, plan }) => checkBound(given, plan).map((f) => [given.id, f.text]))).toEqual([]);
  });
});
