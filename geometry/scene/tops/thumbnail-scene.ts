import type { Layout } from '../../core/layout';
import { boundingBox } from '../../core/polygon';
import type { Plan } from '../../plan/types';
import type { DrawItem, Scene } from '../display-list';
import { drawWood } from './draw-pieces';

export interface ThumbnailOptions {
  /** Nobody has drawn the tops yet: their outline is dashed and has no wood. */
  readonly dashed?: boolean;
}

/** The tops as small as a stamp; the walls, dashed, while there are none. Room axes, inches. */
export function thumbnailScene(plan: Plan, layout: Layout, options: ThumbnailOptions = {}): Scene {
  const { pieces, room } = plan;
  const laid = pieces.filter((piece) => piece.kind !== 'strip' && piece.kind !== 'leg');
  if (laid.length > 0) {
    const dash = options.dashed ? { dash: [3, 3] } : {};
    const items = laid.flatMap((piece): DrawItem[] => [
      ...(options.dashed ? [] : [drawWood(piece, layout, true)]),
      {
        layer: 'tops',
        id: piece.letter,
        kind: 'polygon',
        outline: piece.outline,
        stroke: { ink: 'ink', width: 1.6, ...dash },
      },
    ]);
    const alt = `${laid.length} ${laid.length === 1 ? 'piece' : 'pieces'} of top`;
    return { bounds: boundingBox(laid.flatMap((piece) => [...piece.outline])), items, title: 'Outline', alt };
  }
  if (!room)
    return { bounds: { minX: 0, minY: 0, maxX: 1, maxY: 1 }, items: [], title: 'Outline', alt: 'No walls yet' };
  const points = room.closed ? [...room.points, room.points[0]!] : room.points;
  const walls: DrawItem = {
    layer: 'walls',
    kind: 'polyline',
    points,
    stroke: { ink: 'ink', width: 1.6, dash: [3, 3] },
  };
  return {
    bounds: boundingBox(room.points),
    items: [walls],
    title: 'Outline',
    alt: `${room.walls.length} walls, no tops yet`,
  };
}
