/** What must hold of the slabs bought: their worths, times their numbers, reach `need`. */
export interface WorthRule {
  /** By stock entry. */
  readonly worth: readonly number[];
  readonly need: number;
}

export interface BuyQuestion {
  /** Cents and numbers by stock entry; Infinity for as many as wanted. */
  readonly prices: readonly number[];
  readonly counts: readonly number[];
  readonly rules: readonly WorthRule[];
  /** Sets of slabs known not to suffice, nor does any part of them. */
  readonly tooSmall: readonly (readonly number[])[];
}

/** Share by which a rule may be missed: rounding of the sums. */
const ROUNDING = 1e-9;
const MOST_NODES = 3_000_000;

/**
 * Whether slabs that cost less than `bound` in all satisfy every rule and are none of the sets that are too small.
 *
 * @returns 'none' when no purchase under the bound will do; 'unknown' when there are too many to go through
 */
export function cheaperPurchase(question: BuyQuestion, bound: number): 'none' | 'unknown' | readonly number[] {
  const { prices, counts, rules, tooSmall } = question;
  const order = prices.map((_, s) => s).sort((a, b) => prices[b]! - prices[a]!);
  const bought = prices.map(() => 0);
  let nodes = 0;

  /** The most worth that `money` can still buy from the entries not settled, slabs in parts allowed. */
  const reach = (rule: WorthRule, from: number, money: number): number => {
    let left = money;
    let worth = 0;
    const open = order.slice(from).sort((a, b) => prices[a]! * rule.worth[b]! - prices[b]! * rule.worth[a]!);
    for (const s of open) {
      if (rule.worth[s]! <= 0) continue;
      const n = prices[s]! > 0 ? Math.min(counts[s]!, left / prices[s]!) : counts[s]!;
      worth += n * rule.worth[s]!;
      left -= n * prices[s]!;
    }
    return worth;
  };

  const misses = (rule: WorthRule, extra: number): boolean =>
    bought.reduce((sum, n, s) => sum + (n > 0 ? n * rule.worth[s]! : 0), 0) + extra < rule.need * (1 - ROUNDING);

  /** More of an entry than this helps no rule and frees no set that is too small. */
  const mostUseful = (s: number): number => {
    const forRules = rules.map((r) => (r.worth[s]! > 0 ? Math.ceil(r.need / r.worth[s]!) : 0));
    return Math.min(counts[s]!, Math.max(0, ...forRules, ...tooSmall.map((m) => m[s]! + 1)));
  };

  const visit = (depth: number, spent: number): readonly number[] | null => {
    if (++nodes > MOST_NODES) return null;
    const money = bound - 1 - spent;
    if (money < 0 || rules.some((rule) => misses(rule, reach(rule, depth, money)))) return null;
    if (depth === order.length) return tooSmall.some((m) => bought.every((n, s) => n <= m[s]!)) ? null : [...bought];
    const s = order[depth]!;
    for (let n = 0; n <= mostUseful(s) && spent + n * prices[s]! < bound; n++) {
      bought[s] = n;
      const found = visit(depth + 1, spent + n * prices[s]!);
      if (found) return found;
    }
    bought[s] = 0;
    return null;
  };

  const found = visit(0, 0);
  return found ?? (nodes > MOST_NODES ? 'unknown' : 'none');
}
