import { render } from '@testing-library/react';
import { G, Svg } from 'react-native-svg';

import { PaintSvg, type InkColors } from '@/components/canvas/paint-svg';
import { pathData } from '@/components/canvas/path-data';
import { stableScene, useStableScene } from '@/components/canvas/use-stable-scene';
import { color, palettes } from '@/components/ui/tokens';
import type { DrawItem, Scene } from '@/geometry/scene/display-list';
import * as lowering from '@/geometry/scene/primitives/to-primitives';

jest.mock('@/geometry/scene/primitives/to-primitives', () => {
  const actual = jest.requireActual<typeof lowering>('@/geometry/scene/primitives/to-primitives');
  return { toPrimitives: jest.fn(actual.toPrimitives) };
});

const drawn = jest.mocked(lowering.toPrimitives);

const STYLE = { face: 'body', weight: 'bold', size: 18, ink: 'ink' } as const;

const wall: DrawItem = {
  layer: 'walls',
  id: 'A',
  kind: 'line',
  from: [0, 0],
  to: [96, 0],
  stroke: { ink: 'ink', width: 2.6 },
};
const size: DrawItem = { layer: 'sizes', id: 'A', kind: 'length', at: [48, 4], inches: 96.25, step: '1/16', unit: true, style: STYLE, anchor: 'middle' }; // prettier-ignore
const wood: DrawItem = {
  layer: 'staves',
  id: 'P',
  kind: 'staves',
  outline: [[0, 0], [30, 0], [30, 25], [0, 25]], // prettier-ignore
  along: [1, 0],
  origin: [0, 0],
  width: 1.5,
  species: 'hard maple',
  seed: 'P',
};

const sceneOf = (...items: DrawItem[]): Scene => ({ bounds: { minX: 0, minY: 0, maxX: 96, maxY: 25 }, items });

const paint = (scene: Scene, pxPerInch = 5, colors?: InkColors) =>
  render(
    <Svg width={500} height={300}>
      <PaintSvg scene={scene} pxPerInch={pxPerInch} {...(colors ? { colors } : {})} />
    </Svg>,
  );

beforeEach(() => drawn.mockClear());

