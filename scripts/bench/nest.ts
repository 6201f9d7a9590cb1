import { nest } from '@/geometry/nest/nest';
import type { NestInstance } from '@/geometry/nest/types';
import { checkPlan } from '@/shared/nest-check/check-plan';
import type { BenchRow } from './bench-row';
import { mixedInstance, uInstance } from './nest-instances';

/** ms a search may take. */
const LIMIT = 1000;

interface Searched {
  readonly ms: number;
  /** Until the first valid plan stood. */
  readonly firstMs: number;
  readonly overBound: number;
  readonly proved: boolean;
}

/** Searches one instance; every plan has to pass the independent checker. */
function search(instance: NestInstance): Searched {
  const begun = performance.now();
  let first = 0;
  const plan = nest(instance, {
    stop: () => performance.now() - begun > LIMIT,
    onBetter: () => (first ||= performance.now() - begun),
  });
  const ms = performance.now() - begun;
  if ('error' in plan) throw new Error(plan.error.message);
  const [wrong] = checkPlan(instance, plan);
  if (wrong) throw new Error(`${instance.id}: ${wrong.text}`);
  return { ms, firstMs: first || ms, overBound: plan.cost / plan.lowerBound, proved: plan.proved };
}

const middle = (values: readonly number[]): number => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)]!;
const mean = (values: readonly number[]): number => values.reduce((sum, v) => sum + v, 0) / values.length;

function rowsOf(name: string, instances: readonly NestInstance[]): BenchRow[] {
  const found = instances.map(search);
  const first = middle(found.map((s) => s.firstMs));
  const whole = middle(found.map((s) => s.ms));
  const proved = found.filter((s) => s.proved).length;
  const over = mean(found.map((s) => s.overBound));
  return [
    {
      name: `nest, ${name}, ${proved} of ${found.length} proved within ${LIMIT} ms`,
      value: whole,
      unit: 'ms',
      against: { name: 'first valid plan', value: first },
      ratio: whole / first,
    },
    {
      name: `nest, ${name}, cost`,
      value: over,
      unit: 'bound',
      against: { name: 'lower bound', value: 1 },
      ratio: over,
    },
  ];
}

const seeds = (count: number): number[] => Array.from({ length: count }, (_, i) => i + 1);

/** Slab searches of growing size, each plan checked: time to the end against time to the first plan, cost against the bound. */
export async function rows(): Promise<BenchRow[]> {
  // The first search of a process pays for loading the engine.
  search(uInstance(99));
  return [
    ...rowsOf('U of 3', seeds(10).map(uInstance)),
    ...rowsOf(
      '12 runs',
      seeds(6).map((seed) => mixedInstance(seed, 12, 0, 0)),
    ),
    ...rowsOf(
      '20 runs',
      seeds(6).map((seed) => mixedInstance(seed, 20, 0, 0)),
    ),
    ...rowsOf(
      '12 runs, 8 strips, 6 offcuts',
      seeds(4).map((seed) => mixedInstance(seed, 12, 8, 6)),
    ),
  ];
}
