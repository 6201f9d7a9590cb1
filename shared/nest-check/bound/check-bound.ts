import type { NestEvidence, NestInstance, NestPlan, NestSmallMix, NestValuation } from '@/geometry/nest/types';
import { areaOf, edgesOf } from '../polygons';
import type { NestFinding } from '../finding';
import { keyOf, readSettlements, type BoundPart, type Settlement } from './bound-parts';
import { cheaperPurchase, type WorthRule } from './buy-check';
import { createSectionBound, type Offer } from './section-worth';
import { cannotCover } from './small-mix';
import { mostWorth, rowsWorth, type SlabSearch } from './slab-worth';
import { CLASS_FIT } from './row-length';

const NODES = 400_000;
const MOST_ROWS = 20_000;

/**
 * Works the lower bound of a plan out again from its certificate, with code of its own: the worth of every slab under each
 * valuation, the mixes said to be too small, and the cheapest purchase that all of it allows.
 *
 * @returns nothing when the bound stands; else one finding that says why it could not be confirmed
 */
export function checkBound(instance: NestInstance, plan: NestPlan): NestFinding[] {
  const why = refuse(instance, plan);
  return why === null
    ? []
    : [{ code: 'bound_not_confirmed', text: `The lower bound ${plan.lowerBound} is not confirmed: ${why}.` }];
}

function refuse(instance: NestInstance, { lowerBound, certificate }: NestPlan): string | null {
  if (lowerBound <= 0) return null;
  if (certificate.kind === 'duals' && !certificate.evidence) return 'its evidence was not handed out';
  const read = readSettlements(instance);
  if (!read)
    return certificate.kind === 'area'
      ? 'the choices are too many'
      : 'a part is no trapezoid or the choices are too many';
  const evidence: NestEvidence =
    certificate.kind === 'duals' ? certificate.evidence! : { valuations: [], tooSmall: [] };
  const apart = neverTogether(read.settlements);
  const worths: number[][] = [];
  for (const valuation of evidence.valuations) {
    const worth = worthOfSlabs(instance, read.parts, mostNeeded(read.settlements), valuation, apart);
    if (!worth) return 'a valuation is too large to check';
    worths.push(worth);
  }
  for (const mix of evidence.tooSmall)
    if (!isTooSmall(instance, read.parts, read.settlements, mix)) return 'slabs said to be too small may not be';
  const prices = instance.stock.map((s) => s.price);
  const counts = instance.stock.map((s) => s.count ?? Infinity);
  for (const settlement of read.settlements) {
    const rules: WorthRule[] = [
      areaRule(instance, read.parts, settlement),
      ...evidence.valuations.map((v, i) => ({ worth: worths[i]!, need: worthOfParts(v, settlement) })),
    ];
    const tooSmall = evidence.tooSmall
      .filter((mix) => sameChoices(instance, mix, settlement))
      .map((mix) => instance.stock.map((s) => mix.slabs.find((m) => m.stock === s.id)?.count ?? 0));
    const cheaper = cheaperPurchase({ prices, counts, rules, tooSmall }, lowerBound);
    if (cheaper === 'unknown') return 'there are too many sets of slabs to go through';
    if (cheaper !== 'none')
      return `the slabs ${cheaper.join(', ')} (by stock entry) would cost less and nothing speaks against them`;
  }
  return null;
}

/** Parts swollen by half a kerf lie apart inside a slab swollen as much: true of every plan. */
function areaRule(
  { kerf, trim, stock }: NestInstance,
  parts: ReadonlyMap<string, BoundPart>,
  { needs }: Settlement,
): WorthRule {
  const half = kerf / 2;
  let need = 0;
  for (const [key, count] of needs)
    for (const outline of parts.get(key)!.outlines) {
      const girth = edgesOf(outline).reduce((sum, [p, q]) => sum + Math.hypot(q[0] - p[0], q[1] - p[1]), 0);
      need += count * (areaOf(outline) + girth * half + Math.PI * half * half);
    }
  const grown = (length: number): number => length + kerf + CLASS_FIT;
  return { need, worth: stock.map((s) => Math.max(0, grown(s.length - 2 * (s.trim ?? trim))) * grown(s.depth)) };
}

const asMap = (values: NestValuation['values']): Map<string, number> =>
  new Map(values.map((v) => [keyOf(v.parts), v.cents]));

