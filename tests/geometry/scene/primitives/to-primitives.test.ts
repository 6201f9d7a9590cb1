import type { DrawItem } from '@/geometry/scene/display-list';
import {
  arcPath,
  type PathPrimitive,
  type SpanPrimitive,
  type TextPrimitive,
  type View,
} from '@/geometry/scene/primitives/primitive';
import { toPrimitives } from '@/geometry/scene/primitives/to-primitives';

const VIEW: View = { pxPerInch: 5, pixel: 1, origin: [0, 0], smallest: 11, wood: 'colour' };
const STYLE = { face: 'body', weight: 'bold', size: 18, ink: 'ink' } as const;

const texts = (item: DrawItem, view = VIEW): TextPrimitive[] =>
  toPrimitives(item, view).flatMap((p): TextPrimitive[] => (p.kind === 'span' ? (p.children as TextPrimitive[]) : p.kind === 'text' ? [p] : [])); // prettier-ignore

describe('toPrimitives', () => {
  it('turns y over: 10 in up is 50 px up the screen', () => {
    const [line] = toPrimitives(
      { kind: 'line', layer: 'walls', from: [0, 0], to: [4, 10], stroke: { ink: 'ink', width: 2.6 } },
      VIEW,
    ) as [PathPrimitive];
    expect(line.path).toEqual([['M', 0, 0], ['L', 20, -50]]); // prettier-ignore
  });

  it('keeps strokes and text in px while the drawing is zoomed', () => {
    const item: DrawItem = { kind: 'text', layer: 'sizes', at: [1, 1], text: 'Sink', style: STYLE, anchor: 'middle' };
    expect(texts(item)[0]!.size).toBe(18);
    expect(texts(item, { ...VIEW, pxPerInch: 40 })[0]!.size).toBe(18);
  });

  it('puts a casing 4 px wider under a line on wood', () => {
    const stroke = { ink: 'chalk', width: 3.6, casing: true } as const;
    const [casing, line] = toPrimitives({ kind: 'line', layer: 'seams', from: [0, 0], to: [1, 0], stroke }, VIEW);
    expect(casing).toMatchObject({ line: { paint: 'paper', width: 7.6 } });
    expect(line).toMatchObject({ line: { paint: 'chalk', width: 3.6 } });
  });

  it('draws a quarter circle within 0.03 % of its radius', () => {
    const [start, curve] = arcPath([0, 0], 100, 0, Math.PI / 2);
    const [, x1, y1, x2, y2, x3, y3] = curve as readonly ['C', number, number, number, number, number, number];
    for (let t = 0; t <= 1; t += 0.05) {
      const b = [(1 - t) ** 3, 3 * (1 - t) ** 2 * t, 3 * (1 - t) * t * t, t ** 3];
      const x = b[0]! * (start![1] as number) + b[1]! * x1 + b[2]! * x2 + b[3]! * x3;
      const y = b[1]! * y1 + b[2]! * y2 + b[3]! * y3;
      expect(Math.abs(Math.hypot(x, y) - 100)).toBeLessThan(0.03);
    }
  });

  it('gives a blade its hook at the measuring end, also when it is flipped', () => {
    const blade = {
      kind: 'blade',
      layer: 'readings',
      at: [0, 0],
      inches: 96.25,
      step: '1/16',
      turn: 0,
      state: 'set',
    } as const;
    const hookX = (item: DrawItem) => {
      const hook = (toPrimitives(item, VIEW) as PathPrimitive[]).find((p) => p.kind === 'path' && p.fill === 'hook');
      return hook!.path[0]![1] as number;
    };
    expect(hookX(blade)).toBeLessThan(0);
    expect(hookX({ ...blade, hookRight: true })).toBeGreaterThan(0);
  });

  it('shows an untaped wall as a dashed box with words and no yellow', () => {
    const empty = {
      kind: 'blade',
      layer: 'readings',
      at: [0, 0],
      inches: null,
      step: '1/16',
      turn: 0,
      state: 'empty',
    } as const;
    const primitives = toPrimitives(empty, VIEW);
    expect(primitives.some((p) => p.kind === 'path' && p.fill === 'tape')).toBe(false);
    expect(texts(empty).map((t) => t.text)).toEqual(['not taped']);
    expect(primitives[0]).toMatchObject({ line: { dash: [5, 4] } });
  });

  it('reads a stacked fraction as one text', () => {
    const [span] = toPrimitives(
      {
        kind: 'length',
        layer: 'sizes',
        at: [0, 0],
        inches: 59.6875,
        step: '1/16',
        unit: false,
        style: STYLE,
        anchor: 'start',
      },
      VIEW,
    ) as [SpanPrimitive];
    expect(span.text).toBe('59 11/16');
    expect(texts({ kind: 'length', layer: 'sizes', at: [0, 0], inches: 59.6875, step: '1/16', unit: false, style: STYLE, anchor: 'start' }).filter((t) => t.kind === 'text').map((t) => t.text)).toEqual(['59', '11', '16']); // prettier-ignore
  });

  it('says an angle in a corner tag to a tenth', () => {
    const badge = {
      kind: 'badge',
      layer: 'readings',
      at: [0, 0],
      angleDeg: 90.94,
      word: 'open 0.9',
      state: 'set',
    } as const;
    expect(texts(badge).map((t) => t.text)).toEqual(['90.9°', 'open 0.9']);
    expect(texts({ ...badge, angleDeg: null, word: 'check', state: 'unchecked' }).map((t) => t.text)).toEqual([
      '?',
      'check',
    ]);
  });
});
