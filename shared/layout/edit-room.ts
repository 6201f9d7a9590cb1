import { z } from 'zod';

import type { Layout } from '@/geometry/core/layout';
import type { Draft } from 'immer';
import { EditRefused, find, sameCorner } from './edit-refused';
import { betweenSchema, readingSchema, stationSchema, tapeSdSchema, tieSchema, triangleSchema } from './layout-schema';
import { breakWall, breakWallSchema, mirrorRoom, mirrorRoomSchema } from './reshape-room';
import { cornersOf, freshWallId } from './wall-chain';

const uuid = z.uuid();
const wall = z.string().min(1).max(40);
const point = z.tuple([z.number(), z.number()]);

/** Edits of the room: sketch, walls, readings. Lengths inches, angles degrees. */
export const roomEditSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    id: uuid,
    kind: z.literal('traceRoom'),
    /** One id a wall, left to right; as many points as walls + 1, closed: as walls. */
    walls: z.array(wall).max(60),
    points: z.array(point).max(61),
    closed: z.boolean(),
  }),
  z.strictObject({ id: uuid, kind: z.literal('moveCorner'), index: z.number().int().min(0), to: point }),
  z.strictObject({
    id: uuid,
    kind: z.literal('addWall'),
    wall,
    end: z.enum(['left', 'right']),
    to: point,
  }),
  z.strictObject({ id: uuid, kind: z.literal('splitWall'), wall, newWall: wall, at: point }),
  z.strictObject({ id: uuid, kind: z.literal('removeWall'), wall }),
  z.strictObject({ id: uuid, kind: z.literal('closeRing'), closed: z.boolean(), wall: wall.optional() }),
  z.strictObject({ id: uuid, kind: z.literal('addReading'), wall, reading: readingSchema }),
  z.strictObject({
    id: uuid,
    kind: z.literal('replaceReading'),
    wall,
    index: z.number().int().min(0),
    reading: readingSchema,
  }),
  z.strictObject({ id: uuid, kind: z.literal('removeReading'), wall, index: z.number().int().min(0) }),
  z.strictObject({ id: uuid, kind: z.literal('setTriangle'), between: betweenSchema, triangle: triangleSchema }),
  z.strictObject({
    id: uuid,
    kind: z.literal('setAngle'),
    between: betweenSchema,
    angle: z.number().min(1).max(359),
    sd: z.number().positive().max(20).optional(),
  }),
  z.strictObject({
    id: uuid,
    kind: z.literal('setNominal'),
    between: betweenSchema,
    nominal: z.number().min(5).max(355),
  }),
  z.strictObject({ id: uuid, kind: z.literal('clearCorner'), between: betweenSchema }),
  z.strictObject({ id: uuid, kind: z.literal('setTie'), tie: tieSchema }),
  z.strictObject({ id: uuid, kind: z.literal('removeTie'), tie: wall }),
  z.strictObject({ id: uuid, kind: z.literal('setProfile'), wall, profile: z.array(stationSchema).max(100) }),
  z.strictObject({ id: uuid, kind: z.literal('setPlumb'), wall, outOfPlumb: z.number().min(-6).max(6).nullable() }),
  z.strictObject({
    id: uuid,
    kind: z.literal('markReading'),
    observation: z.string().min(1).max(100),
    mark: z.enum(['trust', 'ignore']).nullable(),
  }),
  z.strictObject({ id: uuid, kind: z.literal('setTapeSd'), tapeSd: tapeSdSchema }),
  breakWallSchema,
  mirrorRoomSchema,
]);

export type RoomEdit = z.infer<typeof roomEditSchema>;
type Of<K extends RoomEdit['kind']> = Extract<RoomEdit, { kind: K }>;
type Room = Draft<Layout>['room'];

const wallOf = (room: Room, id: string) => find(room.walls, id, 'wall');

function cornerOf(room: Room, between: readonly [string, string]) {
  const corner = room.corners.find((c) => sameCorner(c.between, between));
  if (!corner) throw new EditRefused(`Walls ${between[0]} and ${between[1]} no longer meet.`);
  return corner;
}

/** Walls changed place: drops corners and ties whose walls are gone, keeps every reading that still has its place. */
function rejoin(room: Room): void {
  const ids = new Set(room.walls.map((w) => w.id));
  room.corners = cornersOf(room);
  room.ties = room.ties.filter((t) => ids.has(t.from.wall) && ids.has(t.to.wall));
  forgetMarks(room);
}

/** What stood along a wall goes with it, and so does the top over it. */
function dropStranded(draft: Draft<Layout>): void {
  const ids = new Set(draft.room.walls.map((w) => w.id));
  draft.bases = draft.bases.filter((base) => ids.has(base.wall));
  const gone = new Set(draft.runs.filter((run) => !ids.has(run.wall)).map((run) => run.id));
  if (gone.size === 0) return;
  draft.runs = draft.runs.filter((run) => !gone.has(run.id));
  draft.cutouts = draft.cutouts.filter((cutout) => !gone.has(cutout.on));
  draft.seams = draft.seams.filter((seam) => !gone.has(seam.on));
  draft.joints = draft.joints.filter((joint) => !joint.between.some((run) => gone.has(run)));
}

/** Trust and ignore marks of readings that are gone. */
function forgetMarks(room: Room): void {
  const names = new Set([
    ...room.walls.map((w) => `wall ${w.id}`),
    ...room.corners.map((c) => `corner ${c.between.join('-')}`),
    ...room.ties.map((t) => `tie ${t.id}`),
  ]);
  room.trust = room.trust.filter((name) => names.has(name));
  room.ignore = room.ignore.filter((name) => names.has(name));
}

