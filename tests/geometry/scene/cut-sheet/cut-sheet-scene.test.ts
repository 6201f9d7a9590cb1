import { cutSheetPages, cutSheetScene } from '@/geometry/scene/cut-sheet/cut-sheet-scene';
import type { Scene } from '@/geometry/scene/display-list';
import { PAPER_SIZE, type Paper } from '@/geometry/scene/paper/sheet-head';
import type { Layout } from '@/geometry/core/layout';

import { alderJob, HEAD, planLayout, sharedMiterJob, stripsJob, type Job } from '../alder-job';
import { pageTexts, pathPoints } from '../page-reading';

const JOBS: readonly (readonly [string, () => Job])[] = [
  ['a U on four slabs', alderJob],
  ['two pieces sharing a miter', sharedMiterJob],
  ['twenty-four strips', stripsJob],
];
const PAPERS: readonly Paper[] = ['letter', 'a4'];

const words = (page: Scene) =>
  pageTexts(page)
    .map((t) => t.text)
    .join(' ')
    .replace(/ +/g, ' ')
    .replace(/ ([.,:])/g, '$1');

describe.each(JOBS)('cut sheets of %s', (_, make) => {
  const job = make();

  it.each(PAPERS)('print no text under 14 px on %s', (paper) => {
    for (const page of cutSheetPages(job.plan, job.layout, HEAD, paper)) {
      expect(Math.min(...pageTexts(page).map((t) => t.size))).toBeGreaterThanOrEqual(14 - 1e-9);
    }
  });

  it.each(PAPERS)('keep everything at least 1/4 in from the edge of %s', (paper) => {
    const { width, height } = PAPER_SIZE[paper];
    for (const page of cutSheetPages(job.plan, job.layout, HEAD, paper)) {
      const boxes = pageTexts(page).map((t) => [t.left, t.right, t.top, t.bottom] as const);
      const points = pathPoints(page);
      const xs = [...boxes.flatMap((b) => [b[0], b[1]]), ...points.map((p) => p[0])];
      const ys = [...boxes.flatMap((b) => [b[2], b[3]]), ...points.map((p) => p[1])];
      expect(Math.min(...xs)).toBeGreaterThan(24);
      expect(Math.max(...xs)).toBeLessThan(width * 96 - 24);
      expect(Math.min(...ys)).toBeGreaterThan(24);
      expect(Math.max(...ys)).toBeLessThan(height * 96 - 24);
    }
  });

  it.each(PAPERS)('never print one text over another on %s', (paper) => {
    for (const page of cutSheetPages(job.plan, job.layout, HEAD, paper)) {
      const texts = pageTexts(page);
      const over = texts.flatMap((a, i) =>
        texts.slice(i + 1).flatMap((b) => (a.item !== b.item && overlap(a, b) ? [`${a.text} / ${b.text}`] : [])),
      );
      expect(over).toEqual([]);
    }
  });

  it('number every page of the set once', () => {
    const pages = cutSheetPages(job.plan, job.layout, HEAD, 'letter');
    expect(pages.map((page) => /Sheet (\d+ of \d+)/.exec(words(page))?.[1])).toEqual(
      pages.map((_, i) => `${i + 1} of ${pages.length}`),
    );
  });

  it('have every cut and every letter in the tables once', () => {
    job.plan.nest!.slabs.forEach((slab, i) => {
      const pages = cutSheetScene(job.plan, job.layout, i, HEAD, 'letter');
      const numbers = pages.flatMap((page) =>
        page.items.flatMap((item) =>
          item.kind === 'text' && item.layer === 'text' && /^step \d+$/.test(item.id ?? '') ? [Number(item.text)] : [],
        ),
      );
      expect(numbers).toEqual(slab.cuts.map((cut) => cut.n));
    });
  });
});

