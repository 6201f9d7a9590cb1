import type { Layout } from '../../core/layout';
import type { Point, Polygon } from '../../core/point';
import { contains } from '../../core/polygon';
import { along, distance, leftNormal, scale } from '../../core/vector';
import type { Plan } from '../../plan/types';
import type { DrawItem } from '../display-list';
import { toRoom } from '../tops/draw-pieces';
import type { Camera, Place } from './camera';
import { facet, lightOn, sidesSeen } from './solids';
import { woodFace } from './wood-boards';

type Piece = Plan['pieces'][number];

/** A side this near to another piece is a joint or a seam, and nobody sees it, inches. */
const AGAINST = 0.3;

/** A top: its show face with the staves of the plan, and its edges where they are seen. */
export function drawTop(
  camera: Camera,
  piece: Piece,
  others: readonly Piece[],
  layout: Layout,
  height: number,
): DrawItem[] {
  const { species, stave } = layout.material;
  const bottom = height - piece.thickness;
  const edges = sidesSeen(camera, piece.outline, bottom, height).filter(({ from, to }) => {
    const length = distance(from, to);
    const out: Point = [(to[1] - from[1]) / length, (from[0] - to[0]) / length];
    const before = along([(from[0] + to[0]) / 2, (from[1] + to[1]) / 2], out, AGAINST);
    return !others.some((other) => other !== piece && contains(other.outline, before));
  });
  return [
    ...edges.flatMap((side) =>
      facet(camera, side.outline, { layer: 'tops', id: piece.letter, surface: 'wood', species, light: side.light }),
    ),
    ...woodFace(camera, {
      outline: piece.shape,
      holes: piece.cutouts.map((cutout) => cutout.outline),
      place: (u, v): Place => [...toRoom(piece, [u, v]), height],
      species,
      stave,
      seed: layout.stock.grainMatch ? piece.on : piece.key,
      id: piece.letter,
    }),
  ];
}

/** A waterfall leg as it stands: folded down at the end it is mitred to. */
export interface StandingLeg {
  readonly piece: Piece;
  /** Own x of the mitre, and the direction away from the top. */
  readonly foldX: number;
  readonly out: Point;
  readonly footprint: Polygon;
}

export function standingLeg(piece: Piece): StandingLeg {
  const xs = piece.shape.map((p) => p[0]);
  const atLeft = piece.left.bevel !== undefined;
  const foldX = atLeft ? Math.min(...xs) : Math.max(...xs);
  const out = atLeft ? piece.grain : scale(piece.grain, -1);
  const corner = (v: number, inwards: number) => along(toRoom(piece, [foldX, v]), out, -inwards);
  const footprint = [
    corner(0, 0),
    corner(piece.depth, 0),
    corner(piece.depth, piece.thickness),
    corner(0, piece.thickness),
  ];
  return { piece, foldX, out, footprint };
}

export function drawLeg(camera: Camera, leg: StandingLeg, layout: Layout, height: number): DrawItem[] {
  const { piece, foldX, out } = leg;
  const { species, stave } = layout.material;
  const across = leftNormal(out);
  const sides = sidesSeen(camera, leg.footprint, 0, height).filter(({ from, to }) => {
    const length = distance(from, to);
    // The broad outer side carries the staves; the narrow ones are plain edges.
    return Math.abs(((to[0] - from[0]) * across[0] + (to[1] - from[1]) * across[1]) / length) < 0.5;
  });
  const eye: Point = [camera.eye[0], camera.eye[1]];
  const at = toRoom(piece, [foldX, piece.depth / 2]);
  const faces = (eye[0] - at[0]) * out[0] + (eye[1] - at[1]) * out[1] > 0;
  const onFace = (inwards: number): ((u: number, v: number) => Place) => {
    return (u, v) => [...along(toRoom(piece, [foldX, v]), out, -inwards), height - Math.abs(u - foldX)];
  };
  return [
    ...sides.flatMap((side) =>
      facet(camera, side.outline, {
        layer: 'tops',
        id: piece.letter,
        surface: 'wood',
        species,
        light: lightOn(across),
      }),
    ),
    ...woodFace(camera, {
      outline: piece.shape,
      holes: [],
      place: onFace(faces ? 0 : piece.thickness),
      species,
      stave,
      seed: piece.key,
      id: piece.letter,
    }),
  ];
}
