import type { Step } from '../../core/layout';
import type { Point } from '../../core/point';
import type { MonthWidth } from '../../wood/year-of-width';
import type { DrawItem, Scene, TextStyle } from '../display-list';

/** px of the drawing; its plane is px, y from -height to 0. */
export interface YearSize {
  readonly width: number;
  readonly height: number;
}

const LEFT = 64;
const FOOT = 26;
const HEAD = 14;
const LABEL: TextStyle = { face: 'body', weight: 'regular', size: 14, ink: 'ink2' };
/** Least swing the chart is scaled to, inches: a still year stays flat. */
const LEAST_SWING = 1 / 32;

/**
 * Change of a top's width over the year: a curve about the width at making.
 *
 * @param gap - the back gap, inches: the curve must stay under it
 */
export function yearScene(months: readonly MonthWidth[], gap: number, step: Step, { width, height }: YearSize): Scene {
  const changes = months.map((month) => month.change);
  const high = Math.max(LEAST_SWING, gap, ...changes);
  const low = Math.min(-LEAST_SWING, ...changes);
  const x = (i: number) => LEFT + ((width - LEFT - 16) * i) / Math.max(1, months.length - 1);
  const y = (change: number) => -height + FOOT + ((height - FOOT - HEAD) * (change - low)) / (high - low);
  const fine: Step = step.endsWith('mm') ? '0.5 mm' : '1/32';
  const level = (change: number, id: string, stroke: { ink: 'ink2' | 'red'; dash?: readonly number[] }): DrawItem[] => [
    {
      layer: 'sizes',
      id,
      kind: 'line',
      from: [LEFT, y(change)],
      to: [width - 8, y(change)],
      stroke: { width: 1.3, ...stroke },
    },
    {
      layer: 'sizes',
      id,
      kind: 'length',
      at: [LEFT - 8, y(change)],
      anchor: 'end',
      middle: true,
      inches: change,
      step: fine,
      unit: false,
      style: LABEL,
    },
  ];
  const curve: readonly Point[] = months.map((month, i): Point => [x(i), y(month.change)]);
  const most = months.reduce((a, b) => (Math.abs(b.change) > Math.abs(a.change) ? b : a));
  return {
    bounds: { minX: 0, minY: -height, maxX: width, maxY: 0 },
    title: 'Width over the year',
    alt: `Width over the year against the width at making, widest change in ${most.month}. The table says the same.`,
    items: [
      ...level(0, 'making', { ink: 'ink2' }),
      ...(gap > 0 ? level(gap, 'gap', { ink: 'red', dash: [6, 4] }) : []),
      ...(Math.min(...changes) < -1e-3 ? level(Math.min(...changes), 'driest', { ink: 'ink2', dash: [3, 3] }) : []),
      { layer: 'sizes', id: 'curve', kind: 'polyline', points: curve, stroke: { ink: 'chalk', width: 3 } },
      ...months.flatMap((month, i): DrawItem[] =>
        i % Math.ceil(months.length / Math.max(2, Math.floor((width - LEFT) / 48))) === 0
          ? [
              {
                layer: 'text',
                kind: 'text',
                at: [x(i), -height + 6],
                anchor: 'middle',
                text: month.month,
                style: LABEL,
              },
            ]
          : [],
      ),
    ],
  };
}