describe('PaintSvg', () => {
  it('draws a wall of 96 in as 480 px at 5 px an inch, its stroke 2.6 px at any zoom', () => {
    for (const zoom of [5, 20]) {
      const path = paint(sceneOf(wall), zoom).container.querySelector('path')!;
      expect(path.getAttribute('d')).toBe(`M0 0L${96 * zoom} 0`);
      expect(path.getAttribute('stroke-width')).toBe('2.6');
    }
  });

  it('stacks a fraction in text of its own: 96, 1 over 4, in', () => {
    const texts = Array.from(paint(sceneOf(size)).container.querySelectorAll('text'));
    expect(texts.map((t) => t.textContent)).toEqual(['96', '1', '4', 'in']);
    const y = (i: number) => Number(texts[i]!.getAttribute('y'));
    expect(y(1)).toBeLessThan(y(0));
    expect(y(2)).toBeGreaterThan(y(0));
  });

  it('paints in the theme’s own colours unless told otherwise, so that a theme change paints nothing again', () => {
    expect(paint(sceneOf(wall)).container.querySelector('path')!.getAttribute('stroke')).toBe(color.ink);
    expect(paint(sceneOf(wall), 5, palettes.dark).container.querySelector('path')!.getAttribute('stroke')).toBe(
      '#F3EEE2',
    );
  });

  it('paints a page of paper black on white, its px growing with it', () => {
    const page: Scene = { ...sceneOf({ ...wall, from: [0, 1], to: [2, 1] }), paper: { width: 11, height: 8.5 } };
    const path = paint(page, 48).container.querySelector('path')!;
    expect(path.getAttribute('stroke')).toBe('#000000');
    expect(path.getAttribute('d')).toBe('M0 360L96 360');
    expect(Number(path.getAttribute('stroke-width'))).toBeCloseTo(1.3, 6);
  });

  it('clips wood to its piece', () => {
    const { container } = paint(sceneOf(wood));
    const id = container.querySelector('clipPath')!.getAttribute('id')!;
    expect(container.querySelector('clipPath path')!.getAttribute('d')).toBe('M0 0L150 0L150 -125L0 -125Z');
    expect(container.querySelector(`[clip-path="url(#${id})"]`)).not.toBeNull();
  });

  it('gives every piece of wood a clip of its own', () => {
    const { container } = paint(sceneOf(wood, { ...wood, id: 'Q' }));
    const ids = Array.from(container.querySelectorAll('clipPath'), (clip) => clip.getAttribute('id'));
    expect(new Set(ids).size).toBe(2);
  });

  it('can be found by layer and name', () => {
    const { getByTestId } = paint(sceneOf(wall));
    expect(getByTestId('walls/A').querySelectorAll('path')).toHaveLength(1);
  });

  it('paints again only the items that are other objects', () => {
    const many = Array.from({ length: 200 }, (_, i): DrawItem => ({ ...wall, id: `W${i}` }));
    const { rerender } = render(<PaintSvg scene={sceneOf(...many)} pxPerInch={5} />, { container: svg() });
    expect(drawn).toHaveBeenCalledTimes(200);
    drawn.mockClear();
    const moved = many.map((item, i) => (i === 7 ? { ...wall, id: 'W7', to: [90, 0] as const } : item));
    rerender(<PaintSvg scene={sceneOf(...moved)} pxPerInch={5} />);
    expect(drawn).toHaveBeenCalledTimes(1);
  });

  it('paints nothing again when items of another thing come first', () => {
    const { rerender } = render(<PaintSvg scene={sceneOf(wall, size)} pxPerInch={5} />, { container: svg() });
    drawn.mockClear();
    rerender(<PaintSvg scene={sceneOf({ ...wall, id: 'B' }, wall, size)} pxPerInch={5} />);
    expect(drawn).toHaveBeenCalledTimes(1);
  });

  it('paints all of it again when the zoom changes', () => {
    const { rerender } = render(<PaintSvg scene={sceneOf(wall, size)} pxPerInch={5} />, { container: svg() });
    drawn.mockClear();
    rerender(<PaintSvg scene={sceneOf(wall, size)} pxPerInch={6} />);
    expect(drawn).toHaveBeenCalledTimes(2);
  });
});

describe('useStableScene', () => {
  function Drawing({ scene }: { readonly scene: Scene }) {
    const stable = useStableScene(scene);
    return (
      <G>
        <PaintSvg scene={stable} pxPerInch={5} />
      </G>
    );
  }

  it('lets a drawing that was made anew paint only what changed', () => {
    const fresh = (length: number) => sceneOf({ ...wall }, { ...size, inches: length } as DrawItem, { ...wood });
    const { rerender } = render(<Drawing scene={fresh(96)} />, { container: svg() });
    drawn.mockClear();
    rerender(<Drawing scene={fresh(96)} />);
    expect(drawn).not.toHaveBeenCalled();
    rerender(<Drawing scene={fresh(97)} />);
    expect(drawn.mock.calls.map(([item]) => item.kind)).toEqual(['length']);
  });

  it('keeps the last drawing when nothing changed, and not its bounds when they did', () => {
    const last = sceneOf(wall, size);
    expect(stableScene(last, sceneOf({ ...wall }, { ...size }))).toBe(last);
    const wider = { ...sceneOf({ ...wall }, { ...size }), bounds: { ...last.bounds, maxX: 97 } };
    expect(stableScene(last, wider).bounds.maxX).toBe(97);
    expect(stableScene(last, wider).items[0]).toBe(wall);
  });
});

describe('pathData', () => {
  it('writes segments to a hundredth of a px', () => {
    expect(pathData([['M', 1, 2.006], ['L', 3.14159, -4], ['C', 1, 2, 3, 4, 5, 6], ['Z']])).toBe('M1 2.01L3.14 -4C1 2 3 4 5 6Z'); // prettier-ignore
  });
});

function svg(): HTMLElement {
  const host = document.createElementNS('http://www.w3.org/2000/svg', 'svg');
  document.body.appendChild(host);
  return host as unknown as HTMLElement;
}
