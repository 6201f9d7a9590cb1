import type { DrawItem } from '@/geometry/scene/display-list';
import { cornerScene } from '@/geometry/scene/room/corner-scene';
import { drawMisfit } from '@/geometry/scene/room/draw-misfit';
import { sketchScene } from '@/geometry/scene/room/sketch-scene';
import { emptyLayout } from '@/shared/layout/empty-layout';

const of = <K extends DrawItem['kind']>(items: readonly DrawItem[], kind: K) =>
  items.filter((item): item is Extract<DrawItem, { kind: K }> => item.kind === kind);

describe('the picture of a corner check', () => {
  const picture = { labels: ['B', 'C'], a: 48, b: 36, c: 60, angleDeg: 90, bearing: 0, step: '1/16' } as const;

  it('draws the marks 48 and 36 in from the corner and the tape between them 60 long', () => {
    const { items } = cornerScene(picture);
    const tape = of(items, 'line').find((line) => line.stroke.ink === 'chalk')!;
    expect(tape.from[0]).toBeCloseTo(-48, 12);
    expect(tape.from[1]).toBeCloseTo(0, 12);
    expect(tape.to[0]).toBeCloseTo(0, 12);
    expect(tape.to[1]).toBeCloseTo(-36, 12);
    expect(Math.hypot(tape.from[0] - tape.to[0], tape.from[1] - tape.to[1])).toBeCloseTo(60, 12);
    expect(of(items, 'blade').map((blade) => [blade.id, blade.inches, blade.state])).toEqual([
      ['a', 48, 'set'],
      ['b', 36, 'set'],
      ['c', 60, 'selected'],
    ]);
  });

  it('turns the second wall away from the room for an outside corner, and leaves an unread tape empty', () => {
    const { items } = cornerScene({ ...picture, angleDeg: 270, c: null });
    const tape = of(items, 'line').find((line) => line.stroke.ink === 'chalk')!;
    expect(tape.to[1]).toBeCloseTo(36, 12);
    expect(of(items, 'blade').at(-1)).toMatchObject({ inches: null, state: 'empty' });
  });
});

describe('the walls under the pencil', () => {
  const sketch = { walls: ['A', 'B'], points: [[0, -96], [0, 0], [85, 85]] as const, closed: false }; // prettier-ignore

  it('has a handle at every corner, a letter and a rough length at every wall', () => {
    const { items } = sketchScene(sketch, emptyLayout(), { selected: 'point 1' });
    expect(of(items, 'mark').map((mark) => [mark.id, mark.mark])).toEqual([
      ['point 0', 'point'],
      ['point 1', 'dot'],
      ['point 2', 'point'],
    ]);
    expect(of(items, 'length').map((length) => length.inches)).toEqual([96, 120]);
  });

  it('says 135 at a bend of 45 degrees, and nothing at a square corner', () => {
    expect(of(sketchScene(sketch, emptyLayout()).items, 'text').map((item) => item.text)).toContain('135°');
    const square = { ...sketch, points: [[0, -96], [0, 0], [120, 0]] as const }; // prettier-ignore
    expect(of(sketchScene(square, emptyLayout()).items, 'text').map((item) => item.text)).toEqual(['A', 'B']);
  });
});

describe('a wall that disagrees', () => {
  const wall = { id: 'C', start: [0, 0], end: [84, 0], along: [1, 0], inward: [0, -1], length: 84 } as never;

  it('is drawn past its end and named 3/4 in over, or stopping short of it', () => {
    const over = drawMisfit(wall, 0.75, '1/16');
    expect(of(over, 'line')[0]!.to[0]).toBeGreaterThan(84);
    expect(of(over, 'runs')[0]!.runs).toEqual([expect.objectContaining({ inches: 0.75 }), { text: ' over' }]);
    const short = drawMisfit(wall, -0.5, '1/16');
    expect(of(short, 'line')[0]!.to[0]).toBeLessThan(84);
    expect(of(short, 'runs')[0]!.runs.at(-1)).toEqual({ text: ' short' });
  });
});
