import type { Reading } from '@/geometry/core/layout';
import { useSession } from '../api/use-session';
import type { PadLength } from '../measure/FractionPad';

/** Who reads and when goes with every reading. */
export function useReading(): (length: PadLength) => Reading {
  const { me } = useSession();
  return ({ text, value }) => ({ text, value, by: me?.name, at: new Date().toISOString() });
}
