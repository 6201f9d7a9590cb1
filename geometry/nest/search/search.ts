import { cheapestMix } from '../bound/cheapest-mix';
import { demandOf, type Problem } from '../model/problem';
import type { RealColumn } from './column';
import { provenCut, type ProvenCut, type SearchContext } from './context';
import { dive, realiseUsed } from './dive';
import type { Generation } from './generate-columns';
import { greedy } from './greedy';
import { improve } from './improve';
import { lengthenOffcut } from './longest-offcut';
import { areaValues, MET, relax } from './relax';
import { roundOff } from './round-off';
import {
  boundOf,
  createState,
  MIX_NODES,
  type SearchLimits,
  type SearchResult,
  type SearchState,
} from './search-state';

/** Bound and objective this share apart are near enough for a first look, and for a first dive: with sections the last bit takes long. */
const COARSE = 0.1;
const ROUGH = 0.02;
const ROUGH_IN_ROWS = 0.001;

/** Dives from the finished relaxation when there are sections: each begins elsewhere, and finds more columns than the last. */
const MORE_DIVES = 3;

/** Work that looking for a longer offcut may always take. */
const LEAST_POLISH = 20_000;

/** Looks for the cheapest plan of the class until it is proved, or until the limits say stop. */
export function search(problem: Problem, limits: SearchLimits): SearchResult {
  const state = createState(problem, limits);
  const { context } = state;
  const counts = problem.stock.map((s) => s.count);
  for (const picked of settledChoices(problem)) {
    const patterns = greedy(problem, context.rowsAt, demandOf(problem, picked), counts);
    if (patterns) state.offer(patterns, picked);
    if (context.spend(1)) break;
  }
  const isOver = (): boolean => state.done() || context.spend(0);
  const learn = (...cuts: ProvenCut[]): boolean => {
    state.learnt.cuts.push(...cuts);
    state.raise(boundOf(problem, state.learnt.cuts, state.below()));
    return isOver();
  };
  if (!learn()) {
    const coarse = relax(context, areaValues(context), COARSE);
    plunge(state, coarse, roundOff);
    if (!learn(provenCut(problem, coarse))) {
      const rough = relax(context, coarse.value, hasSections(context) ? ROUGH : ROUGH_IN_ROWS);
      if (!rough.finished) plunge(state, rough, roundOff);
      if (!learn(provenCut(problem, rough))) {
        plunge(state, rough, diveFrom(0));
        const first = relax(context, rough.value, MET);
        if (!learn(provenCut(problem, first))) {
          for (let lead = 0; lead < MORE_DIVES && hasSections(context) && !isOver(); lead++)
            plunge(state, first, diveFrom(lead));
          improve(state, first.value);
        }
      }
    }
  }
  polish(state);
  return state.result();
}

const hasSections = ({ problem, rowsAt }: SearchContext): boolean =>
  problem.stock.some((s) => rowsAt(s.depth).shallow.length > 0);

/** The longest offcut at the price found, with no more work than the price took. */
function polish(state: SearchState): void {
  const plan = state.plan();
  const end = 2 * state.spent() + LEAST_POLISH;
  const spend = (units: number): boolean => state.context.spend(units) || state.spent() > end;
  const longer = plan && !spend(0) && lengthenOffcut({ ...state.context, spend }, plan.patterns);
  if (longer) state.replace(longer);
}

type Finish = (
  context: SearchContext,
  from: Generation,
  demand: readonly number[],
  counts: readonly number[],
  below: number,
) => RealColumn[] | null;

const diveFrom =
  (lead: number): Finish =>
  (context, from, demand, counts, below) => {
    realiseUsed(context, from, demand);
    return dive(context, demand, counts, below, lead);
  };

/** A plan from a relaxation, with the options of the cheapest mix. */
function plunge({ context, learnt, below, offer }: SearchState, from: Generation, finish: Finish): void {
  const { problem } = context;
  const prices = problem.stock.map((s) => s.price);
  const counts = problem.stock.map((s) => s.count);
  const answer = cheapestMix({ prices, counts, ...learnt }, below(), MIX_NODES);
  if (answer.kind !== 'mix') return;
  const { picked } = answer.mix;
  const columns = finish(context, from, demandOf(problem, picked), counts, below());
  if (columns)
    offer(
      columns.map((c) => c.pattern),
      picked,
    );
}

/** Option numbers to try at once: every option with the others at their first. */
function settledChoices(problem: Problem): number[][] {
  const first = problem.choices.map(() => 0);
  const others = problem.choices.flatMap((choice, c) =>
    choice.options.slice(1).map((_, o) => first.map((p, i) => (i === c ? o + 1 : p))),
  );
  return [first, ...others];
}
