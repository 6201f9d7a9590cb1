import { seeded } from '@/tests/helpers/random';

/** Draws for made-up instances. */
export interface Draw {
  /** Even in [low, high). */
  between(low: number, high: number): number;
  /** Whole number from low to high, both included. */
  whole(low: number, high: number): number;
  chance(p: number): boolean;
  shuffled<T>(list: readonly T[]): T[];
}

/** The same draws for the same seed on every machine. */
export function createDraw(seed: number): Draw {
  const { uniform, below } = seeded(seed);
  return {
    between: uniform,
    whole: (low, high) => low + below(high - low + 1),
    chance: (p) => uniform(0, 1) < p,
    shuffled: (list) => {
      const copy = [...list];
      for (let i = copy.length - 1; i > 0; i--) {
        const j = below(i + 1);
        [copy[i], copy[j]] = [copy[j]!, copy[i]!];
      }
      return copy;
    },
  };
}
