import type { Point, Polygon } from '../../core/point';
import type { DrawItem, Scene } from '../display-list';
import type { PageBuilder } from './page-builder';
import type { PageBox } from './page-map';

/** Puts a drawing into a box of a page, as large as it goes, in the middle. Words and lines keep their px. */
export function embedScene(page: PageBuilder, { bounds, items }: Scene, box: PageBox): void {
  const { minX, minY, maxX, maxY } = bounds;
  const scale = Math.min(box.width / (maxX - minX), box.height / (maxY - minY));
  const left = box.left + (box.width - (maxX - minX) * scale) / 2;
  const top = box.top + (box.height - (maxY - minY) * scale) / 2;
  const at = ([x, y]: Point): Point => page.at(left + (x - minX) * scale, top + (maxY - y) * scale);
  const inches = scale / 96;
  page.add(...items.map((item) => moved(item, at, inches)));
}

function moved(item: DrawItem, at: (point: Point) => Point, scale: number): DrawItem {
  const all = (points: readonly Point[]): Polygon => points.map(at);
  const holes = (some: readonly Polygon[] | undefined) => (some ? { holes: some.map(all) } : {});
  switch (item.kind) {
    case 'line':
    case 'dimension':
      return { ...item, from: at(item.from), to: at(item.to) };
    case 'polyline':
      return { ...item, points: all(item.points) };
    case 'arc':
      return { ...item, centre: at(item.centre), radius: item.radius * scale };
    case 'polygon':
    case 'facet':
    case 'hatch':
      return { ...item, outline: all(item.outline), ...holes(item.holes) };
    case 'staves':
      return {
        ...item,
        outline: all(item.outline),
        ...holes(item.holes),
        origin: at(item.origin),
        width: item.width * scale,
      };
    case 'boards':
      return {
        ...item,
        outline: all(item.outline),
        ...holes(item.holes),
        boards: item.boards.map((board) => ({ ...board, outline: all(board.outline) })),
        figure: item.figure.map(all),
      };
    default:
      return { ...item, at: at(item.at) };
  }
}
