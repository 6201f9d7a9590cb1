import type { Point } from '@/geometry/core/point';
import type { DrawItem, Scene } from '@/geometry/scene/display-list';
import type { Primitive, View } from '@/geometry/scene/primitives/primitive';
import { toPrimitives } from '@/geometry/scene/primitives/to-primitives';

/** A text as it stands on the page, px from the page's top left. A stacked fraction is one text. */
export interface PageText {
  readonly text: string;
  readonly size: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly item: DrawItem;
}

const viewOf = (page: Scene): View => ({
  pxPerInch: 96,
  pixel: 1,
  origin: [0, page.paper!.height],
  smallest: 14,
  wood: 'lines',
});

/** Every text of a page in painting order, but for what lies across it (DRAFT). */
export function pageTexts(page: Scene): PageText[] {
  return page.items
    .filter((item) => !(item.kind === 'text' && item.hollow))
    .flatMap((item) => toPrimitives(item, viewOf(page)).flatMap((primitive) => textsOf(primitive, item)));
}

function textsOf(primitive: Primitive, item: DrawItem): PageText[] {
  if (primitive.kind === 'clip') return primitive.children.flatMap((child) => textsOf(child, item));
  if (primitive.kind === 'span') {
    const parts = primitive.children.flatMap((child) => textsOf(child, item));
    return [
      {
        text: primitive.text,
        size: Math.min(...parts.map((p) => p.size)),
        left: Math.min(...parts.map((p) => p.left)),
        right: Math.max(...parts.map((p) => p.right)),
        top: Math.min(...parts.map((p) => p.top)),
        bottom: Math.max(...parts.map((p) => p.bottom)),
        item,
      },
    ];
  }
  if (primitive.kind !== 'text' || primitive.turn !== 0) return [];
  const left = primitive.x - { start: 0, middle: primitive.width / 2, end: primitive.width }[primitive.anchor];
  const { text, size, y } = primitive;
  return [{ text, size, left, right: left + primitive.width, top: y - size * 0.68, bottom: y, item }];
}

/** Every point of every path on the page, px. */
export function pathPoints(page: Scene): Point[] {
  return page.items.flatMap((item) => toPrimitives(item, viewOf(page)).flatMap(pointsOf));
}

function pointsOf(primitive: Primitive): Point[] {
  if (primitive.kind === 'text') return [];
  if (primitive.kind !== 'path') return primitive.children.flatMap(pointsOf);
  return primitive.path.flatMap((segment): Point[] =>
    segment[0] === 'Z' ? [] : [[segment.at(-2) as number, segment.at(-1) as number]],
  );
}
