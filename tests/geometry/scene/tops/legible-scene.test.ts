import polygonClipping from 'polygon-clipping';

import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { makePlan } from '@/geometry/plan/make-plan';
import type { DrawItem } from '@/geometry/scene/display-list';
import type { Primitive, TextPrimitive, View } from '@/geometry/scene/primitives/primitive';
import { toPrimitives } from '@/geometry/scene/primitives/to-primitives';
import { legibleScene } from '@/geometry/scene/tops/legible-scene';
import { topsScene } from '@/geometry/scene/tops/tops-scene';
import { kitchenFile, KITCHENS } from '@/scripts/bench/kitchens';
import { DEMO_JOBS } from '@/shared/layout/demo/demo-jobs';
import { parseJobFile } from '@/shared/layout/parse-job-file';

type Ring = [number, number][];

interface Written {
  readonly item: DrawItem;
  readonly text: string;
  readonly box: Ring;
}

/** Everything the painter writes, with a box round its glyphs, turned as they are. */
function written(items: readonly DrawItem[], view: View): Written[] {
  return items.flatMap((item) =>
    textsIn(toPrimitives(item, view)).map((text) => ({ item, text: text.text, box: glyphBox(text) })),
  );
}

function textsIn(primitives: readonly Primitive[]): TextPrimitive[] {
  return primitives.flatMap((primitive) =>
    primitive.kind === 'text' ? [primitive] : 'children' in primitive ? textsIn(primitive.children) : [],
  );
}

/** From the baseline up by 0.66 of the size, a little under a capital's height, and half a pixel in at both ends. */
function glyphBox({ x, y, turn, width, size, anchor }: TextPrimitive): Ring {
  const left = anchor === 'middle' ? -width / 2 : anchor === 'end' ? -width : 0;
  const [cos, sin] = [Math.cos(turn), Math.sin(turn)];
  const corner = (dx: number, dy: number): [number, number] => [x + dx * cos + dy * sin, y - dx * sin + dy * cos];
  const right = left + width - 0.5;
  return [corner(left + 0.5, 0), corner(right, 0), corner(right, -0.66 * size), corner(left + 0.5, -0.66 * size)];
}

const area = (rings: readonly (readonly (readonly [number, number])[])[]): number =>
  rings.reduce((sum, ring) => {
    const twice = ring.reduce((part, [x, y], i) => {
      const [u, v] = ring[(i + 1) % ring.length]!;
      return part + x * v - u * y;
    }, 0);
    return sum + Math.abs(twice) / 2;
  }, 0);

/** Whether the boxes lie apart in x or in y, which is most of them. */
const apart = (a: Ring, b: Ring): boolean =>
  ([0, 1] as const).some((axis) => {
    const [p, q] = [a.map((point) => point[axis]), b.map((point) => point[axis])];
    return Math.max(...p) < Math.min(...q) || Math.max(...q) < Math.min(...p);
  });

/** Words of two different items that lie on each other by more than a pixel. */
function clashes(all: readonly Written[]): string[] {
  return all.flatMap((a, i) =>
    all.slice(i + 1).flatMap((b) => {
      if (a.item === b.item || apart(a.box, b.box)) return [];
      const shared = polygonClipping.intersection([a.box], [b.box]).flat();
      return area(shared) > 1 ? [`"${a.text}" of ${a.item.kind} on "${b.text}" of ${b.item.kind}`] : [];
    }),
  );
}

const layers = { grain: true, sizes: true, hardware: true, walls: true } as const;
/** px for an inch: a whole room on a phone, a piece on a wide screen. */
const ZOOMS = [1.1, 1.6, 2.5, 4, 7];

function check(file: unknown): { written: number; clashes: string[] } {
  const parsed = parseJobFile(file);
  if (!parsed.ok) throw new Error(parsed.errors[0]!.message);
  const plan = makePlan({ layout: parsed.layout, settings: DEFAULT_SETTINGS, nest: null });
  const scene = topsScene(plan, parsed.layout, { layers, handles: true });
  const found = ZOOMS.map((pxPerInch) => {
    const view: View = { pxPerInch, pixel: 1, origin: [0, 0], smallest: 11, wood: 'colour' };
    return written(legibleScene(scene, pxPerInch).items, view);
  });
  return { written: found.flat().length, clashes: found.flatMap(clashes) };
}

describe('sizes, letters and words on the drawing of the tops', () => {
  it.each(Object.entries(DEMO_JOBS))('never lie on each other in %s, at five zooms', (_, file) => {
    const result = check(file);
    expect(result.written).toBeGreaterThan(20);
    expect(result.clashes).toEqual([]);
  });

  it('never lie on each other in 16 made-up kitchens of 4 to 24 walls, at five zooms', () => {
    const found = Array.from({ length: 16 }, (_, i) => check(kitchenFile(900 + i, KITCHENS[i % KITCHENS.length]!)));
    expect(found.reduce((sum, { written: count }) => sum + count, 0)).toBeGreaterThan(2000);
    expect(found.flatMap((one) => one.clashes)).toEqual([]);
  });
});
