import path from 'node:path';
import PDFDocument from 'pdfkit';

import { nest } from '@/geometry/nest/nest';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import type { Layout } from '@/geometry/core/layout';
import { makePlan } from '@/geometry/plan/make-plan';
import type { Plan } from '@/geometry/plan/types';
import { cutSheetPages } from '@/geometry/scene/cut-sheet/cut-sheet-scene';
import type { SheetHead } from '@/geometry/scene/paper/sheet-head';
import type { Path, Primitive, View } from '@/geometry/scene/primitives/primitive';
import { toPrimitives } from '@/geometry/scene/primitives/to-primitives';
import { fontOf } from '@/geometry/scene/text-width';
import { sheetPdf } from '@/server/sheets/sheet-pdf';
import { parseJobFile } from '@/shared/layout/parse-job-file';

import type { BenchRow } from './bench-row';

type Doc = typeof PDFDocument.prototype;
type Operator = (doc: Doc) => void;

/** An L of two long runs, an island and twelve strips: several slabs, rips, a table of more than one page. */
const JOB = {
  format: 'offsquare-job',
  version: 1,
  name: 'Bakery counter on Capstan Row',
  room: {
    walls: [
      { id: 'A', length: '142 3/8' },
      { id: 'B', length: '131 1/4' },
    ],
    corners: [{ between: ['A', 'B'], nominal: 90, triangle: { a: 36, b: 48, c: '60 3/8' } }],
  },
  runs: [
    { id: '1', wall: 'A', left: { kind: 'open' }, right: { kind: 'joint' } },
    { id: '2', wall: 'B', left: { kind: 'joint' }, right: { kind: 'open' } },
  ],
  islands: [{ id: 'I', length: 84, depth: 25 }],
  strips: [{ id: 's', label: 'shelf', length: 38, width: 5.5, thickness: 1.5, count: 12 }],
  cutouts: [{ id: 'c1', on: '1', kind: 'sink', centre: 70, setback: 3, width: 30, depth: 18, radius: 0.75 }],
  joints: [{ between: ['1', '2'], kind: 'miter', assembled: 'site' }],
  stock: { slabs: [{ id: 'S96', length: 96, depth: 25, price: 37900, count: null }, { id: 'S120', length: 120, depth: 25, price: 47900, count: null }] }, // prettier-ignore
};

const HEAD: SheetHead = {
  jobNumber: '0151',
  jobName: JOB.name,
  revision: 1,
  revisionDate: '2031-05-12',
  drawnBy: 'Renn',
  signedBy: 'Sol',
  draft: false,
};

const ROUNDS = 15;
const WARM_UP = 4;

/** Cut sheets of a whole job, from the plan to the last byte, against pdfkit told the same paths and texts and nothing else. */
export async function rows(): Promise<BenchRow[]> {
  const { plan, layout } = benchJob();
  const bare = bareOperators(plan, layout);
  const sheet = () =>
    drain(sheetPdf({ kinds: ['cut'], settings: DEFAULT_SETTINGS, plan, layout, head: HEAD, paper: 'letter' }));
  const times = { sheet: [] as number[], bare: [] as number[] };
  // Turn about, so that a slow moment of the machine hits both alike.
  for (let round = 0; round < ROUNDS + WARM_UP; round++) {
    const first = await timed(sheet);
    const second = await timed(() => drain(paintBare(bare.pages)));
    if (round < WARM_UP) continue;
    times.sheet.push(first);
    times.bare.push(second);
  }
  const [value, against] = [median(times.sheet), median(times.bare)];
  return [
    {
      name: `cut sheet, ${bare.pages.length} pages, ${bare.count} operators`,
      value,
      unit: 'ms',
      against: { name: 'bare pdfkit, same operators', value: against },
      ratio: value / against,
    },
  ];
}

