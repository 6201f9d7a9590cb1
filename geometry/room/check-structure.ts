import { cornerName } from './room-frame';
import type { RoomError, RoomInput, WallMark } from './types';

const bad = (message: string, path: string): RoomError => ({ code: 'bad_room', message, path });

/** Whether walls, corners, ties and sketch fit together; null when they do. */
export function checkStructure(input: RoomInput): RoomError | null {
  return checkWalls(input) ?? checkCorners(input) ?? checkTies(input) ?? checkSketch(input) ?? checkTape(input);
}

function checkWalls({ walls, closed }: RoomInput): RoomError | null {
  if (walls.length === 0) return bad('The room has no walls yet. Draw one and tape it.', 'walls');
  if (closed && walls.length < 3) return bad('A room that closes needs at least three walls.', 'walls');
  for (const [i, { id }] of walls.entries()) {
    if (id === '') return bad('A wall needs a name.', `walls[${i}].id`);
    if (walls.findIndex((w) => w.id === id) < i) return bad(`Two walls are called ${id}.`, `walls[${i}].id`);
  }
  return null;
}

function checkCorners({ walls, corners, closed }: RoomInput): RoomError | null {
  const ids = walls.map((w) => w.id);
  for (const [i, { between }] of corners.entries()) {
    const path = `corners[${i}].between`;
    for (const id of between)
      if (!ids.includes(id)) return bad(`Corner ${between.join('-')}: there is no wall ${id}.`, path);
    const left = ids.indexOf(between[0]);
    const next = left + 1 < ids.length ? left + 1 : closed ? 0 : -1;
    if (ids.indexOf(between[1]) !== next) {
      return bad(
        `Corner ${between.join('-')}: wall ${between[1]} does not follow wall ${between[0]} left to right.`,
        path,
      );
    }
    if (corners.findIndex((c) => cornerName(c.between) === cornerName(between)) < i) {
      return bad(`Corner ${between.join('-')} is listed twice.`, path);
    }
  }
  return null;
}

function checkTies(input: RoomInput): RoomError | null {
  for (const [i, tie] of input.ties.entries()) {
    if (tie.id === '') return bad('A tie needs a name.', `ties[${i}].id`);
    if (input.ties.findIndex((t) => t.id === tie.id) < i) return bad(`Two ties are called ${tie.id}.`, `ties[${i}].id`);
    for (const side of ['from', 'to'] as const) {
      const { wall } = tie[side];
      if (!input.walls.some((w) => w.id === wall)) {
        return bad(`Tie ${tie.id}: there is no wall ${wall}.`, `ties[${i}].${side}.wall`);
      }
    }
    const from = placeKey(input, tie.from);
    const to = placeKey(input, tie.to);
    if (from === to) return bad(`Tie ${tie.id} goes from a mark to the same mark.`, `ties[${i}].to`);
    if (tie.from.wall === tie.to.wall && tie.from.at !== 'end' && tie.to.at !== 'end') {
      return bad(`Tie ${tie.id} lies along wall ${tie.from.wall} and says nothing about the room.`, `ties[${i}].to`);
    }
  }
  return null;
}

/** The same text for two names of one place: a wall's end is where the next one begins. */
function placeKey({ walls, closed }: RoomInput, mark: WallMark): string {
  const wall = walls.findIndex((w) => w.id === mark.wall);
  if (mark.at !== 'end') return `${wall}@${mark.at}`;
  const next = closed ? (wall + 1) % walls.length : wall + 1;
  return `${next}@0`;
}

function checkSketch({ sketch, walls, closed }: RoomInput): RoomError | null {
  if (!sketch) return null;
  const points = closed ? walls.length : walls.length + 1;
  if (sketch.length !== points) {
    return bad(`The sketch has ${sketch.length} points, ${walls.length} walls need ${points}.`, 'sketch');
  }
  for (const [i, [x, y]] of sketch.entries()) {
    if (!Number.isFinite(x) || !Number.isFinite(y)) return bad(`Sketch point ${i + 1} is not a place.`, `sketch[${i}]`);
  }
  return null;
}

function checkTape({ tapeSd }: RoomInput): RoomError | null {
  const usable = tapeSd.fixed >= 0 && tapeSd.perInch >= 0 && tapeSd.fixed + tapeSd.perInch > 0;
  return usable ? null : bad('The standard deviation of the tape has to be over 0.', 'tapeSd');
}
