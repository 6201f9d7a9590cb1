import type { Layout, RoomReadings } from '../core/layout';
import type { ShopSettings } from '../core/settings';
import { fitRoom } from '../room/fit-room';
import type { RoomError, RoomFit } from '../room/types';
import { layTops } from '../seams/lay-tops';
import { solvedRoom } from '../top/solved-room';
import type { Tops } from '../top/types';
import { roomInputOf, untapedWalls } from './room-input';

/** The room as far as it is known. */
export interface RoomState {
  readonly fit: RoomFit | null;
  readonly error: RoomError | null;
  /** Walls nobody has taped: their lengths are those of the sketch, good for drawing only. */
  readonly untaped: readonly string[];
}

/** Room and tops, before slabs. */
export interface Laid {
  readonly room: RoomState;
  readonly tops: Tops;
}

const NO_TOPS: Tops = { runs: [], pieces: [], joints: [], seams: [], cutouts: [], problems: [] };

/**
 * The room from its readings. While walls are not taped, or nothing else fixes one, the sketch fills in so that there is
 * something to draw, and the error says what is missing.
 */
export function measureRoom(room: RoomReadings, options: { readonly next?: boolean } = {}): RoomState {
  const untaped = untapedWalls(room);
  if (room.walls.length === 0) return { fit: null, error: null, untaped };
  const measured = fitRoom(roomInputOf(room), options);
  if (measured.ok) return { fit: measured.fit, error: null, untaped };
  if (untaped.length === 0) return { fit: null, error: measured.error, untaped };
  const drawn = fitRoom(roomInputOf(room, true), options);
  return { fit: drawn.ok ? drawn.fit : null, error: drawn.ok ? measured.error : drawn.error, untaped };
}

/** The live chain from readings to pieces: everything that runs while a finger drags. */
export function layRoom(layout: Layout, settings: ShopSettings): Laid {
  const room = measureRoom(layout.room);
  return { room, tops: room.fit ? layTops(layout, solvedRoom(room.fit, layout.room), settings) : NO_TOPS };
}
