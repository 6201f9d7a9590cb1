import { z } from 'zod';

import type { Along, Layout } from '@/geometry/core/layout';
import type { Draft } from 'immer';
import { EditRefused } from './edit-refused';
import { tieSchema } from './layout-schema';
import { cornersOf } from './wall-chain';

const uuid = z.uuid();
const wall = z.string().min(1).max(40);
const point = z.tuple([z.number(), z.number()]);
const inches = z.number().min(0).max(1200);

/** One wall becomes a chain of walls: split in two, an outside corner, a pipe column boxed in. Lengths inches. */
export const breakWallSchema = z.strictObject({
  id: uuid,
  kind: z.literal('breakWall'),
  wall,
  /** The chain left to right; the first keeps the id of the wall, the others are new. */
  chain: z.array(wall).min(2).max(7),
  /** The whole sketch as it is afterwards. */
  points: z.array(point).min(3).max(61),
  /** Length of the chain's first wall, and where along the old wall its last one begins. */
  left: inches,
  right: inches,
});

/** Left becomes right: the room was traced the wrong way round. */
export const mirrorRoomSchema = z.strictObject({
  id: uuid,
  kind: z.literal('mirrorRoom'),
  /** Length of every wall, so that places along it can be told from its other end. */
  lengths: z.record(wall, inches),
});

export type BreakWall = z.infer<typeof breakWallSchema>;
export type MirrorRoom = z.infer<typeof mirrorRoomSchema>;

/** Overlap that is only rounding, inches. */
const SLACK = 1 / 32;

/**
 * Breaks a wall into a chain. What was read from corner to corner becomes a tie between the same two corners; what stands
 * along the wall goes with the part it stands on.
 *
 * @throws EditRefused when the wall is gone, or something stands across the break
 */
export function breakWall(draft: Draft<Layout>, edit: BreakWall): void {
  const { room } = draft;
  const index = room.walls.findIndex((w) => w.id === edit.wall);
  const old = room.walls[index];
  if (!old) throw new EditRefused('The wall to break is gone.');
  const taken = edit.chain.find((id, i) => (i === 0 ? id !== edit.wall : room.walls.some((w) => w.id === id)));
  if (taken !== undefined) throw new EditRefused(`There is a wall called ${taken} already.`);
  const count = room.walls.length + edit.chain.length - 1;
  if (edit.points.length !== count + (room.closed ? 0 : 1))
    throw new EditRefused('The walls were changed by somebody else at the same time. Break the wall again.');
  const across = draft.bases.find(
    (base) =>
      base.wall === old.id &&
      base.from < edit.right - SLACK &&
      (base.to === 'end' ? edit.right + 1 : base.to) > edit.left + SLACK,
  );
  if (across) throw new EditRefused(`The ${across.kind} on this wall stands across the place. Move it first.`);

  const last = edit.chain.at(-1)!;
  const moveRight = (at: Along): Along => (at === 'end' ? at : Math.max(0, at - edit.right));
  const isRight = (at: Along) => at === 'end' || at >= edit.right - SLACK;
  const readings = old.length;
  room.ties.forEach((tie) => {
    for (const mark of [tie.from, tie.to]) {
      if (mark.wall !== old.id || !isRight(mark.at)) continue;
      mark.wall = last;
      mark.at = moveRight(mark.at);
    }
  });
  for (const reading of readings)
    room.ties.push(
      tieSchema.parse({
        id: freshTie(room.ties),
        from: { wall: old.id, at: 0 },
        to: { wall: last, at: 'end' },
        length: { ...reading },
      }),
    );
  for (const base of draft.bases) {
    if (base.wall !== old.id || base.from < edit.right - SLACK) continue;
    base.wall = last;
    base.from = Math.max(0, base.from - edit.right);
    base.to = moveRight(base.to);
  }
  const rightStations = old.profile.filter(({ at }) => at >= edit.right);
  room.corners = room.corners.map((corner) =>
    corner.between[0] === old.id ? { ...corner, between: [last, corner.between[1]] } : corner,
  );
  room.walls.splice(
    index,
    1,
    { ...old, length: [], profile: old.profile.filter(({ at }) => at <= edit.left) },
    ...edit.chain.slice(1, -1).map((id) => ({ id, length: [], profile: [] })),
    { id: last, length: [], profile: rightStations.map(({ at, off }) => ({ at: at - edit.right, off })) },
  );
  const forget = (list: string[]) => list.filter((name) => name !== `wall ${old.id}`);
  room.trust = forget(room.trust);
  room.ignore = forget(room.ignore);
  room.sketch = edit.points;
  room.corners = cornersOf(room);
}

function freshTie(ties: readonly { readonly id: string }[]): string {
  let n = ties.length + 1;
  while (ties.some((tie) => tie.id === `t${n}`)) n++;
  return `t${n}`;
}

/**
 * Mirrors sketch, readings and what stands along the walls; each keeps its value and its wall.
 *
 * @throws EditRefused once tops are laid, or when a wall has no length to count from
 */
export function mirrorRoom(draft: Draft<Layout>, edit: MirrorRoom): void {
  const { room } = draft;
  if (draft.runs.length > 0)
    throw new EditRefused('Tops are laid along these walls. Take them away before the room is mirrored.');
  const lengthOf = (id: string): number => {
    const length = edit.lengths[id];
    if (length === undefined) throw new EditRefused(`The length of wall ${id} is not known.`);
    return length;
  };
  const fromOtherEnd = (id: string, at: Along): Along =>
    at === 0 ? 'end' : at === 'end' ? 0 : Math.max(0, lengthOf(id) - at);
  const corners = new Map(room.corners.map((corner) => [corner.between.join('|'), corner]));

  room.walls.reverse();
  for (const each of room.walls)
    each.profile = each.profile.map(({ at, off }) => ({ at: Math.max(0, lengthOf(each.id) - at), off })).reverse();
  const flipped = room.sketch.map(([x, y]): [number, number] => [x === 0 ? 0 : -x, y]);
  room.sketch = room.closed ? [...flipped.slice(0, 1), ...flipped.slice(1).reverse()] : flipped.reverse();
  room.corners = [...corners.values()].map((corner) => ({
    ...corner,
    between: [corner.between[1], corner.between[0]],
    ...(corner.triangle && { triangle: { a: corner.triangle.b, b: corner.triangle.a, c: corner.triangle.c } }),
  }));
  room.corners = cornersOf(room);
  for (const tie of room.ties) for (const mark of [tie.from, tie.to]) mark.at = fromOtherEnd(mark.wall, mark.at);
  for (const base of draft.bases) {
    const from = base.to === 'end' ? 0 : Math.max(0, lengthOf(base.wall) - base.to);
    base.to = base.from === 0 ? 'end' : lengthOf(base.wall) - base.from;
    base.from = from;
  }
  const renamed = (list: string[]) =>
    list.map((name) => {
      const corner = [...corners.values()].find(({ between }) => name === `corner ${between.join('-')}`);
      return corner ? `corner ${corner.between[1]}-${corner.between[0]}` : name;
    });
  room.trust = renamed(room.trust);
  room.ignore = renamed(room.ignore);
}
