/**
 * Keys of a list: J and arrow down go on, K and arrow up go back, Home and End to the ends. It does not go round.
 *
 * @param at - row with the focus, -1 for none
 * @param letters - whether J and K count; single-key shortcuts can be turned off
 * @returns the row to go to, or null
 */
export function rowForKey(key: string, at: number, count: number, letters: boolean): number | null {
  if (count === 0) return null;
  const on = key === 'ArrowDown' || (letters && key === 'j');
  const back = key === 'ArrowUp' || (letters && key === 'k');
  if (on) return Math.min(at + 1, count - 1);
  if (back) return Math.max(at - 1, 0);
  if (key === 'Home') return 0;
  return key === 'End' ? count - 1 : null;
}
