import type { Point } from '../../core/point';
import type { Ink } from '../display-list';

/** Strokes of one icon on a grid of 24, y down. */
export interface IconStroke {
  readonly paths: readonly (readonly Point[])[];
  readonly width?: number;
  readonly dash?: readonly number[];
  readonly closed?: boolean;
  readonly fill?: boolean;
  /** Colour of its own where the icon is painted in ink; else it has the icon's. */
  readonly accent?: Ink;
}

export type IconName = 'turnOver' | 'noAccess' | 'slide' | 'exclamation' | 'logo';

/** Points of an arc on the grid, degrees clockwise from the right, close enough for an icon. */
function arc(cx: number, cy: number, r: number, fromDeg: number, toDeg: number): Point[] {
  const count = 8;
  return Array.from({ length: count + 1 }, (_, i): Point => {
    const a = ((fromDeg + ((toDeg - fromDeg) * i) / count) * Math.PI) / 180;
    return [cx + r * Math.cos(a), cy + r * Math.sin(a)];
  });
}

export const ICONS: Readonly<Record<IconName, readonly IconStroke[]>> = {
  turnOver: [
    { paths: [[[2, 13], [22, 13]]], width: 2, dash: [3, 2.6] }, // prettier-ignore
    { paths: [arc(12, 9.6, 7, 190, 325), [[18.8, 2.8], [18.8, 7.8], [13.8, 7.8]], [[5, 17], [5, 21], [19, 21], [19, 17]]], width: 2 }, // prettier-ignore
  ],
  noAccess: [
    { paths: [[[3, 22], [3, 2], [22, 2]]], width: 2 }, // prettier-ignore
    { paths: [[[8, 22], [8, 8], [22, 8]]], width: 2, dash: [2.6, 2] }, // prettier-ignore
    { paths: [[[12, 13], [21, 22]], [[21, 13], [12, 22]]], width: 2 }, // prettier-ignore
  ],
  slide: [
    { paths: [[[5, 7], [0, 12], [5, 17]], [[19, 7], [24, 12], [19, 17]], [[10, 5], [10, 19]], [[14, 5], [14, 19]]], width: 2.4 }, // prettier-ignore
  ],
  exclamation: [{ paths: [[[12, 10], [12, 16]], [[12, 18], [12, 20.4]]], width: 2.4 }], // prettier-ignore
  logo: [
    { paths: [[[2, 5.75], [21.6, 1.8], [19, 22.25], [2, 22.25]]], width: 2.5, closed: true }, // prettier-ignore
    { paths: [[[3.25, 15.75], [8, 15.75], [8, 21]]], width: 2, accent: 'chalk' }, // prettier-ignore
    { paths: [[[14.4, 4.4], [15.1, 6.1], [16.2, 7.6], [17.7, 8.6], [19.5, 9.1]]], width: 2, accent: 'red' }, // prettier-ignore
  ],
};