function traceRoom(room: Room, edit: Of<'traceRoom'>): void {
  const kept = new Map(room.walls.map((w) => [w.id, w]));
  if (edit.points.length !== edit.walls.length + (edit.closed || edit.walls.length === 0 ? 0 : 1))
    throw new EditRefused('The sketch does not have one more corner than walls.');
  room.walls = edit.walls.map((id) => kept.get(id) ?? { id, length: [], profile: [] });
  room.sketch = edit.points;
  room.closed = edit.closed;
  rejoin(room);
}

function addWall(room: Room, edit: Of<'addWall'>): void {
  if (room.closed) throw new EditRefused('The walls already make a closed room.');
  const fresh = { id: freshWallId(room, edit.wall), length: [], profile: [] };
  if (edit.end === 'right') {
    room.walls.push(fresh);
    room.sketch.push(edit.to);
  } else {
    room.walls.unshift(fresh);
    room.sketch.unshift(edit.to);
  }
  rejoin(room);
}

function splitWall(room: Room, edit: Of<'splitWall'>): void {
  const index = room.walls.findIndex((w) => w.id === edit.wall);
  if (index < 0) throw new EditRefused('The wall to split is gone.');
  room.walls.splice(index + 1, 0, { id: freshWallId(room, edit.newWall), length: [], profile: [] });
  room.sketch.splice(index + 1, 0, edit.at);
  rejoin(room);
}

function removeWall(room: Room, edit: Of<'removeWall'>): void {
  const index = room.walls.findIndex((w) => w.id === edit.wall);
  if (index < 0) throw new EditRefused('The wall is gone already.');
  room.walls.splice(index, 1);
  room.sketch.splice(index === 0 && !room.closed ? 0 : index + (room.closed ? 0 : 1), 1);
  if (room.walls.length === 0) room.sketch = [];
  if (room.walls.length < 3) room.closed = false;
  rejoin(room);
}

function closeRing(room: Room, edit: Of<'closeRing'>): void {
  if (edit.closed === room.closed) return;
  if (edit.closed) {
    if (room.walls.length < 2) throw new EditRefused('A closed room needs at least three walls.');
    // The last corner and the first become one by a new wall between them.
    room.walls.push({ id: freshWallId(room, edit.wall ?? 'w'), length: [], profile: [] });
  } else {
    const first = room.sketch[0];
    if (first) room.sketch.push([first[0], first[1]]);
  }
  room.closed = edit.closed;
  rejoin(room);
}

function markReading(room: Room, edit: Of<'markReading'>): void {
  const without = (list: string[]) => list.filter((name) => name !== edit.observation);
  room.trust = without(room.trust);
  room.ignore = without(room.ignore);
  if (edit.mark) room[edit.mark].push(edit.observation);
}

/** Applies one room edit to a draft; throws EditRefused when it no longer applies. */
export function applyRoomEdit(draft: Draft<Layout>, edit: RoomEdit): void {
  const room = draft.room;
  switch (edit.kind) {
    case 'traceRoom':
      traceRoom(room, edit);
      return dropStranded(draft);
    case 'breakWall':
      return breakWall(draft, edit);
    case 'mirrorRoom':
      return mirrorRoom(draft, edit);
    case 'moveCorner':
      if (edit.index >= room.sketch.length) throw new EditRefused('The corner to move is gone.');
      room.sketch[edit.index] = edit.to;
      room.corners = cornersOf(room);
      return;
    case 'addWall':
      return addWall(room, edit);
    case 'splitWall':
      return splitWall(room, edit);
    case 'removeWall':
      removeWall(room, edit);
      return dropStranded(draft);
    case 'closeRing':
      return closeRing(room, edit);
    case 'addReading':
      wallOf(room, edit.wall).length.push(edit.reading);
      return;
    case 'replaceReading': {
      const readings = wallOf(room, edit.wall).length;
      if (edit.index >= readings.length) throw new EditRefused('The reading to replace is gone.');
      readings[edit.index] = edit.reading;
      return;
    }
    case 'removeReading': {
      const readings = wallOf(room, edit.wall).length;
      if (edit.index >= readings.length) throw new EditRefused('The reading is gone already.');
      readings.splice(edit.index, 1);
      return;
    }
    case 'setTriangle': {
      const corner = cornerOf(room, edit.between);
      corner.triangle = edit.triangle;
      delete corner.angle;
      delete corner.sd;
      return;
    }
    case 'setAngle': {
      const corner = cornerOf(room, edit.between);
      corner.angle = edit.angle;
      if (edit.sd === undefined) delete corner.sd;
      else corner.sd = edit.sd;
      delete corner.triangle;
      return;
    }
    case 'setNominal':
      cornerOf(room, edit.between).nominal = edit.nominal;
      return;
    case 'clearCorner': {
      const corner = cornerOf(room, edit.between);
      delete corner.triangle;
      delete corner.angle;
      delete corner.sd;
      return;
    }
    case 'setTie': {
      wallOf(room, edit.tie.from.wall);
      wallOf(room, edit.tie.to.wall);
      const at = room.ties.findIndex((t) => t.id === edit.tie.id);
      if (at < 0) room.ties.push(edit.tie);
      else room.ties[at] = edit.tie;
      return;
    }
    case 'removeTie':
      find(room.ties, edit.tie, 'tie');
      room.ties = room.ties.filter((t) => t.id !== edit.tie);
      return forgetMarks(room);
    case 'setProfile':
      wallOf(room, edit.wall).profile = edit.profile;
      return;
    case 'setPlumb': {
      const target = wallOf(room, edit.wall);
      if (edit.outOfPlumb === null) delete target.outOfPlumb;
      else target.outOfPlumb = edit.outOfPlumb;
      return;
    }
    case 'markReading':
      return markReading(room, edit);
    case 'setTapeSd':
      room.tapeSd = edit.tapeSd;
  }
}
