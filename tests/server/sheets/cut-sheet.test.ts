import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import path from 'node:path';

import type { Point } from '@/geometry/core/point';
import { cutMarks, offSquareDeg } from '@/geometry/scene/slab/cut-marks';
import { placeSlab } from '@/geometry/scene/slab/placed-slab';
import { formatLength } from '@/geometry/tape/format-length';
import { parseLength } from '@/geometry/tape/parse-length';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { sheetPdf } from '@/server/sheets/sheet-pdf';

import { alderJob, HEAD, sharedMiterJob, stripsJob } from '../../geometry/scene/alder-job';
import { poppler, readAll, textLines } from './pdf-reading';

const ROOT = path.join(__dirname, '../../..');

describe('the cut sheets as a PDF', () => {
  const job = alderJob();
  let pdf: Buffer;
  let pages: string[][];

  beforeAll(async () => {
    pdf = await readAll(sheetPdf({ kinds: ['cut'], settings: DEFAULT_SETTINGS, ...job, head: HEAD, paper: 'letter' }));
    pages = textLines(pdf);
  });

  it('has a page for every slab, of US Letter, landscape', () => {
    const info = poppler('pdfinfo', [], pdf, false);
    expect(Number(/Pages:\s+(\d+)/.exec(info)![1])).toBe(pages.length);
    expect(pages.length).toBeGreaterThanOrEqual(job.plan.nest!.slabs.length);
    expect(info).toMatch(/Page size:\s+792 x 612 pts/);
  });

  it('comes on A4 as well', async () => {
    const a4 = await readAll(sheetPdf({ kinds: ['cut'], settings: DEFAULT_SETTINGS, ...job, head: HEAD, paper: 'a4' }));
    expect(poppler('pdfinfo', [], a4, false)).toMatch(/Page size:\s+841\.89 x 595\.276 pts/);
  });

  it('is titled, tagged, says its language, and dates from the revision', () => {
    const info = poppler('pdfinfo', ['-isodates'], pdf, false);
    expect(info).toMatch(/Title:\s+Cut sheets, 0142 Scullery at Alder Lane, revision 2/);
    expect(info).toMatch(/Tagged:\s+yes/);
    expect(info).toMatch(/CreationDate:\s+2031-05-12T00:00:00/);
    expect(pdf.toString('latin1')).toContain('/Lang (en-US)');
    expect(poppler('pdfinfo', ['-struct'], pdf, false)).toMatch(/Document[\s\S]*Sect[\s\S]*H1[\s\S]*Figure/);
  });

  it('carries its fonts: five faces, all embedded, all with their letters', () => {
    const rows = poppler('pdffonts', [], pdf, false).split('\n').slice(2).filter(Boolean);
    expect(rows).toHaveLength(5);
    for (const row of rows) expect(row).toMatch(/(BarlowCondensed|AtkinsonHyperlegibleNext).*yes yes yes/);
  });

  it('prints every mark of the plan, rounded once to 1/16, on the edge where it is set', () => {
    job.plan.nest!.slabs.forEach((_, i) => {
      const slab = placeSlab(job.plan, job.layout, i);
      const page = pages.find((lines) => lines[0] === `Cut sheet ${i + 1}: ${slab.name}`)!;
      const printed = marksOf(page);
      const planned = cutMarks(slab).map((mark) => {
        const name = mark.word === 'trim' ? 'trim' : mark.letter ? `${mark.letter} ${mark.word}` : `cut ${mark.cut}`;
        return `${name} ${formatLength(mark.at, '1/16')}`;
      });
      expect(printed.map((mark) => `${mark.name} ${mark.text}`).sort()).toEqual(planned.sort());
    });
  });

  it('says of every miter its angle off square and the same as two marks', () => {
    const text = pages.flat().join(' ');
    const miters = job.plan.nest!.slabs.flatMap((slab) =>
      slab.cuts.flatMap((cut) => (cut.kind === 'crosscut' && Math.abs(cut.back - cut.front) > 1 ? [cut] : [])),
    );
    expect(miters.length).toBeGreaterThan(0);
    for (const cut of miters) {
      expect(text).toContain(`${offSquareDeg(cut).toFixed(2)}° off square`);
      const along = formatLength(Math.abs(cut.back - cut.front), '1/16');
      expect(text).toContain(`25 across, ${along} along`);
    }
  });

  it('says sheet x of y on each page, with job, revision and who', () => {
    pages.forEach((lines, i) => {
      expect(lines).toContain(`${i + 1} of ${pages.length}`);
      expect(lines).toContain('0142 Scullery at Alder Lane');
      expect(lines).toContain('2, May 12, 2031');
      expect(lines).toContain('Renn, Sol');
    });
  });

  it('says DRAFT on unsigned work', async () => {
    const draft = await readAll(
      sheetPdf({
        kinds: ['cut'],
        settings: DEFAULT_SETTINGS,
        ...job,
        head: { ...HEAD, draft: true, signedBy: null },
        paper: 'letter',
      }),
    );
    for (const lines of textLines(draft))
      expect(lines.filter((line) => line.includes('DRAFT')).length).toBeGreaterThan(0);
    expect(pages.flat().join()).not.toContain('DRAFT');
  });

  it('gives the same bytes in another process, in another time zone', () => {
    const hashes = ['Pacific/Kiritimati', 'America/Adak'].map((zone) => hashElsewhere(zone));
    expect(hashes[0]).toBe(createHash('sha256').update(pdf).digest('hex'));
    expect(hashes[1]).toBe(hashes[0]);
  });

  it('gives other bytes for another revision', async () => {
    const next = await readAll(
      sheetPdf({ kinds: ['cut'], settings: DEFAULT_SETTINGS, ...job, head: { ...HEAD, revision: 3 }, paper: 'letter' }),
    );
    expect(next.equals(pdf)).toBe(false);
  });

  it('refuses a job whose pieces are not on slabs yet', () => {
    const plan = { ...job.plan, nest: null };
    expect(() =>
      sheetPdf({ kinds: ['cut'], settings: DEFAULT_SETTINGS, ...job, plan, head: HEAD, paper: 'letter' }),
    ).toThrow(/no slab plan/);
  });

  it('takes names of any length and letters beyond ASCII', async () => {
    const head = { ...HEAD, jobName: 'Spülküche Größenwahn, naïve façade '.repeat(9), drawnBy: 'Zoë' };
    const lines = textLines(
      await readAll(sheetPdf({ kinds: ['cut'], settings: DEFAULT_SETTINGS, ...job, head, paper: 'a4' })),
    ).flat();
    expect(lines.some((line) => line.startsWith('0142 Spülküche Größenwahn') && line.endsWith('…'))).toBe(true);
    expect(lines).toContain('Zoë, Sol');
  });

  it('goes on over as many pages as the cuts need', async () => {
    const strips = stripsJob();
    const many = textLines(
      await readAll(sheetPdf({ kinds: ['cut'], settings: DEFAULT_SETTINGS, ...strips, head: HEAD, paper: 'letter' })),
    );
    expect(many.filter((lines) => lines[0]!.endsWith('continued')).length).toBeGreaterThan(0);
  });
});

