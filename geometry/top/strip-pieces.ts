import type { Strip } from '../core/layout';
import type { Point, Polygon } from '../core/point';
import type { BarePiece } from './deck-pieces';
import type { PieceEnd } from './types';

const END: PieceEnd = { kind: 'edge', angle: 90, finished: true, radius: 0 };
const SEAM: PieceEnd = { kind: 'seam', angle: 90, finished: false, radius: 0 };

/**
 * Pieces of a strip, grain along it, left to right.
 *
 * @param seams - inches from its left end, rising
 * @param place - room place of its front left corner; a strip has none of its own
 */
export function stripPieces(strip: Strip, seams: readonly number[], place: Point): readonly BarePiece[] {
  const marks = [0, ...seams, strip.length];
  return marks.slice(1).map((to, i): BarePiece => {
    const from = marks[i]!;
    const length = to - from;
    const shape: Polygon = [
      [0, 0],
      [length, 0],
      [length, strip.width],
      [0, strip.width],
    ];
    const origin: Point = [place[0] + from, place[1]];
    return {
      key: `${strip.id}.${i + 1}`,
      on: strip.id,
      kind: 'strip',
      outline: shape.map(([x, y]): Point => [x + origin[0], y + origin[1]]),
      shape,
      origin,
      grain: [1, 0],
      back: length,
      front: length,
      depth: strip.width,
      thickness: strip.thickness,
      left: i === 0 ? END : SEAM,
      right: i === marks.length - 2 ? END : SEAM,
      area: length * strip.width,
      netArea: length * strip.width,
      finishedEdges: [
        'front',
        'back',
        ...(i === 0 ? (['left'] as const) : []),
        ...(i === marks.length - 2 ? (['right'] as const) : []),
      ],
      cutouts: [],
      count: Math.max(1, Math.floor(strip.count)),
      row: 0,
    };
  });
}
