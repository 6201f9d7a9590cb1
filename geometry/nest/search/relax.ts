import type { Mix } from '../bound/cheapest-mix';
import { coverOrder, fractionalCover } from '../bound/cover-bound';
import { demandOf } from '../model/problem';
import { provenCut, type SearchContext } from './context';
import { generateColumns, type Generation } from './generate-columns';

/** Bound and objective this share apart have met. */
export const MET = 1e-7;

/** Cents of penalty that are rounding, not an uncut part. */
const NOTHING = 1e-3;

/** Far more than any part can cost in slabs: what leaving one uncut costs in a master program. */
const penalties = ({ problem }: SearchContext): number[] => {
  const most = Math.max(...problem.stock.map((s) => s.price));
  return problem.items.map(() => 1000 * (most + 100));
};

/**
 * The cheapest fractional plan over all patterns, and the item values that prove the best bound.
 *
 * @param first - item values to begin with
 * @param apart - share by which bound and objective may lie apart in the end
 */
export function relax(context: SearchContext, first: readonly number[], apart: number): Generation {
  const { problem } = context;
  const prices = problem.stock.map((s) => s.price);
  const counts = problem.stock.map((s) => s.count);
  const order = problem.stock.map((_, s) => s);
  return generateColumns(
    context,
    { demand: problem.fixed.need, withChoices: true, counts, cost: prices, penalty: penalties(context) },
    first,
    (value, worth) => {
      const cut = provenCut(problem, { value, worth, penalties: [] });
      const need = cut.need + cut.optionNeed.reduce((sum, o) => sum + Math.min(...o), 0);
      return fractionalCover(coverOrder(cut.worth, prices, order), need, 0, prices, counts);
    },
    (bound, answer) => answer.shortfall < NOTHING && bound >= answer.objective * (1 - apart),
  );
}

export type MixRelaxation = Generation & {
  /** 'no': these slabs cannot hold the parts even in fractions. */
  readonly holds: 'yes' | 'no' | 'unknown';
  /** Cents between the mix's cost and the bound: what its columns may fall short of the best ones in all. */
  readonly slack: number;
};

/** Whether a mix of slabs holds the parts when patterns may be used in fractions, at the least cost. */
export function relaxMix(context: SearchContext, mix: Mix, first: readonly number[]): MixRelaxation {
  const { problem } = context;
  const prices = problem.stock.map((s) => s.price);
  const demand = demandOf(problem, mix.picked);
  const tolerance = 1e-6 * (mix.cost + 1);
  const generation = generateColumns(
    context,
    { demand, withChoices: false, counts: mix.slabs, cost: prices, penalty: penalties(context) },
    first,
    (value, worth) =>
      value.reduce((sum, v, i) => sum + v * demand[i]!, 0) -
      worth.reduce((sum, w, s) => sum + (mix.slabs[s]! > 0 ? mix.slabs[s]! * Math.max(0, w - prices[s]!) : 0), 0),
    (bound, answer) =>
      bound > mix.cost + tolerance || (answer.shortfall < NOTHING && bound >= answer.objective * (1 - MET)),
  );
  const slack = mix.cost - generation.bound;
  const holds = slack < -tolerance ? 'no' : generation.answer.shortfall < NOTHING ? 'yes' : 'unknown';
  return { ...generation, holds, slack };
}

/** Each item at its area's share of the cheapest slab: a first guess at what it costs. */
export function areaValues({ problem }: SearchContext): number[] {
  const rate = Math.min(...problem.stock.map((s) => (s.price + 1) / Math.max(1, s.usable * s.depth)));
  return problem.items.map((item) => item.area * rate);
}
