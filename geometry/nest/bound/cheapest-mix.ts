import { BOUND_MARGIN } from '../model/tolerance';
import { commonStep, coverOrder, fractionalCover, stockOrder } from './cover-bound';

/** A valid inequality on what is bought: sum of worth[s] x n[s] must reach `need` plus the needs of the options picked. */
export interface MixCut {
  /** By stock entry, 0 or more. */
  readonly worth: readonly number[];
  readonly need: number;
  /** By choice, by option. */
  readonly optionNeed: readonly (readonly number[])[];
}

export interface Mix {
  readonly cost: number;
  /** By stock entry. */
  readonly slabs: readonly number[];
  /** By choice. */
  readonly picked: readonly number[];
}

export interface MixProgram {
  /** Whole cents by stock entry, and how many there are (Infinity for no limit). */
  readonly prices: readonly number[];
  readonly counts: readonly number[];
  /** At least one. */
  readonly cuts: readonly MixCut[];
  /** Mixes shown not to hold all parts: with the same options at least one slab more of some entry is needed. */
  readonly tooSmall: readonly Pick<Mix, 'slabs' | 'picked'>[];
  /** Only mixes that cost at least this, cents; 0 when left out. */
  readonly atLeast?: number;
}

export type MixAnswer =
  | { readonly kind: 'mix'; readonly mix: Mix }
  | { readonly kind: 'none' }
  /** Out of work: no mix costs less than `bound`. */
  | { readonly kind: 'limit'; readonly bound: number };

/** Share of a cut's need that counts as nothing. */
const DONE = 1e-9;
/** A slab worth less than this share of a cut's need counts for this much: its number could else be as good as endless. */
const LEAST_WORTH = 1e-4;

/** The same cut with amounts as shares of the most that can be needed: amounts in cents may be of any size. */
function toShares({ worth, need, optionNeed }: MixCut): MixCut {
  const most = need + optionNeed.reduce((sum, o) => sum + Math.max(...o), 0);
  const scale = most > 0 ? 1 / most : 1;
  return {
    worth: worth.map((w) => (w > 0 ? Math.max(LEAST_WORTH, w * scale) : 0)),
    need: need * scale,
    optionNeed: optionNeed.map((o) => o.map((n) => n * scale)),
  };
}

/**
 * The cheapest whole numbers of slabs (and option of each choice) that satisfy every cut, by branch and bound.
 *
 * @param below - only mixes cheaper than this are looked for, cents
 */
export function cheapestMix(program: MixProgram, below: number, nodeLimit: number): MixAnswer {
  const { prices, counts, tooSmall, atLeast = 0 } = program;
  const cuts = program.cuts.map(toShares);
  const choices = cuts[0]!.optionNeed;
  const step = commonStep(prices);
  const order = stockOrder(prices, cuts[0]!.worth);
  const covers = cuts.map((cut) => coverOrder(cut.worth, prices, order));
  const slabs = new Array<number>(prices.length).fill(0);
  const picked = new Array<number>(choices.length).fill(0);
  const need = cuts.map((cut) => cut.need + cut.optionNeed.reduce((sum, o) => sum + Math.min(...o), 0));
  need.forEach((n, k) => (need[k] = n * (1 - BOUND_MARGIN)));
  let best: Mix | null = null;
  let bestCost = below;
  let open = Infinity;
  let nodes = 0;

  /** Least total of this branch, a total that the prices can reach. */
  function least(depth: number, spent: number): number {
    let rest = 0;
    for (let k = 0; k < cuts.length; k++)
      rest = Math.max(rest, fractionalCover(covers[k]!, need[k]!, depth, prices, counts));
    return step > 0 ? Math.ceil((spent + rest * (1 - BOUND_MARGIN)) / step - 1e-6) * step : 0;
  }

  const stillTooSmall = (): boolean =>
    tooSmall.some((m) => m.picked.every((o, c) => o === picked[c]) && slabs.every((n, s) => n <= m.slabs[s]!));

  /** More of an entry than this changes nothing, or costs too much. */
  function mostUseful(s: number, spent: number): number {
    let most = 0;
    cuts.forEach(({ worth }, k) => {
      if (need[k]! > DONE && worth[s]! > 0) most = Math.max(most, Math.ceil(need[k]! / worth[s]! - 1e-12));
    });
    for (const m of tooSmall) most = Math.max(most, m.slabs[s]! + 1);
    if (atLeast > 0 && prices[s]! > 0) most = Math.max(most, Math.ceil(atLeast / prices[s]!));
    const affordable = prices[s]! > 0 ? Math.floor((bestCost - spent) / prices[s]!) : Infinity;
    return Math.min(most, counts[s]!, affordable);
  }

  function take(depth: number, spent: number): void {
    const total = least(depth, spent);
    nodes++;
    if (total >= bestCost) return;
    if (nodes > nodeLimit) {
      open = Math.min(open, total);
      return;
    }
    if (spent >= atLeast && need.every((n) => n <= DONE) && !stillTooSmall()) {
      best = { cost: spent, slabs: [...slabs], picked: [...picked] };
      bestCost = spent;
      return;
    }
    if (depth === order.length) return;
    const s = order[depth]!;
    for (let n = mostUseful(s, spent); n >= 0; n--) {
      slabs[s] = n;
      cuts.forEach((cut, k) => (need[k]! -= n * cut.worth[s]!));
      take(depth + 1, spent + n * prices[s]!);
      cuts.forEach((cut, k) => (need[k]! += n * cut.worth[s]!));
    }
    slabs[s] = 0;
  }

  function pick(choice: number): void {
    if (choice === choices.length) return take(0, 0);
    choices[choice]!.forEach((_, o) => {
      picked[choice] = o;
      const more = cuts.map(({ optionNeed }) => optionNeed[choice]![o]! - Math.min(...optionNeed[choice]!));
      more.forEach((a, k) => (need[k]! += a));
      if (least(0, 0) < bestCost) pick(choice + 1);
      more.forEach((a, k) => (need[k]! -= a));
    });
  }

  pick(0);
  if (open < bestCost) return { kind: 'limit', bound: open };
  return best ? { kind: 'mix', mix: best } : { kind: 'none' };
}
