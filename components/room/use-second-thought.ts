import { useRef } from 'react';

const KEEP = ' Press Next once more to keep it as it is.';

/**
 * A check that warns once: the same length given again is kept, since it may be another reading that is wrong, and then the
 * fit report says that they do not go together.
 *
 * @param problem - why a length can hardly be, or null
 * @param never - why it cannot be at all, or null
 */
export function useSecondThought(
  problem: (inches: number) => string | null,
  never: (inches: number) => string | null = nothing,
): (inches: number) => string | null {
  const warned = useRef<number | null>(null);
  return (inches) => {
    const impossible = nothing(inches) ?? never(inches);
    if (impossible) return impossible;
    if (warned.current === inches) return null;
    const why = problem(inches);
    if (why === null) return null;
    warned.current = inches;
    return why + KEEP;
  };
}

const nothing = (inches: number): string | null =>
  inches > 0 ? null : 'A length of nothing is no reading. Tape it again.';
