import { cheapestMix, type Mix } from '../bound/cheapest-mix';
import { demandOf } from '../model/problem';
import { FIT } from '../model/tolerance';
import type { Pattern } from '../plan/pattern';
import type { PricedRow } from '../pricing/priced-row';
import { provenCut, type Proof, type ProvenCut, type SearchContext } from './context';
import { coverExactly } from './cover-exactly';
import { dive, realiseUsed } from './dive';
import { lengthLeft, makePattern } from './make-pattern';
import { packSections } from './pack-sections';
import { relaxMix, type MixRelaxation } from './relax';

const MIX_NODES = 100_000;
/** Rows listed for one mix at most; with more the mix is roomy, and other ways find its plan sooner. */
const MOST_ROWS = 6000;

export interface FoundPlan {
  readonly patterns: readonly Pattern[];
  readonly picked: readonly number[];
  readonly cost: number;
}

/** A mix shown by exhaustion to be too small, with the values under which the rows were listed. */
export interface SmallMix extends Mix {
  readonly proof: Proof;
}

export type MixStep =
  | { readonly kind: 'found'; readonly plan: FoundPlan }
  /** A mix was shown too small, or put aside. */
  | { readonly kind: 'moved' }
  /** No such mix is left to look at. */
  | { readonly kind: 'done' }
  /** There are too many mixes to go through, or work ran out. */
  | { readonly kind: 'lost' };

/** What the search has learnt so far; a mix search adds to it. */
export interface Learnt {
  readonly cuts: ProvenCut[];
  readonly tooSmall: SmallMix[];
}

export interface MixSearch {
  /**
   * Looks at the cheapest mix of slabs that nothing speaks against.
   *
   * @param below - cents; only cheaper mixes
   * @param atLeast - cents; only mixes that cost as much
   * @param effort - units of work after which a mix is put aside undecided
   */
  step(below: number, atLeast: number, effort: number): MixStep;
  /** No plan of the class costs less. */
  lower(): number;
  /** Mixes put aside. */
  readonly undecided: readonly Mix[];
  /** Looks at the undecided mixes again, the cheapest first. */
  reopen(): void;
}

/**
 * Goes through mixes of slabs from the cheapest on. Each is refuted by a new inequality, by exhaustion, or found to hold
 * all parts; so the first plan found is the cheapest there is, unless a mix before it stayed undecided.
 */
export function createMixSearch(
  context: SearchContext,
  { cuts, tooSmall }: Learnt,
  firstValues: readonly number[],
): MixSearch {
  const { problem } = context;
  const prices = problem.stock.map((s) => s.price);
  const counts = problem.stock.map((s) => s.count);
  const undecided: Mix[] = [];
  let next = 0;

  function step(below: number, atLeast: number, effort: number): MixStep {
    const aside = [...tooSmall, ...undecided];
    const answer = cheapestMix({ prices, counts, cuts, tooSmall: aside, atLeast }, below, MIX_NODES);
    if (answer.kind === 'limit') return { kind: 'lost' };
    if (atLeast === 0) next = answer.kind === 'mix' ? answer.mix.cost : below;
    if (answer.kind === 'none') return { kind: 'done' };
    const { mix } = answer;
    const relaxed = relaxMix(context, mix, firstValues);
    if (relaxed.holds === 'no') {
      cuts.push(provenCut(problem, relaxed));
      return { kind: 'moved' };
    }
    if (relaxed.holds === 'unknown') return { kind: 'lost' };
    const plan = pack(mix, relaxed, effort);
    if (plan === 'unknown') undecided.push(mix);
    else if (plan !== 'too small') return { kind: 'found', plan };
    return { kind: 'moved' };
  }

  function pack(mix: Mix, relaxed: MixRelaxation, effort: number): FoundPlan | 'too small' | 'unknown' {
    let used = 0;
    const spend = (units: number): boolean => {
      used += units;
      return context.spend(units) || used > effort;
    };
    const demand = demandOf(problem, mix.picked);
    const perfect = prices.map((price, s) => Math.max(price, relaxed.worth[s]!));
    const tolerance = 1e-6 * (mix.cost + 1);
    const slack = Math.max(0, relaxed.slack) + tolerance;
    const above = perfect.map((p, s) => (mix.slabs[s]! > 0 ? p - slack : Infinity));
    realiseUsed(context, relaxed, demand);
    const dived = dive(context, demand, mix.slabs, Infinity);
    if (dived) {
      const patterns = dived.map((c) => c.pattern);
      return { patterns, picked: mix.picked, cost: patterns.reduce((sum, p) => sum + prices[p.stock]!, 0) };
    }
    const listed = context.pricing.all(relaxed.value, demand, above, MOST_ROWS, effort);
    if (!listed) return 'unknown';
    const depths = new Set(problem.stock.filter((s) => mix.slabs[s.index]! > 0).map((s) => s.depth));
    const onlyInRows = problem.items
      .filter((item) => demand[item.index]! > 0 && [...depths].every((d) => item.depth >= d - FIT))
      .map((item) => item.index);
    let plan: FoundPlan | null = null;
    const cover = coverExactly(
      problem,
      listed.rows,
      { demand, slabs: mix.slabs, perfect, slack },
      onlyInRows,
      (chosen, left, slabs) => {
        const patterns = finish(chosen, left, slabs, spend);
        if (patterns === 'impossible' || patterns === 'unknown') return patterns;
        plan = { patterns, picked: mix.picked, cost: patterns.reduce((sum, p) => sum + prices[p.stock]!, 0) };
        return 'packed';
      },
      spend,
    );
    if (plan) return plan;
    if (cover.kind !== 'none') return 'unknown';
    tooSmall.push({ ...mix, proof: { ...relaxed, penalties: [...relaxed.penalties, ...listed.penalties] } });
    return 'too small';
  }

  /** Sections for what does not lie in a row, beside the rows and on the slabs not yet used. */
  function finish(
    chosen: readonly PricedRow[],
    left: readonly number[],
    slabs: readonly number[],
    spend: (units: number) => boolean,
  ): Pattern[] | 'impossible' | 'unknown' {
    const empty = problem.stock.flatMap((stock) =>
      new Array<PricedRow>(slabs[stock.index]!).fill({ stock, items: [], value: 0, room: stock.usable }),
    );
    const all = [...chosen, ...empty];
    const rooms = all.map((row) => ({
      depth: row.stock.depth,
      length:
        row.items.length > 0
          ? lengthLeft(row.stock, context.rowsAt(row.stock.depth), row.items, problem.kerf)
          : row.stock.usable,
    }));
    const sections = packSections(problem, context.rowsAt, context.lanesAt, rooms, left, spend);
    if (!sections) return 'unknown';
    const patterns: Pattern[] = [];
    for (const [r, row] of all.entries()) {
      if (row.items.length === 0 && !sections[r]) continue;
      const pattern = makePattern(problem, row.stock, context.rowsAt(row.stock.depth), row.items, sections[r]!);
      if (!pattern) return 'unknown';
      patterns.push(pattern);
    }
    return patterns;
  }

  return {
    step,
    lower: () => Math.min(next, ...undecided.map((m) => m.cost)),
    undecided,
    reopen: () => void (undecided.length = 0),
  };
}
