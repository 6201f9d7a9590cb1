const FIRST = 'P'.charCodeAt(0);
const COUNT = 'Z'.charCodeAt(0) - FIRST + 1;

/** The letter at `index`: P to Z, then P2 to Z2, P3 … */
function pieceLetter(index: number): string {
  const round = Math.floor(index / COUNT);
  return `${String.fromCharCode(FIRST + (index % COUNT))}${round === 0 ? '' : round + 1}`;
}

/**
 * A letter for every piece. A piece that has one keeps it; the others get the next free one in the order given. A letter
 * ever given stays taken, also when its piece is gone, so that none stands for two pieces on two sheets.
 *
 * @param keys - piece keys in reading order
 * @param given - letters by piece key
 */
export function assignLetters(
  keys: readonly string[],
  given: Readonly<Record<string, string>>,
): ReadonlyMap<string, string> {
  const taken = new Set(Object.values(given));
  let next = 0;
  const letters = new Map<string, string>();
  for (const key of keys) {
    const own = Object.hasOwn(given, key) ? given[key] : undefined;
    if (own !== undefined) {
      letters.set(key, own);
      continue;
    }
    while (taken.has(pieceLetter(next))) next++;
    letters.set(key, pieceLetter(next++));
  }
  return letters;
}
