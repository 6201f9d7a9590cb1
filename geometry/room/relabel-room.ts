import { cornerName, wallName } from './room-frame';
import type { RoomFrame } from './room-frame';
import type { RoomInput, WallMark } from './types';

type Labels = Readonly<Record<string, string>>;

/** The frame with its walls called what people call them, for sentences. */
export function inWords(frame: RoomFrame, labels: Labels = {}): RoomFrame {
  const name = nameOf(labels);
  const between = (pair: readonly [string, string]) => [name(pair[0]), name(pair[1])] as const;
  return {
    ...frame,
    wallIds: frame.wallIds.map(name),
    corners: frame.corners.map((c) => ({ ...c, between: between(c.between) })),
  };
}

/** The same room with its walls called what people call them; readings, order and places in the input are unchanged. */
export function relabelRoom(input: RoomInput, labels: Labels): RoomInput {
  const name = nameOf(labels);
  const mark = ({ wall, at }: WallMark): WallMark => ({ wall: name(wall), at });
  const between = (pair: readonly [string, string]) => [name(pair[0]), name(pair[1])] as const;
  const observations = new Map([
    ...input.walls.map((w) => [wallName(w.id), wallName(name(w.id))] as const),
    ...input.walls.flatMap(({ id: left }) =>
      input.walls.map(({ id: right }) => [cornerName([left, right]), cornerName(between([left, right]))] as const),
    ),
  ]);
  const observation = (old: string): string => observations.get(old) ?? old;
  return {
    ...input,
    walls: input.walls.map((w) => ({ ...w, id: name(w.id) })),
    corners: input.corners.map((c) => ({ ...c, between: between(c.between) })),
    ties: input.ties.map((t) => ({ ...t, from: mark(t.from), to: mark(t.to) })),
    trust: input.trust.map(observation),
    ignore: input.ignore.map(observation),
  };
}

const nameOf =
  (labels: Labels) =>
  (id: string): string =>
    labels[id] ?? id;
