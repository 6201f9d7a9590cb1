import type { Paper } from '../paper/sheet-head';

const MM = 1 / 25.4;

/** A sheet of labels, or one label by itself; inches. */
export interface LabelGrid {
  /** Columns by rows and the size of one, as a person counts and measures them. */
  readonly name: string;
  readonly paper: Paper;
  readonly page: { readonly width: number; readonly height: number };
  readonly columns: number;
  readonly rows: number;
  readonly width: number;
  readonly height: number;
  /** Left upper corner of the first label, and from one label to the next. */
  readonly left: number;
  readonly top: number;
  readonly pitchX: number;
  readonly pitchY: number;
}

const LETTER = { width: 8.5, height: 11 };
const A4 = { width: 210 * MM, height: 297 * MM };

/** `size` width and height of a label, `first` its left and top; in `unit`s of an inch. */
function grid(
  paper: Paper,
  name: string,
  [columns, rows]: readonly [number, number],
  [width, height]: readonly [number, number],
  [left, top]: readonly [number, number],
  [pitchX, pitchY]: readonly [number, number],
  unit = 1,
): LabelGrid {
  const inches = { width: width * unit, height: height * unit, left: left * unit, top: top * unit, pitchX: pitchX * unit, pitchY: pitchY * unit }; // prettier-ignore
  return { name, paper, page: paper === 'letter' ? LETTER : A4, columns, rows, ...inches };
}

/** One label a page, for printers with a roll. */
function single(paper: Paper, name: string, width: number, height: number): LabelGrid {
  return { name, paper, page: { width, height }, columns: 1, rows: 1, width, height, left: 0, top: 0, pitchX: width, pitchY: height }; // prettier-ignore
}

/** Label sheets that can be had everywhere; sizes and margins are common practice, so print one on plain paper first. */
export const LABEL_GRIDS = {
  'letter-2x5': grid('letter', '2 × 5, 4 × 2 in', [2, 5], [4, 2], [0.15625, 0.5], [4.1875, 2]),
  'letter-2x3': grid('letter', '2 × 3, 4 × 3 1/3 in', [2, 3], [4, 10 / 3], [0.15625, 0.5], [4.1875, 10 / 3]),
  'letter-3x10': grid('letter', '3 × 10, 2 5/8 × 1 in', [3, 10], [2.625, 1], [0.1875, 0.5], [2.75, 1]),
  'letter-single': single('letter', 'Single, 4 × 2 in', 4, 2),
  'a4-2x7': grid('a4', '2 × 7, 99.1 × 38.1 mm', [2, 7], [99.1, 38.1], [4.65, 15.15], [101.6, 38.1], MM),
  'a4-2x4': grid('a4', '2 × 4, 99.1 × 67.7 mm', [2, 4], [99.1, 67.7], [4.65, 13.1], [101.6, 67.7], MM),
  'a4-3x8': grid('a4', '3 × 8, 70 × 37 mm', [3, 8], [70, 37], [0, 0.5], [70, 37], MM),
  'a4-single': single('a4', 'Single, 100 × 50 mm', 100 * MM, 50 * MM),
} as const satisfies Readonly<Record<string, LabelGrid>>;

export type LabelGridKey = keyof typeof LABEL_GRIDS;

export const LABEL_GRID_KEYS = Object.keys(LABEL_GRIDS) as LabelGridKey[];

export const labelGrid = (key: LabelGridKey): LabelGrid => LABEL_GRIDS[key];

/** The grid that is taken where nobody chose one. */
export const usualGrid = (paper: Paper): LabelGridKey => (paper === 'letter' ? 'letter-2x5' : 'a4-2x7');

/** Which labels are printed on, and from which on, counted from 1 along the rows: the used ones of a begun sheet stay free. */
export interface LabelChoice {
  readonly grid: LabelGridKey;
  readonly start: number;
}
