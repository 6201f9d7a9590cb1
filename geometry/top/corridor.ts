/**
 * Longest rectangle of a given width that turns round a square corner between two corridors, kept level: the smallest of
 * `L(t) = A / cos t + B / sin t - w / (sin t cos t)` over the turn t.
 *
 * @param a, b - clear widths of the two corridors, inches
 * @param width - width of what is carried, inches
 * @returns inches; 0 when it is as wide as a corridor
 * @see Moretti, College Mathematics Journal 33(3) 2002, 196-200; w = 0 is the ladder, (a^(2/3) + b^(2/3))^(3/2)
 */
export function longestRoundCorner(a: number, b: number, width: number): number {
  if (width >= Math.min(a, b)) return 0;
  // L falls and then rises; with s = sin t, c = cos t its slope is (A s^3 - B c^3 - w (s^2 - c^2)) / (s c)^2.
  let low = 0;
  let high = Math.PI / 2;
  for (let i = 0; i < HALVINGS; i++) {
    const t = (low + high) / 2;
    const [s, c] = [Math.sin(t), Math.cos(t)];
    if (a * s ** 3 - b * c ** 3 - width * (s * s - c * c) < 0) low = t;
    else high = t;
  }
  const t = (low + high) / 2;
  return Math.max(0, a / Math.cos(t) + b / Math.sin(t) - width / (Math.sin(t) * Math.cos(t)));
}

/** Halvings of a right angle down to the last bits of float64. */
const HALVINGS = 60;

/**
 * Whether a rectangle passes a corridor corner: turned round it, or slid in along one leg and out sideways along the other,
 * which needs no turning when it is no longer than the other leg is wide.
 */
export function passesCorner(a: number, b: number, length: number, width: number): boolean {
  const slides = (length <= b && width <= a) || (length <= a && width <= b);
  return slides || length <= longestRoundCorner(a, b, width);
}