function benchJob(): { plan: Plan; layout: Layout } {
  const parsed = parseJobFile(JOB);
  if (!parsed.ok) throw new Error(parsed.errors.map((e) => `${e.path}: ${e.message}`).join('\n'));
  const { layout } = parsed;
  const { instance } = makePlan({ layout, settings: DEFAULT_SETTINGS, nest: null });
  const found = nest(instance, { workLimit: 20_000 });
  if ('error' in found) throw new Error(found.error.message);
  return { layout, plan: makePlan({ layout, settings: DEFAULT_SETTINGS, nest: found }) };
}

/** Everything the sheets paint, as calls of pdfkit's own methods, prepared before the clock runs. */
function bareOperators(plan: Plan, layout: Layout): { pages: Operator[][]; count: number } {
  const pages = cutSheetPages(plan, layout, HEAD, 'letter').map((page) => {
    const view: View = { pxPerInch: 72, pixel: 0.75, origin: [0, page.paper!.height], smallest: 14, wood: 'lines' };
    return page.items.flatMap((item) => toPrimitives(item, view)).flatMap(operatorsOf);
  });
  return { pages, count: pages.reduce((sum, page) => sum + page.length, 0) };
}

const WHITE = new Set(['card', 'paper']);
const ink = (paint: unknown): string => (typeof paint === 'string' && WHITE.has(paint) ? '#FFFFFF' : '#000000');

function operatorsOf(primitive: Primitive): Operator[] {
  if (primitive.kind === 'span' || primitive.kind === 'clip') return primitive.children.flatMap(operatorsOf);
  if (primitive.kind === 'text') {
    const { text, x, y, size, face } = primitive;
    const left = x - { start: 0, middle: primitive.width / 2, end: primitive.width }[primitive.anchor];
    const options = { lineBreak: false, baseline: 'alphabetic', ...(face === 'body' ? { features: ['tnum' as const] } : {}) }; // prettier-ignore
    return [(doc) => doc.font(fontOf(primitive)).fontSize(size).fillColor(ink(primitive.paint)).text(text, left, y, options as PDFKit.Mixins.TextOptions)]; // prettier-ignore
  }
  const { path, fill, line } = primitive;
  if (path.length === 0) return [];
  return [
    (doc) => {
      if (fill) doc.fillColor(ink(fill));
      if (line) doc.strokeColor(ink(line.paint)).lineWidth(line.width);
      if (line?.dash) doc.dash([...line.dash] as never);
      trace(doc, path);
      if (fill && line) doc.fillAndStroke();
      else if (fill) doc.fill();
      else doc.stroke();
      if (line?.dash) doc.undash();
    },
  ];
}

function trace(doc: Doc, path: Path): void {
  for (const segment of path) {
    if (segment[0] === 'M') doc.moveTo(segment[1], segment[2]);
    else if (segment[0] === 'L') doc.lineTo(segment[1], segment[2]);
    else if (segment[0] === 'Z') doc.closePath();
    else doc.bezierCurveTo(segment[1], segment[2], segment[3], segment[4], segment[5], segment[6]);
  }
}

const FONTS: readonly (readonly [string, string])[] = [
  ['labelSemibold', 'BarlowCondensed-SemiBold'],
  ['labelBold', 'BarlowCondensed-Bold'],
  ['labelExtrabold', 'BarlowCondensed-ExtraBold'],
  ['bodyRegular', 'AtkinsonHyperlegibleNext-Regular'],
  ['bodyBold', 'AtkinsonHyperlegibleNext-Bold'],
];

function paintBare(pages: readonly Operator[][]): NodeJS.ReadableStream {
  const doc = new PDFDocument({ autoFirstPage: false, margin: 0 });
  for (const [name, file] of FONTS) doc.registerFont(name, path.join(__dirname, '../../assets/fonts', `${file}.ttf`));
  for (const page of pages) {
    doc.addPage({ size: [792, 612], margin: 0 });
    for (const operator of page) operator(doc);
  }
  doc.end();
  return doc;
}

async function drain(stream: NodeJS.ReadableStream): Promise<number> {
  let bytes = 0;
  for await (const chunk of stream) bytes += (chunk as Uint8Array).length;
  return bytes;
}

async function timed(work: () => Promise<number>): Promise<number> {
  const start = performance.now();
  await work();
  return performance.now() - start;
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)]!;
}
