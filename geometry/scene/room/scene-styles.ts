import type { Point } from '../../core/point';
import type { TextStyle } from '../display-list';

/** Type of drawings on screen, px. */
export const text = {
  wall: { face: 'label', weight: 'bold', size: 24, ink: 'ink' },
  fixture: { face: 'label', weight: 'semibold', size: 17, ink: 'ink2' },
  caption: { face: 'label', weight: 'semibold', size: 17, ink: 'ink' },
  alarm: { face: 'label', weight: 'semibold', size: 17, ink: 'red' },
  alarmNumber: { face: 'body', weight: 'bold', size: 16, ink: 'red' },
  number: { face: 'body', weight: 'bold', size: 16, ink: 'ink' },
} as const satisfies Readonly<Record<string, TextStyle>>;

/** Past this a text along a line would be read upside down, and is flipped; radians. */
const FLIP = (100 * Math.PI) / 180;

/** Direction of a line as an angle at which text on it can be read. */
export function readable(direction: Point): { readonly turn: number; readonly flipped: boolean } {
  const angle = Math.atan2(direction[1], direction[0]);
  const flipped = Math.abs(angle) > FLIP;
  return { turn: flipped ? angle - Math.sign(angle) * Math.PI : angle, flipped };
}
