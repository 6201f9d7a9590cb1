import type { Layout } from '../../core/layout';
import { along } from '../../core/vector';
import { roundLength } from '../../tape/format-length';
import type { WallFrame } from '../../top/wall-frame';
import type { DrawItem } from '../display-list';
import { text } from './scene-styles';

/** px the overshoot is drawn long: what is off by 3/4 in would not be seen. */
const REACH = 7;

/**
 * At the end of a wall that disagrees: how far its tape went past where the others say it ends, or stopped short of it.
 *
 * @param off - taped less what it should read, inches
 */
export function drawMisfit(wall: WallFrame, off: number, step: Layout['step']): DrawItem[] {
  const tag = { layer: 'readings', id: `wall ${wall.id}` } as const;
  const end = along(wall.end, wall.along, off > 0 ? REACH : -REACH);
  const rough = step.endsWith('mm')
    ? Math.abs(off)
    : Math.max(1 / 16, roundLength(Math.abs(off), off > 0.5 ? '1/8' : '1/16'));
  return [
    { ...tag, kind: 'line', from: wall.end, to: end, stroke: { ink: 'red', width: 4, dash: [4, 4] } },
    {
      ...tag,
      kind: 'line',
      from: along(end, wall.inward, 3),
      to: along(end, wall.inward, -3),
      stroke: { ink: 'red', width: 4 },
    },
    {
      ...tag,
      kind: 'runs',
      at: end,
      shift: [wall.along[0] * 20 + wall.inward[0] * 26, wall.along[1] * 20 + wall.inward[1] * 26],
      runs: [{ inches: rough, step, unit: true, style: text.alarmNumber }, { text: off > 0 ? ' over' : ' short' }],
      style: text.alarm,
      anchor: 'middle',
      middle: true,
      ground: 'card',
    },
  ];
}
