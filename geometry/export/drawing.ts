import { flattenPath, type ArcPath } from '../core/arc-path';
import type { Point } from '../core/point';
import { boundingBox, type Box } from '../core/polygon';

/** Kinds of things in a drawing file; one layer each. */
export const FILE_LAYERS = {
  WALLS: { colour: 8, name: 'Walls of the room' },
  PIECES: { colour: 7, name: 'Outlines of pieces as cut, exposed corners rounded' },
  CUTOUTS: { colour: 1, name: 'Cutouts' },
  JOINTS: { colour: 5, name: 'Joints at corners' },
  SEAMS: { colour: 6, name: 'Seams' },
  GRAIN: { colour: 3, name: 'Direction of the grain' },
  TEMPLATES: { colour: 7, name: 'Edges of templates' },
  SCRIBE: { colour: 1, name: 'Scribe lines' },
  MARKS: { colour: 4, name: 'Stations and reference lines' },
  LETTERS: { colour: 2, name: 'Letters and notes' },
} as const;

export type FileLayer = keyof typeof FILE_LAYERS;

/** What stands in a drawing file; inches, y up. */
export type FileEntity =
  | { readonly kind: 'path'; readonly layer: FileLayer; readonly path: ArcPath }
  | {
      readonly kind: 'text';
      readonly layer: FileLayer;
      /** Middle of the text. */
      readonly at: Point;
      readonly height: number;
      readonly text: string;
    };

export interface FileDrawing {
  readonly title: string;
  readonly entities: readonly FileEntity[];
}

export const line = (layer: FileLayer, from: Point, to: Point): FileEntity => ({
  kind: 'path',
  layer,
  path: { vertices: [from, to].map((at) => ({ at, bulge: 0 })), closed: false },
});

export const label = (at: Point, height: number, text: string): FileEntity => ({
  kind: 'text',
  layer: 'LETTERS',
  at,
  height,
  text,
});

/** Box round everything; an empty drawing has an inch at its origin. */
export function drawingBox({ entities }: FileDrawing): Box {
  const points = entities.flatMap((entity) => (entity.kind === 'path' ? flattenPath(entity.path) : [entity.at]));
  return points.length > 0 ? boundingBox(points) : { minX: 0, minY: 0, maxX: 1, maxY: 1 };
}