describe('cutSheetPages', () => {
  const { plan, layout } = sharedMiterJob();
  const [page] = cutSheetPages(plan, layout, HEAD, 'letter');

  it('says the miter in words, marks, degrees off square and two marks', () => {
    const text = words(page!);
    expect(text).toMatch(/Miter, top 59 3\/8 to bottom 33 3\/4/);
    expect(text).toMatch(/Kerf falls on the T side\. One pass makes both ends\./);
    expect(text).toMatch(/45\.69° off square/);
    expect(text).toMatch(/25 across, 25 5\/8 along/);
    // The same miter as an angle: atan(25 5/8 / 25) = 45.7 degrees.
    expect((Math.atan(25.625 / 25) * 180) / Math.PI).toBeCloseTo(45.7, 1);
  });

  it('names the faces, the wall edges, and the cutout to leave until after glue-up', () => {
    const text = words(page!);
    expect(text).toContain('Face up');
    expect(text).toContain('Face DOWN');
    expect(text.match(/wall edge/g)!.length).toBeGreaterThanOrEqual(2);
    expect(text).toContain('after glue-up');
    expect(text).toMatch(/T lies\s+face down/);
  });

  it('tells kerf, depth of the slab, and whom to tell', () => {
    const text = words(page!);
    expect(text).toMatch(/Kerf 1\/8 in, already in the marks/);
    expect(text).toMatch(/Slab not 25 all along\? Stop, tell Sol\./);
    expect(text).toContain('Guard on.');
  });

  it('draws a bar of exactly 2 in', () => {
    const bar = page!.items.find((item) => item.kind === 'line' && item.layer === 'frame');
    if (bar?.kind !== 'line') throw new Error('no bar');
    expect(bar.to[0] - bar.from[0]).toBeCloseTo(2, 9);
  });

  it('writes DRAFT across unsigned work only, and says that the job was changed', () => {
    const draft = { ...HEAD, draft: true, signedBy: null, changedSince: 1 };
    const [drafted] = cutSheetPages(plan, layout, draft, 'letter');
    const hollow = (scene: Scene) => scene.items.filter((item) => item.kind === 'text' && item.hollow);
    expect(hollow(drafted!)).toHaveLength(1);
    expect(hollow(page!)).toHaveLength(0);
    expect(words(drafted!)).toContain('changed since revision 1');
    expect(words(drafted!)).toContain('Renn, not signed off');
  });

  it('takes its place in a larger set', () => {
    const [numbered] = cutSheetPages(plan, layout, HEAD, 'letter', { before: 3, of: 9 });
    expect(words(numbered!)).toContain('4 of 9');
  });

  it('cuts off a name that is too long for its cell, and keeps it inside', () => {
    const long = { ...HEAD, jobName: 'The very long scullery, pantry and wash house of the harbour master '.repeat(3) };
    const [named] = cutSheetPages(plan, layout, long, 'letter');
    const job = pageTexts(named!).find((t) => t.text.startsWith('0142'))!;
    expect(job.text.endsWith('…')).toBe(true);
    expect(job.right).toBeLessThan(400);
  });

  it('goes on over the page when the table is long, and says so', () => {
    const strips = stripsJob();
    const pages = cutSheetPages(strips.plan, strips.layout, HEAD, 'letter');
    const continued = pages.filter((p) => p.title?.endsWith('continued'));
    expect(continued.length).toBeGreaterThan(0);
    const first = pages.find((p) => words(p).includes('The cuts go on over the page'));
    expect(first).toBeDefined();
  });

  it('prints millimeters where the layout is kept in them', () => {
    const metric: Layout = { ...sharedMiterJob().layout, units: 'mm', step: '1 mm' };
    const [sheet] = cutSheetPages({ ...plan }, metric, HEAD, 'a4');
    const miter = plan.nest!.slabs[0]!.cuts[1]!;
    if (miter.kind !== 'crosscut') throw new Error('the second cut is the miter');
    const [top, bottom] = [miter.back, miter.front].map((at) => Math.round(at * 25.4));
    expect(words(sheet!)).toContain(`Miter, top ${top} to bottom ${bottom}.`);
  });

  it('stays right with sixty pieces', () => {
    const base = stripsJob().layout;
    const many = planLayout({
      ...base,
      strips: [{ id: 's1', label: 'slat', length: 31, width: 2.25, thickness: 1.5, count: 56 }],
    });
    const pages = cutSheetPages(many.plan, many.layout, HEAD, 'a4');
    const shown = pages.reduce((sum, p) => sum + p.items.filter((i) => i.kind === 'mark' && i.layer === 'letters' && (i.mark === 'disc' || i.mark === 'square')).length, 0); // prettier-ignore
    expect(shown).toBe(many.plan.pieces.reduce((sum, piece) => sum + piece.count, 0));
    for (const page of pages) expect(Math.min(...pageTexts(page).map((t) => t.size))).toBeGreaterThanOrEqual(14 - 1e-9);
  });
});

interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** px by which two texts may touch: kerning makes them a little narrower than the tables say. */
const TOUCH = 1;

const overlap = (a: Box, b: Box): boolean =>
  Math.min(a.right, b.right) - Math.max(a.left, b.left) > TOUCH &&
  Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top) > TOUCH;
