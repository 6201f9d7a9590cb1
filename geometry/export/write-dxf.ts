import type { ArcPath } from '../core/arc-path';
import { drawingBox, FILE_LAYERS, type FileDrawing, type FileEntity } from './drawing';

/** A group code with its value, the two lines that all of a DXF file is made of. */
type Pair = readonly [code: number, value: string | number];

const VERSION = 'AC1015';
/** $INSUNITS and $MEASUREMENT for inches. */
const INCHES = 1;
const ENGLISH = 0;

/**
 * A drawing as a DXF file of the year 2000 (ASCII): inches, a layer for each kind of thing, outlines as closed
 * polylines whose round corners are true arcs (bulges), full circles as CIRCLE.
 *
 * @returns the file; the same drawing gives the same text
 * @see DXF Reference, AutoCAD 2000, chapters HEADER, TABLES, BLOCKS, ENTITIES, OBJECTS
 */
export function writeDxf(drawing: FileDrawing): string {
  const handles = new Handles();
  const tables = tablesSection(handles);
  const blocks = blocksSection(handles, tables.spaces);
  const entities = drawing.entities.flatMap((entity) => entityPairs(entity, handles, tables.spaces.model));
  const pairs: Pair[] = [
    [999, oneLine(drawing.title)],
    ...headerSection(drawing),
    ...section('CLASSES', []),
    ...tables.pairs,
    ...blocks,
    ...section('ENTITIES', entities),
    ...objectsSection(),
    [0, 'EOF'],
  ];
  return pairs
    .map(
      ([code, value]) =>
        `${String(code).padStart(3)}\r\n${typeof value === 'number' ? number(value, code) : value}\r\n`,
    )
    .join('');
}

/** Every object of the file has a number of its own, in hex. */
class Handles {
  private last = 0x1f;

  next(): string {
    this.last += 1;
    return this.last.toString(16).toUpperCase();
  }

  /** Higher than all given so far and still to be given: the seed has to be so. */
  static readonly SEED = 'FFFFF';
}

/** Root dictionary; fixed, since the tables point at nothing else. */
const ROOT = 'C';
const GROUPS = 'D';

const section = (name: string, pairs: readonly Pair[]): Pair[] => [[0, 'SECTION'], [2, name], ...pairs, [0, 'ENDSEC']];

function headerSection(drawing: FileDrawing): Pair[] {
  const { minX, minY, maxX, maxY } = drawingBox(drawing);
  return section('HEADER', [
    [9, '$ACADVER'], [1, VERSION],
    [9, '$HANDSEED'], [5, Handles.SEED],
    [9, '$INSUNITS'], [70, INCHES],
    [9, '$MEASUREMENT'], [70, ENGLISH],
    [9, '$LUNITS'], [70, 2],
    [9, '$EXTMIN'], [10, minX], [20, minY], [30, 0],
    [9, '$EXTMAX'], [10, maxX], [20, maxY], [30, 0],
  ]); // prettier-ignore
}

interface Spaces {
  readonly model: string;
  readonly paper: string;
}

function tablesSection(handles: Handles): { readonly pairs: Pair[]; readonly spaces: Spaces } {
  const spaces = { model: handles.next(), paper: handles.next() };
  const record = (type: string, kind: string, owner: string, name: string, rest: readonly Pair[], handle = handles.next()): Pair[] => [
    [0, type], [type === 'DIMSTYLE' ? 105 : 5, handle], [330, owner],
    [100, 'AcDbSymbolTableRecord'], [100, kind], [2, name], ...rest,
  ]; // prettier-ignore
  const table = (name: string, entries: (owner: string) => readonly Pair[][]): Pair[] => {
    const own = handles.next();
    const rows = entries(own);
    const dimstyle: Pair[] = name === 'DIMSTYLE' ? [[100, 'AcDbDimStyleTable']] : [];
    return [[0, 'TABLE'], [2, name], [5, own], [330, '0'], [100, 'AcDbSymbolTable'], [70, rows.length], ...dimstyle, ...rows.flat(), [0, 'ENDTAB']]; // prettier-ignore
  };
  const lineType = (owner: string, name: string) =>
    record('LTYPE', 'AcDbLinetypeTableRecord', owner, name, [[70, 0], [3, ''], [72, 65], [73, 0], [40, 0]]); // prettier-ignore
  const layer = (owner: string, name: string, colour: number) =>
    record('LAYER', 'AcDbLayerTableRecord', owner, name, [[70, 0], [62, colour], [6, 'CONTINUOUS']]); // prettier-ignore
  const pairs = section('TABLES', [
    ...table('VPORT', (own) => [
      record('VPORT', 'AcDbViewportTableRecord', own, '*ACTIVE', [
        [70, 0], [10, 0], [20, 0], [11, 1], [21, 1], [12, 60], [22, 20], [13, 0], [23, 0], [14, 1], [24, 1],
        [15, 1], [25, 1], [16, 0], [26, 0], [36, 1], [17, 0], [27, 0], [37, 0], [40, 120], [41, 1.5], [42, 50],
      ]),
    ]), // prettier-ignore
    ...table('LTYPE', (own) => ['ByBlock', 'ByLayer', 'CONTINUOUS'].map((name) => lineType(own, name))),
    ...table('LAYER', (own) => [
      layer(own, '0', 7),
      ...Object.entries(FILE_LAYERS).map(([name, { colour }]) => layer(own, name, colour)),
    ]),
    ...table('STYLE', (own) => [
      record('STYLE', 'AcDbTextStyleTableRecord', own, 'STANDARD', [[70, 0], [40, 0], [41, 1], [50, 0], [71, 0], [42, 1], [3, 'txt'], [4, '']]), // prettier-ignore
    ]),
    ...table('VIEW', () => []),
    ...table('UCS', () => []),
    ...table('APPID', (own) => [record('APPID', 'AcDbRegAppTableRecord', own, 'ACAD', [[70, 0]])]),
    ...table('DIMSTYLE', (own) => [record('DIMSTYLE', 'AcDbDimStyleTableRecord', own, 'STANDARD', [[70, 0]])]),
    ...table('BLOCK_RECORD', (own) => [
      record('BLOCK_RECORD', 'AcDbBlockTableRecord', own, '*MODEL_SPACE', [], spaces.model),
      record('BLOCK_RECORD', 'AcDbBlockTableRecord', own, '*PAPER_SPACE', [], spaces.paper),
    ]),
  ]);
  return { pairs, spaces };
}

