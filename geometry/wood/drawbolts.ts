import { constant } from './sourced';

export const FIRST_BOLT = constant('First drawbolt from either end of a joint', 6, 'in', 'common practice', '');
export const BOLT_SPACING = constant('Drawbolts apart at most', 12, 'in', 'common practice', '');

/**
 * Centres of the drawbolts that pull a site joint together, inches from its back point, evenly between the first and the
 * last. A joint under twice the end distance gets one in its middle.
 */
export function drawboltsAlong(length: number): readonly number[] {
  const room = length - 2 * FIRST_BOLT.value;
  if (room <= 0) return length > 0 ? [length / 2] : [];
  const gaps = Math.max(1, Math.ceil(room / BOLT_SPACING.value - 1e-9));
  return Array.from({ length: gaps + 1 }, (_, i) => FIRST_BOLT.value + (room * i) / gaps);
}
