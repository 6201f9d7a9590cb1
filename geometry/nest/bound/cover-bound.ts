/** Greatest whole number of cents that divides every price: totals are its multiples. 0 when every price is 0. */
export function commonStep(prices: readonly number[]): number {
  return prices.reduce((a, b) => {
    while (b) [a, b] = [b, a % b];
    return a;
  }, 0);
}

/** Stock entries, least cents for what they hold first. */
export function stockOrder(prices: readonly number[], worth: readonly number[]): number[] {
  const rate = (s: number): number => (worth[s]! > 0 ? prices[s]! / worth[s]! : Infinity);
  return prices.map((_, s) => s).sort((a, b) => rate(a) - rate(b) || a - b);
}

/** For one cut: entries by cents for its worth, with each one's place in the order of branching. */
export interface CoverOrder {
  readonly entries: readonly { readonly s: number; readonly worth: number; readonly depth: number }[];
}

export function coverOrder(worth: readonly number[], prices: readonly number[], order: readonly number[]): CoverOrder {
  const sorted = stockOrder(prices, worth).filter((s) => worth[s]! > 0);
  return { entries: sorted.map((s) => ({ s, worth: worth[s]!, depth: order.indexOf(s) })) };
}

/**
 * Least cost of reaching `need` when slabs may be bought in parts, from the entries not yet branched on.
 *
 * @param depth - entries with a place before this one are settled
 * @returns cents; Infinity when the counts do not allow it
 */
export function fractionalCover(
  cover: CoverOrder,
  need: number,
  depth: number,
  prices: readonly number[],
  counts: readonly number[],
): number {
  let rest = need;
  let cost = 0;
  if (rest <= 0) return 0;
  for (const { s, worth, depth: place } of cover.entries) {
    if (place < depth) continue;
    // Said by the counts, not by what rounding leaves of `rest`.
    if (rest <= counts[s]! * worth) return cost + (rest / worth) * prices[s]!;
    cost += counts[s]! * prices[s]!;
    rest -= counts[s]! * worth;
  }
  return Infinity;
}