function blocksSection(handles: Handles, spaces: Spaces): Pair[] {
  const block = (name: string, owner: string, space: readonly Pair[]): Pair[] => [
    [0, 'BLOCK'], [5, handles.next()], [330, owner], [100, 'AcDbEntity'], ...space, [8, '0'], [100, 'AcDbBlockBegin'],
    [2, name], [70, 0], [10, 0], [20, 0], [30, 0], [3, name], [1, ''],
    [0, 'ENDBLK'], [5, handles.next()], [330, owner], [100, 'AcDbEntity'], ...space, [8, '0'], [100, 'AcDbBlockEnd'],
  ]; // prettier-ignore
  return section('BLOCKS', [
    ...block('*MODEL_SPACE', spaces.model, []),
    ...block('*PAPER_SPACE', spaces.paper, [[67, 1]]),
  ]);
}

function objectsSection(): Pair[] {
  return section('OBJECTS', [
    [0, 'DICTIONARY'], [5, ROOT], [330, '0'], [100, 'AcDbDictionary'], [281, 1], [3, 'ACAD_GROUP'], [350, GROUPS],
    [0, 'DICTIONARY'], [5, GROUPS], [330, ROOT], [100, 'AcDbDictionary'], [281, 1],
  ]); // prettier-ignore
}

function entityPairs(entity: FileEntity, handles: Handles, owner: string): Pair[] {
  const head = (type: string): Pair[] => [
    [0, type], [5, handles.next()], [330, owner], [100, 'AcDbEntity'], [8, entity.layer],
  ]; // prettier-ignore
  if (entity.kind === 'text') {
    const [x, y] = entity.at;
    return [
      ...head('TEXT'), [100, 'AcDbText'], [10, x], [20, y], [30, 0], [40, entity.height], [1, oneLine(entity.text)],
      [72, 1], [11, x], [21, y], [31, 0], [100, 'AcDbText'], [73, 2],
    ]; // prettier-ignore
  }
  const circle = circleOf(entity.path);
  if (circle)
    return [...head('CIRCLE'), [100, 'AcDbCircle'], [10, circle.x], [20, circle.y], [30, 0], [40, circle.radius]];
  const { vertices, closed } = entity.path;
  const corners = vertices.flatMap(({ at, bulge }): Pair[] => [
    [10, at[0]], [20, at[1]], ...(bulge === 0 ? [] : [[42, bulge] as Pair]),
  ]); // prettier-ignore
  return [...head('LWPOLYLINE'), [100, 'AcDbPolyline'], [90, vertices.length], [70, closed ? 1 : 0], ...corners];
}

/** Two half turns are a circle. */
function circleOf({ vertices, closed }: ArcPath): { x: number; y: number; radius: number } | null {
  const [a, b] = vertices;
  if (!closed || vertices.length !== 2 || a!.bulge !== 1 || b!.bulge !== 1) return null;
  const radius = Math.hypot(b!.at[0] - a!.at[0], b!.at[1] - a!.at[1]) / 2;
  return { x: (a!.at[0] + b!.at[0]) / 2, y: (a!.at[1] + b!.at[1]) / 2, radius };
}

/** Codes from 60 to 79 and 90 to 99 and above 170 take whole numbers, all others decimals; a billionth of an inch is kept. */
function number(value: number, code: number): string {
  const whole = (code >= 60 && code <= 79) || (code >= 90 && code <= 99) || code >= 170;
  if (whole) return String(Math.round(value));
  const text = (Math.abs(value) < 5e-11 ? 0 : value).toFixed(10).replace(/0+$/, '');
  return text.endsWith('.') ? `${text}0` : text;
}

/** A value is one line; letters beyond ASCII are written as the format wants them (\U+XXXX). */
function oneLine(text: string): string {
  const plain = text.replaceAll(/[\u0000-\u001f\u007f]+/g, ' ');
  return plain.replaceAll(
    /[^\u0020-\u007e]/g,
    (c) => `\\U+${c.charCodeAt(0).toString(16).toUpperCase().padStart(4, '0')}`,
  );
}
