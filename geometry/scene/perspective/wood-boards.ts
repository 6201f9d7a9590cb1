import type { Polygon } from '../../core/point';
import { boundingBox } from '../../core/polygon';
import type { DrawItem } from '../display-list';
import { CELL, nextTone, TONES } from '../primitives/stave-primitives';
import { chance, woodLook } from '../primitives/wood-look';
import { see, seeOutline, type Camera, type Place } from './camera';

export interface WoodFace {
  /** Outline and holes on the wood, own axes: u along the grain, v across it, inches. */
  readonly outline: Polygon;
  readonly holes: readonly Polygon[];
  /** Where a point of the wood is in the room. */
  readonly place: (u: number, v: number) => Place;
  readonly species: string;
  readonly stave: number;
  readonly seed: string;
  readonly id: string;
}

/** A face of wood at a slant: its staves with tones and figure in their true places, as on the plan of the tops. */
export function woodFace(camera: Camera, face: WoodFace): DrawItem[] {
  const outline = seeOutline(camera, face.outline.map(([u, v]) => face.place(u, v))); // prettier-ignore
  if (outline.length < 3) return [];
  const holes = face.holes
    .map((hole) =>
      seeOutline(
        camera,
        hole.map(([u, v]) => face.place(u, v)),
      ),
    ) // prettier-ignore
    .filter((hole) => hole.length > 2);
  const boards: { outline: Polygon; tone: number }[] = [];
  const figure: Polygon[] = [];
  const look = woodLook(face.species);
  const { minX, maxX, minY, maxY } = boundingBox(face.outline);
  let tone = Math.floor(chance(face.seed, 0, 0) * TONES);
  const last = Math.ceil(maxY / face.stave - 1e-6);
  for (let i = 0; i < Math.floor(minY / face.stave + 1e-6); i++) tone = nextTone(tone, face.seed, i);
  for (let index = Math.floor(minY / face.stave + 1e-6); index < last; index++) {
    const [from, to] = [index * face.stave, (index + 1) * face.stave];
    const board = seeOutline(camera, [face.place(minX, from), face.place(maxX, from), face.place(maxX, to), face.place(minX, to)]); // prettier-ignore
    if (board.length > 2) boards.push({ outline: board, tone });
    tone = nextTone(tone, face.seed, index);
    const seed = `${face.seed}/${index}`;
    for (let cell = Math.floor(minX / CELL); cell * CELL < maxX; cell++) {
      if (chance(seed, cell, 2) > look.density) continue;
      const u = (cell + chance(seed, cell, 3)) * CELL;
      const v = from + (0.2 + 0.6 * chance(seed, cell, 4)) * face.stave;
      for (const stroke of look.figure(chance(seed, cell, 5)))
        figure.push(stroke.map(([du, dv]) => see(camera, face.place(u + du, v + dv))));
    }
  }
  const item: DrawItem = {
    layer: 'tops',
    id: face.id,
    kind: 'boards',
    outline,
    boards,
    figure,
    species: face.species,
    ...(holes.length > 0 ? { holes } : {}),
  };
  return [item];
}
