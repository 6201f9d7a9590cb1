import type { Layout } from '../../core/layout';
import type { Point, Polygon } from '../../core/point';
import { along, cross, distance, subtract, unit } from '../../core/vector';
import type { Plan } from '../../plan/types';
import type { PlacedCutout, TopSeam } from '../../top/types';
import type { DrawItem, Ink } from '../display-list';
import { woodLook } from '../primitives/wood-look';
import { text } from '../room/scene-styles';

type Joint = Plan['joints'][number];

/** Inches from a joint's front corner into the room to its blade. */
const LEADER = 9;
/** px from a seam's front end to its handle, and on to its blade and words. */
const HANDLE_OFF = 52;
const HANDLE = 46;

/** The line of a joint, from its back corner to its front corner. */
export function drawJoint(joint: Joint, layout: Layout, selected = false, ink: Ink = 'ink'): DrawItem {
  return {
    layer: 'joints',
    id: joint.between.join('-'),
    kind: 'line',
    from: joint.from,
    to: joint.to,
    stroke: selected
      ? { ink: 'chalk', width: 5, casing: true }
      : { ink, width: 3.2, casing: woodLook(layout.material.species).dark },
  };
}

/** Length of a joint on a blade before its front corner: computed, so it stands without being typed. */
export function drawJointSize(joint: Joint, layout: Layout): DrawItem[] {
  const dir = unit(joint.from, joint.to);
  if (!dir) return [];
  const end = along(joint.to, dir, LEADER);
  const tag = { layer: 'sizes', id: joint.between.join('-') } as const;
  const down = -1;
  return [
    { ...tag, kind: 'line', from: joint.to, to: end, stroke: { ink: 'ink', width: 1.3 } },
    { ...tag, kind: 'mark', at: joint.to, mark: 'dot', size: 8, ink: 'ink' },
    {
      ...tag,
      kind: 'blade',
      at: end,
      shift: [dir[0] * 40, down * 14],
      inches: joint.length,
      step: layout.step,
      turn: 0,
      state: 'set',
    },
    {
      ...tag,
      kind: 'text',
      at: end,
      shift: [dir[0] * 40, down * 46],
      text: `${joint.kind} ${joint.letters.join(' to ')}`,
      style: text.fixture,
      anchor: 'middle',
      middle: true,
    },
  ];
}

/** Connector centres along the joint. */
export function drawConnectors(joint: Joint): DrawItem[] {
  const dir = unit(joint.from, joint.to);
  if (!dir) return [];
  return joint.connectors.map((at) => ({
    layer: 'hardware',
    id: joint.between.join('-'),
    kind: 'mark',
    at: along(joint.from, dir, at),
    mark: 'dot',
    size: 9,
    ink: 'red',
  }));
}

/** A seam: solid where it will be seen, dotted where the cutout takes it away. */
export function drawSeam(seam: TopSeam, cutouts: readonly PlacedCutout[]): DrawItem[] {
  const tag = { layer: 'seams', id: seamName(seam) } as const;
  const hidden = seam.inCutout === null ? undefined : cutouts.find((c) => c.id === seam.inCutout);
  return splitAt(seam.from, seam.to, hidden?.outline ?? []).map(({ from, to, inside }) => ({
    ...tag,
    kind: 'line',
    from,
    to,
    stroke: inside ? { ink: 'chalk', width: 3.6, dash: [2, 5] } : { ink: 'chalk', width: 3.6, casing: true },
  }));
}

/** The handle that slides a seam, with what stays visible on a blade under it. */
export function drawSeamHandle(seam: TopSeam, layout: Layout): DrawItem[] {
  const dir = unit(seam.from, seam.to);
  if (!dir) return [];
  const tag = { layer: 'seams', id: seamName(seam) } as const;
  const off = (px: number): Point => [dir[0] * px, dir[1] * px];
  // A blade lies level, so it needs more room beside the handle than under it.
  const bladeOff = HANDLE_OFF + 50 + 32 * Math.abs(dir[0]);
  return [
    {
      ...tag,
      kind: 'mark',
      at: seam.to,
      shift: off(HANDLE_OFF),
      mark: 'handle',
      size: HANDLE,
      ink: 'chalk',
      turn: Math.atan2(-dir[1], -dir[0]),
    },
    {
      ...tag,
      kind: 'blade',
      at: seam.to,
      shift: off(bladeOff),
      inches: seam.visible,
      step: layout.step,
      turn: 0,
      state: 'selected',
    },
    {
      ...tag,
      kind: 'text',
      at: seam.to,
      shift: [off(bladeOff)[0], off(bladeOff)[1] - 32],
      text: `visible seam ${seam.letters.join(' to ')}`,
      style: text.caption,
      anchor: 'middle',
      middle: true,
    },
  ];
}

/** Two letters name a seam: no two seams part the same pieces. */
export const seamName = (seam: TopSeam): string => seam.letters.join('-');

/** A segment in the parts that lie outside and inside an outline. */
export function splitAt(
  from: Point,
  to: Point,
  outline: Polygon,
): { readonly from: Point; readonly to: Point; readonly inside: boolean }[] {
  const whole = subtract(to, from);
  const length = distance(from, to);
  const cuts = outline.flatMap((a, i) => {
    const edge = subtract(outline[(i + 1) % outline.length]!, a);
    const d = cross(whole, edge);
    if (Math.abs(d) < 1e-12) return [];
    const t = cross(subtract(a, from), edge) / d;
    const s = cross(subtract(a, from), whole) / d;
    return s >= 0 && s < 1 && t > 1e-9 && t < 1 - 1e-9 ? [t] : [];
  });
  const marks = [0, ...[...new Set(cuts)].sort((p, q) => p - q), 1];
  return marks.slice(1).flatMap((end, i) => {
    const start = marks[i]!;
    if ((end - start) * length < 1e-6) return [];
    const point = (t: number): Point => [from[0] + whole[0] * t, from[1] + whole[1] * t];
    return [{ from: point(start), to: point(end), inside: i % 2 === 1 }];
  });
}
