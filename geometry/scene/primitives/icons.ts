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
    { paths: [arc(12, 10, 7, 200, 330), [[19, 2.5], [18.2, 6.7], [14, 6]]], width: 2 }, // prettier-ignore
    { paths: [[[1, 12], [23, 12]]], width: 2, dash: [3, 2.4] }, // prettier-ignore
    { paths: [[[5, 16], [5, 21], [19, 21], [19, 16]]], width: 2 }, // prettier-ignore
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
    { paths: [[[3, 5.4], [21.4, 2.1], [19.5, 21.8], [3, 21.8]]], width: 2.6, closed: true }, // prettier-ignore
    { paths: [[[4, 15.8], [8.6, 15.8], [8.6, 20.8]]], width: 2, accent: 'chalk' }, // prettier-ignore
    { paths: [arc(20.9, 2.6, 7.6, 168, 95)], width: 2, accent: 'red' },
  ],
};
