import type { NestInstance } from '@/geometry/nest/types';
import type { BenchRow } from './bench-row';
import { knownInstance, knownSlabs, mixedInstance, uInstance } from './nest-instances';
import { search, type Searched } from './nest-search';
import { rectanglePackerCost } from './rectangle-packer';

/** Processor ms that a search may take: at once, and while somebody fetches coffee. */
const SHORT = 1000;
const LONG = 10_000;

const middle = (values: readonly number[]): number => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)]!;
const mean = (values: readonly number[]): number => values.reduce((sum, v) => sum + v, 0) / values.length;
const seeds = (count: number): number[] => Array.from({ length: count }, (_, i) => i + 1);
const mixed = (count: number, runs: number, strips: number, offcuts: number): NestInstance[] =>
  seeds(count).map((seed) => mixedInstance(seed, runs, strips, offcuts));
const searchAll = (instances: readonly NestInstance[], limit: number): Searched[] =>
  instances.map((instance) => search(instance, limit));

/** How many are proved, and how long the slowest took, against the time in which each should be. */
function proofRows(name: string, found: readonly Searched[], wanted: number): BenchRow[] {
  const times = found.map((s) => s.ms);
  const proved = found.filter((s) => s.plan.proved).length;
  const slowest = Math.max(...times);
  const middling = middle(times);
  return [
    against(`${name}, ${proved} of ${found.length} proved, the slowest`, slowest, 'ms', 'wanted', wanted),
    against(`${name}, the middle one`, middling, 'ms', 'first valid plan', middle(found.map((s) => s.firstMs))),
  ];
}

function gapRow(name: string, found: readonly Searched[], limit: number, wanted: number): BenchRow {
  const gaps = found.map((s) => 100 * s.plan.gap);
  const proved = found.filter((s) => s.plan.proved).length;
  const worst = Math.max(...gaps).toFixed(1);
  const text = `${name}, ${limit / 1000} s, ${proved} of ${found.length} proved, mean gap (worst ${worst} %)`;
  return against(text, mean(gaps), '%', 'wanted', wanted);
}

function against(name: string, value: number, unit: string, other: string, than: number): BenchRow {
  return { name: `nest, ${name}`, value, unit, against: { name: other, value: than }, ratio: value / than };
}

/** Sets that were sawn from whole slabs: what the plans cost against those slabs. */
function knownRow(limit: number): BenchRow {
  const sets = [1, 2, 3, 4].flatMap((slabs) => seeds(3).map((seed) => knownInstance(seed, slabs)));
  const over = searchAll(sets, limit).map(
    ({ instance, plan }) => plan.cost / (instance.stock[0]!.price * knownSlabs(instance)),
  );
  const optimal = over.filter((o) => o === 1).length;
  return against(
    `sawn from 1 to 4 slabs, ${optimal} of ${over.length} put back on as many, cost`,
    mean(over),
    '',
    'known best',
    1,
  );
}

function packerRow(name: string, found: readonly Searched[]): BenchRow {
  const ours = mean(found.map((s) => s.plan.cost)) / 100;
  const theirs = mean(found.map((s) => rectanglePackerCost(s.instance))) / 100;
  return against(`${name}, cost`, ours, '$', 'general rectangle packer', theirs);
}

/** The power of the number of parts with which the time to the proof grows. */
function growthRow(counts: readonly number[], times: readonly number[]): BenchRow {
  const first = Math.log(times[0]!);
  const last = Math.log(times[times.length - 1]!);
  const power = (last - first) / Math.log(counts[counts.length - 1]! / counts[0]!);
  const steps = counts.map((n, i) => `${n} in ${times[i]!.toFixed(0)} ms`).join(', ');
  return against(`growth with runs (${steps}), power`, power, '', 'square', 2);
}

/** A longer search of the same instance must not find a plan under a bound of the shorter one. */
function contradictions(short: readonly Searched[], long: readonly Searched[]): number {
  return short.filter(
    (s, i) => Math.max(s.plan.lowerBound, long[i]!.plan.lowerBound) > Math.min(s.plan.cost, long[i]!.plan.cost),
  ).length;
}

interface GapGoal {
  readonly name: string;
  readonly instances: readonly NestInstance[];
  /** Per cent after the short and the long time. */
  readonly wanted: readonly [number, number];
}

const gapGoals = (count: number): GapGoal[] => [
  { name: '12 runs, 20 strips', instances: mixed(count, 12, 20, 0), wanted: [6, 4] },
  { name: '20 runs, 40 strips', instances: mixed(count, 20, 40, 0), wanted: [8, 4.5] },
  { name: '100 runs pooled', instances: mixed(Math.min(3, count), 100, 0, 0), wanted: [2, 0.3] },
];

/**
 * Slab searches on instances made by the rules of `nest-instances.ts`, each plan checked; times are processor time of this
 * process. The short way leaves out the long searches and takes two instances of each kind.
 */
export async function rows({ short }: { readonly short: boolean }): Promise<BenchRow[]> {
  const few = (count: number): number => (short ? 2 : count);
  // The first searches of a process pay for loading and compiling the engine.
  seeds(10).forEach((seed) => search(uInstance(seed + 100), SHORT));
  const small = searchAll(seeds(few(10)).map(uInstance), SHORT);
  const runs = [5, 12, 20, 40].map((n) => searchAll(mixed(few(10), n, 0, 0), SHORT));
  const strips = searchAll(mixed(few(8), 12, 8, 6), SHORT);
  const tenStrips = searchAll(mixed(few(8), 10, 10, 0), SHORT);
  const list = [
    knownRow(short ? SHORT : LONG),
    ...proofRows('U of 3', small, 20),
    ...proofRows('12 runs', runs[1]!, 300),
    ...proofRows('20 runs', runs[2]!, 300),
    ...proofRows('12 runs, 8 strips, 6 offcuts', strips, 1000),
    ...proofRows('10 runs, 10 strips', tenStrips, 1000),
    growthRow(
      [5, 12, 20, 40],
      runs.map((found) => middle(found.map((s) => s.ms))),
    ),
  ];
  const seen: Searched[] = [...strips, ...tenStrips];
  let wrong = 0;
  for (const { name, instances, wanted } of gapGoals(few(6))) {
    const quick = searchAll(instances, SHORT);
    list.push(gapRow(name, quick, SHORT, wanted[0]));
    if (instances[0]!.parts.length !== 100) seen.push(...quick);
    if (short) continue;
    const long = searchAll(instances, LONG);
    list.push(gapRow(name, long, LONG, wanted[1]));
    wrong += contradictions(quick, long);
  }
  list.push(packerRow('mixed jobs', seen));
  if (!short)
    list.push({
      name: 'nest, bounds that another search contradicts',
      value: wrong,
      unit: '',
      against: null,
      ratio: null,
    });
  return list;
}