function worthOfParts({ values }: NestValuation, { needs }: Settlement): number {
  const worth = asMap(values);
  return [...needs].reduce((sum, [key, count]) => sum + count * (worth.get(key) ?? 0), 0);
}

/** Most copies of each part that any way of settling the choices cuts. */
function mostNeeded(settlements: readonly Settlement[]): Map<string, number> {
  const most = new Map<string, number>();
  for (const { needs } of settlements) for (const [key, n] of needs) most.set(key, Math.max(n, most.get(key) ?? 0));
  return most;
}

/** Two parts that no way of settling the choices cuts both. */
function neverTogether(settlements: readonly Settlement[]): (a: string, b: string) => boolean {
  if (settlements.length === 1) return () => false;
  const known = new Map<string, boolean>();
  return (a, b) => {
    const key = a < b ? `${a}|${b}` : `${b}|${a}`;
    let apart = known.get(key);
    if (apart === undefined) known.set(key, (apart = !settlements.some((s) => s.needs.has(a) && s.needs.has(b))));
    return apart;
  };
}

function slabSearches(
  instance: NestInstance,
  parts: ReadonlyMap<string, BoundPart>,
  needs: ReadonlyMap<string, number>,
  valuation: NestValuation,
  apart: (a: string, b: string) => boolean,
): SlabSearch[] {
  const worth = asMap(valuation.values);
  const penalties = valuation.penalties.map(asMap);
  const offers = [...needs].map(([key, count]): Offer => ({
    part: parts.get(key)!,
    count,
    worth: worth.get(key) ?? 0,
  }));
  const sections = new Map<number, SlabSearch['section']>();
  return instance.stock.map((slab) => {
    const section = sections.get(slab.depth) ?? createSectionBound(offers, slab.depth, instance.kerf, penalties);
    sections.set(slab.depth, section);
    const usable = slab.length - 2 * (slab.trim ?? instance.trim);
    return { slab, usable, kerf: instance.kerf, offers, apart, section, nodeLimit: NODES };
  });
}

export function worthOfSlabs(...args: Parameters<typeof slabSearches>): number[] | null {
  const worths = slabSearches(...args).map(mostWorth);
  return worths.every((w) => w !== null) ? worths : null;
}

const sameChoices = ({ choices = [] }: NestInstance, mix: NestSmallMix, { picked }: Settlement): boolean =>
  choices.every((choice, c) => mix.choices.find((m) => m.id === choice.id)?.option === picked[c]);

/** The parts of this settlement find no place on these slabs: not even the parts that must lie in rows do. */
function isTooSmall(
  instance: NestInstance,
  parts: ReadonlyMap<string, BoundPart>,
  settlements: readonly Settlement[],
  mix: NestSmallMix,
): boolean {
  const settlement = settlements.find((s) => sameChoices(instance, mix, s));
  if (!settlement) return false;
  const slabs = instance.stock.map((s) => mix.slabs.find((m) => m.stock === s.id)?.count ?? 0);
  const used = slabSearches(instance, parts, settlement.needs, mix, () => false).map((search, s) => ({ search, s }));
  const searches = used.filter(({ s }) => slabs[s]! > 0);
  const best = searches.map(({ search }) => mostWorth(search));
  if (best.some((b) => b === null)) return false;
  const total = searches.reduce((sum, { s }, i) => sum + slabs[s]! * best[i]!, 0);
  const slack = total - worthOfParts(mix, settlement) + 1e-6 * (total + 1);
  if (slack < 0) return true;
  const rows = searches.map(({ search, s }, i) => ({
    s,
    best: best[i]!,
    rows: rowsWorth(search, best[i]! - slack - 1e-6, MOST_ROWS),
  }));
  if (rows.some((r) => r.rows === null)) return false;
  const depths = new Set(searches.map(({ search }) => search.slab.depth));
  const needs = new Map(
    [...settlement.needs].filter(([key]) => [...depths].every((d) => parts.get(key)!.depth >= d - CLASS_FIT)),
  );
  const list = rows.flatMap((r) => r.rows!.map((row) => ({ stock: r.s, row, short: r.best - row.worth })));
  return cannotCover({ rows: list, slabs, needs, slack }) === true;
}
