import type { Box } from '../../core/polygon';
import { boundingBox } from '../../core/polygon';

/** Inches: two neighbouring tiles show this much of the same; clear room round the drawing. */
export const OVERLAP = 0.5;
export const AROUND = 0.35;

/** One part of a drawing that fits a page, in the drawing's own inches. */
export interface Tile {
  readonly column: number;
  readonly row: number;
  readonly box: Box;
}

export interface Tiling {
  readonly columns: number;
  readonly rows: number;
  /** Tiles of each page, from the left and from the top; a low drawing has several strips on one page. */
  readonly pages: readonly (readonly Tile[])[];
  /** Where neighbours are joined: the middle of each overlap. */
  readonly joinX: readonly number[];
  readonly joinY: readonly number[];
  /** Height of a strip, inches. */
  readonly height: number;
}

/**
 * Cuts a drawing into tiles that overlap.
 *
 * @param width, height - room on a page, inches
 */
export function tileDrawing(drawing: Box, width: number, height: number): Tiling {
  const box = boundingBox([
    [drawing.minX - AROUND, drawing.minY - AROUND],
    [drawing.maxX + AROUND, drawing.maxY + AROUND],
  ]);
  const [w, h] = [box.maxX - box.minX, box.maxY - box.minY];
  const columns = count(w, width);
  const rows = count(h, height);
  const strips = columns > 1 && rows === 1 ? Math.max(1, Math.floor(height / h)) : 1;
  const tall = height / strips;
  // A drawing that is smaller than its tiles stands in their middle.
  const left = box.minX - (span(columns, width) - w) / 2;
  const top = box.maxY + (span(rows, tall) - h) / 2;
  const tiles: Tile[] = [];
  for (let row = 0; row < rows; row++) {
    for (let column = 0; column < columns; column++) {
      const [x, y] = [left + column * (width - OVERLAP), top - row * (tall - OVERLAP)];
      tiles.push({ column, row, box: { minX: x, maxX: x + width, minY: y - tall, maxY: y } });
    }
  }
  const pages = Array.from({ length: Math.ceil(tiles.length / strips) }, (_, i) =>
    tiles.slice(i * strips, (i + 1) * strips),
  );
  const between = (n: number) => Array.from({ length: n - 1 }, (_, i) => i + 1);
  return {
    columns,
    rows,
    pages,
    joinX: between(columns).map((i) => left + i * (width - OVERLAP) + OVERLAP / 2),
    joinY: between(rows).map((i) => top - i * (tall - OVERLAP) - OVERLAP / 2),
    height: tall,
  };
}

const count = (size: number, room: number): number =>
  Math.max(1, Math.ceil((size - OVERLAP) / (room - OVERLAP) - 1e-9));
const span = (n: number, room: number): number => n * (room - OVERLAP) + OVERLAP;
