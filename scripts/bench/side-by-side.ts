/** How often each of several works is run, after runs that only warm up. */
export interface Rounds {
  readonly rounds: number;
  readonly warmUp: number;
}

/**
 * Times several works turn about, in processor time, so that what other programs take away counts for none of them.
 *
 * @param works - each gets the number of the round, so that it can take another input every time
 * @returns milliseconds of the rounds counted, one list for each work
 */
export function timeTurnAbout(works: readonly ((round: number) => unknown)[], { rounds, warmUp }: Rounds): number[][] {
  const times: number[][] = works.map(() => []);
  for (let round = 0; round < rounds + warmUp; round++) {
    works.forEach((work, i) => {
      const start = process.cpuUsage();
      work(round);
      const { user, system } = process.cpuUsage(start);
      if (round >= warmUp) times[i]!.push((user + system) / 1000);
    });
  }
  return times;
}

/** The value that this share of all values lies at or under; 0.5 gives the median. */
export function quantile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))]!;
}
