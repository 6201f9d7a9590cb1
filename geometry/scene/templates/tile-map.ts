import { styles, type PageBuilder } from '../paper/page-builder';
import type { Tile, Tiling } from './tiles';

/** px */
export const MAP_WIDTH = 150;
const MAP_HEIGHT = 44;
const TOP = 28;

/** Which parts of the whole are on this page: a small grid with those filled, ending at `right` px. */
export function addTileMap(page: PageBuilder, { columns, rows }: Tiling, shown: readonly Tile[], right: number): void {
  const cell = Math.min(MAP_WIDTH / columns, (MAP_HEIGHT / rows) * 1.6, 40);
  const tall = Math.min(MAP_HEIGHT / rows, 22);
  const left = right - cell * columns;
  for (let row = 0; row < rows; row++) {
    for (let column = 0; column < columns; column++) {
      const here = shown.some((tile) => tile.row === row && tile.column === column);
      page.box(left + column * cell, TOP + row * tall, cell, tall, 1, here ? 'ink' : 'card');
    }
  }
  const names = shown.map(tileName);
  const words = names.length > 1 ? `Parts ${names[0]} to ${names.at(-1)}` : `Part ${names[0]}`;
  page.text(right, TOP + rows * tall + 18, words, styles.label, { id: 'map', anchor: 'end' });
}

/** Rows by letter from the top, columns by number from the left: "B3". */
export const tileName = ({ row, column }: Tile): string => `${String.fromCharCode(65 + (row % 26))}${column + 1}`;