describe('the marks of a printed sheet alone', () => {
  it('rebuild S and T, which laid together give the corner within 1/32 in', async () => {
    const job = sharedMiterJob();
    const [page] = textLines(
      await readAll(sheetPdf({ kinds: ['cut'], settings: DEFAULT_SETTINGS, ...job, head: HEAD, paper: 'letter' })),
    );
    const marks = marksOf(page!);
    const at = (name: string, edge: 'top' | 'bottom') => marks.find((m) => m.name === name && m.edge === edge)!.inches;
    // Names that stand on one edge only tell their edge themselves; 25 is the depth printed under the title.
    const s: Point[] = [
      [at('trim', 'bottom'), 0],
      [at('S short point', 'bottom'), 0],
      [at('S long point', 'top'), 25],
      [at('trim', 'top'), 25],
    ];
    const t: Point[] = [
      [at('T long point', 'bottom'), 0],
      [at('T end', 'bottom'), 0],
      [at('T end', 'top'), 25],
      [at('T short point', 'top'), 25],
    ];
    const placed = placeSlab(job.plan, job.layout, 0).pieces;
    expectSame(s, placed.find((p) => p.letter === 'S')!.outline);
    expectSame(t, placed.find((p) => p.letter === 'T')!.outline);
    // The two mitred ends are as long as each other and as the joint of the plan.
    const joint = job.plan.joints.find((j) => j.letters.join('') === 'ST')!;
    for (const [a, b] of [
      [s[1]!, s[2]!],
      [t[0]!, t[3]!],
    ] as const) {
      // prettier-ignore
      expect(Math.abs(Math.hypot(b[0] - a[0], b[1] - a[1]) - joint.length)).toBeLessThan(1 / 16);
    }
  });
});

interface PrintedMark {
  readonly name: string;
  readonly text: string;
  readonly inches: number;
  readonly edge: 'top' | 'bottom';
}

/** Labels of the drawing in the order of painting: those of the top edge first, each name with its number behind it. */
function marksOf(lines: readonly string[]): PrintedMark[] {
  const table = lines.findIndex((line) => line.startsWith('Cut Done'));
  const labels = lines.slice(0, table).flatMap((line, i) => {
    const name = /^(trim|cut \d+|[A-Z]\d? (long point|short point|end))$/.exec(line)?.[1];
    const text = lines[i + 1];
    const parsed = name && text ? parseLength(text) : null;
    return name && text && parsed?.ok ? [{ name, text, inches: parsed.value }] : [];
  });
  return labels.map((label, i) => ({ ...label, edge: i < labels.length / 2 ? 'top' : 'bottom' }));
}

/** Every corner of the planned piece has a printed one within 1/32 in: what rounding to 1/16 may cost. */
function expectSame(printed: readonly Point[], planned: readonly Point[]): void {
  for (const [x, y] of planned) {
    expect(Math.min(...printed.map((p) => Math.hypot(p[0] - x, p[1] - y)))).toBeLessThanOrEqual(1 / 32 + 1e-9);
  }
}

/** SHA-256 of the same sheets made by a fresh process that believes to be elsewhere. */
function hashElsewhere(zone: string): string {
  const script = path.join(__dirname, 'print-hash.ts');
  return execFileSync(process.execPath, ['--import', 'tsx', script], {
    cwd: ROOT,
    env: { ...process.env, TZ: zone, NODE_OPTIONS: '' },
    encoding: 'utf8',
  }).trim();
}
