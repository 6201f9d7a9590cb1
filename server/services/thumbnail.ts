import type { Logger } from 'pino';

import type { Layout } from '@/geometry/core/layout';
import type { Point, Polygon } from '@/geometry/core/point';
import type { ShopSettings } from '@/geometry/core/settings';
import { layRoom } from '@/geometry/plan/lay-room';
import type { Piece } from '@/geometry/top/types';
import type { Thumbnail } from '@/shared/contracts/jobs';
import { loggable } from '../http/loggable';

/** Places are kept to this many steps an inch: a list draws a room an inch or two wide. */
const STEPS_PER_INCH = 16;

const IN_THE_ROOM: readonly Piece['kind'][] = ['run', 'island'];

/**
 * The outline that the jobs list shows: the solved room and its tops; the sketch while the room is not known. Null for a
 * layout with neither.
 */
export function thumbnailOf(layout: Layout, settings: ShopSettings): Thumbnail | null {
  const { room, tops } = layRoom(layout, settings);
  const walls = room.fit?.points ?? layout.room.sketch;
  const pieces = tops.pieces.filter((piece) => IN_THE_ROOM.includes(piece.kind));
  if (walls.length === 0 && pieces.length === 0) return null;
  return {
    walls: walls.map(coarse),
    closed: layout.room.closed,
    pieces: pieces.map(({ outline }): Polygon => outline.map(coarse)),
  };
}

/** As `thumbnailOf`, but null where it fails: a layout that cannot be drawn must still be saved. */
export function drawThumbnail(layout: Layout, settings: ShopSettings, log: Logger): Thumbnail | null {
  try {
    return thumbnailOf(layout, settings);
  } catch (error) {
    log.error({ failure: loggable(error) }, 'the outline of a layout could not be computed');
    return null;
  }
}

function coarse([x, y]: Point): Point {
  return [Math.round(x * STEPS_PER_INCH) / STEPS_PER_INCH, Math.round(y * STEPS_PER_INCH) / STEPS_PER_INCH];
}
