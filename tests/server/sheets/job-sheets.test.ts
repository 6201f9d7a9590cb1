import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import type { SheetKind } from '@/geometry/scene/sheet-kinds';
import { sheetEntry } from '@/geometry/scene/sheet-kinds';
import { carryOrder } from '@/geometry/scene/fit-sheet/carry-order';
import { formatLength } from '@/geometry/tape/format-length';
import { drawboltsAlong } from '@/geometry/wood/drawbolts';
import { finishSetting } from '@/geometry/wood/finish';
import { seamCleats } from '@/geometry/wood/cleats';
import { seamConnectors } from '@/geometry/wood/joint-wood';
import { sandingGrits } from '@/geometry/wood/sanding';
import { qrRows } from '@/server/sheets/qr-rows';
import { sheetPdf } from '@/server/sheets/sheet-pdf';

import { alderJob, HEAD, sharedMiterJob, stripsJob, type Job } from '../../geometry/scene/alder-job';
import { poppler, readAll, textLines } from './pdf-reading';

const print = (kind: SheetKind, job: Job, over: object = {}) =>
  readAll(sheetPdf({ kinds: [kind], settings: DEFAULT_SETTINGS, head: HEAD, paper: 'letter', ...job, ...over }));

/** All that a sheet says, on one line: a stacked fraction comes as "59 11/16". */
const textOf = async (kind: SheetKind, job: Job, over: object = {}): Promise<string> =>
  textLines(await print(kind, job, over)).flat().join(' '); // prettier-ignore

const say = (inches: number) => formatLength(inches, '1/16');

const job = alderJob();

describe('the joint sheet', () => {
  it('says of each joint its length, angles, connectors and drawbolts as the plan has them', async () => {
    const text = await textOf('joint', job);
    expect(job.plan.joints).toHaveLength(2);
    for (const joint of job.plan.joints) {
      expect(text).toContain(`Miter ${joint.letters.join(' to ')}, on site`);
      expect(text).toContain(`Face ${say(joint.length)} in long.`);
      expect(text).toContain(`is cut at ${joint.angles[0].toFixed(2)}°`);
      expect(text).toContain(`${joint.connectors.length} × loose tenon`);
      for (const at of [...joint.connectors, ...drawboltsAlong(joint.length)]) expect(text).toContain(say(at));
    }
  });

  it('puts the cleats of a seam into the waste of its cutout and says what shows', async () => {
    const seamed = sharedMiterJob();
    const text = await textOf('joint', seamed);
    const seam = seamed.plan.seams[0]!;
    const cutout = seamed.plan.cutouts.find((one) => one.id === seam.inCutout)!;
    const cleats = seamCleats(seam, cutout)!;
    expect(text).toContain(`Seam ${seam.letters.join(' to ')}, on site`);
    expect(text).toContain(`${say(seam.visible)} in of it stays on the finished top`);
    expect(text).toContain(`at ${say(cleats.at[0])} in and ${say(cleats.at[1])} in from the back point`);
    for (const at of seamConnectors(seam, seamed.plan.tops, DEFAULT_SETTINGS)) expect(text).toContain(say(at));
  });

  it('tells glue, clamps and cure of a joint that is closed in the shop', async () => {
    const joints = job.plan.joints.map((joint) => ({ ...joint, assembled: 'shop' as const }));
    const text = await textOf('joint', { ...job, plan: { ...job.plan, joints } });
    const { clampHours, cureHours } = DEFAULT_SETTINGS.times;
    expect(text).toContain(`In clamps ${clampHours} h, no load and no cut for ${cureHours} h.`);
  });

  it('limits the depth near a point that is too acute for a whole mortise', async () => {
    const joints = job.plan.joints.map((joint) => ({ ...joint, angles: [20, 20] as const, connectors: [5] }));
    const text = await textOf('joint', { ...job, plan: { ...job.plan, joints } });
    // (s - b/2) sin f - d cos f = 1/4 with s 5, b 15/16, f 20: d = 1.383 > 1 3/16; at the other end nothing limits.
    expect(text).not.toContain('no deeper than');
    const nearer = job.plan.joints.map((joint) => ({ ...joint, angles: [20, 20] as const, connectors: [4] }));
    // With s 4: d = ((4 - 15/32) sin 20 - 1/4) / cos 20 = 1.0193.
    expect(await textOf('joint', { ...job, plan: { ...job.plan, joints: nearer } })).toContain(
      `no deeper than ${say(1.0193)} in`,
    );
  });
});

describe('the fit sheet', () => {
  it('lists every carry once, in an order, with its length and weight', async () => {
    const lines = textLines(await print('fit', job)).flat();
    const carries = carryOrder(job.plan);
    expect(carries.flatMap((carry) => carry.letters).sort()).toEqual(
      job.plan.pieces.map((piece) => piece.letter).sort(),
    );
    for (const carry of carries) {
      const row = `${carry.n} ${carry.letters.join(' ')} ${say(carry.span)} ${Math.round(carry.weightLb)} lb`;
      expect(lines.some((line) => line.startsWith(row))).toBe(true);
    }
  });

  it('says the screw with its bite and what is left, and the slot', async () => {
    const text = await textOf('fit', job);
    const { length, bite, left } = job.plan.screws!;
    expect(text).toContain(`Screws ${say(length)} in: ${say(bite)} in bites, ${say(left)} in of wood is left`);
    expect(text).toContain(`slots ${say(job.plan.movement.slot)} in long across the grain`);
  });

  it('has the scribe of the bowed wall at every station', async () => {
    const [scribe] = job.plan.wallFit.scribes;
    const lines = textLines(await print('fit', job)).flat();
    expect(scribe!.stations.length).toBeGreaterThanOrEqual(3);
    for (const { at, gap, takeOff } of scribe!.stations)
      expect(lines).toContain(`${say(at)} ${say(gap)} ${takeOff > 0 ? say(takeOff) : 'nothing'}`);
  });
});

describe('the finish sheet', () => {
  it('has the grits, and the coats with their times', async () => {
    const text = await textOf('finish', job);
    const setting = finishSetting(job.layout.finish, DEFAULT_SETTINGS)!;
    for (const grit of sandingGrits(job.layout.finish)) expect(text).toContain(` ${grit} `);
    expect(text).toContain(`${setting.recoatHours} h, to recoat`);
    expect(text).toContain(`${setting.cureHours} h, to cure`);
    expect(text).toMatch(/Oily rags catch fire by themselves/);
  });

  it('is dated where a first day was chosen', async () => {
    const layout = { ...job.layout, work: { start: '2031-05-12', changes: [], added: [], order: [] } };
    expect(await textOf('finish', { ...job, layout })).toMatch(/May \d+, 2031, ready May \d+, 2031/);
    expect(await textOf('finish', job)).not.toContain('ready');
  });

  it('says so where no finish was chosen', async () => {
    const layout = { ...job.layout, finish: { kind: 'none' as const } };
    expect(await textOf('finish', { ...job, layout })).toContain('the wood stays bare');
  });
});

describe('the customer pages', () => {
  it('use no word of the trade', async () => {
    const text = await textOf('customer', job);
    expect(text).toContain('Your top');
    expect(text).toContain('hard maple');
    expect(text).not.toMatch(/\b(miter|mitre|kerf|stave|scribe|seam|butt|crosscut|long point|short point|nest)s?\b/i);
  });
});

const KINDS: readonly SheetKind[] = ['joint', 'fit', 'finish', 'customer'];

describe.each(KINDS)('the %s pages', (kind) => {
  it('keep every word on the page and above its foot, for long names and many pieces, on both papers', () => {
    const long = {
      ...HEAD,
      jobName: 'Spülküche Größenwahn '.repeat(14),
      qr: qrRows('http://localhost:8080/jobs/1/sheets'),
    };
    for (const one of [job, stripsJob()])
      for (const paper of ['letter', 'a4'] as const) {
        const pages = sheetEntry(kind).pages({ ...one, settings: DEFAULT_SETTINGS, head: long, paper });
        for (const { items, bounds } of pages)
          for (const item of items) {
            if (item.kind !== 'text' && item.kind !== 'runs') continue;
            const foot = item.id?.startsWith('foot') || item.layer === 'frame';
            expect(item.at[1]).toBeGreaterThanOrEqual(foot ? 0.3 : 0.87);
            expect(item.at[1]).toBeLessThanOrEqual(bounds.maxY);
            expect(item.at[0]).toBeGreaterThanOrEqual(0.3);
            expect(item.at[0]).toBeLessThanOrEqual(bounds.maxX - 0.3);
          }
      }
  });

  it('are numbered through, carry the job and, unsigned, DRAFT', async () => {
    const pages = textLines(await print(kind, job, { head: { ...HEAD, draft: true, signedBy: null } }));
    pages.forEach((lines, i) => {
      expect(lines).toContain(`${i + 1} of ${pages.length}`);
      expect(lines.some((line) => line.includes('0142 Scullery at Alder Lane'))).toBe(true);
      expect(lines.join(' ')).toContain('DRAFT');
    });
  });

  it('have all their fonts inside, a title and a language', async () => {
    const pdf = await print(kind, job);
    const rows = poppler('pdffonts', [], pdf, false).split('\n').slice(2).filter(Boolean);
    expect(rows.length).toBeGreaterThan(1);
    for (const row of rows) expect(row).toMatch(/(BarlowCondensed|AtkinsonHyperlegibleNext).*yes yes yes/);
    expect(poppler('pdfinfo', [], pdf, false)).toContain(`${sheetEntry(kind).name}s, 0142`);
    expect(pdf.toString('latin1')).toContain('/Lang (en-US)');
  });
});

describe('the QR code in the head', () => {
  it('is drawn module by module as the encoder gives it', () => {
    const qr = qrRows('http://localhost:8080/jobs/0f6/sheets');
    const [page] = sheetEntry('fit').pages({
      ...job,
      settings: DEFAULT_SETTINGS,
      head: { ...HEAD, qr },
      paper: 'letter',
    });
    const boxes = page!.items.filter((item) => item.kind === 'polygon' && item.id === 'qr');
    expect(boxes).toHaveLength(qr.reduce((sum, row) => sum + (row.match(/1+/g) ?? []).length, 0));
    // Three finder patterns, ISO/IEC 18004: seven dark modules along three of the corners' edges.
    expect(qr[0]!.startsWith('1111111')).toBe(true);
    expect(qr[0]!.endsWith('1111111')).toBe(true);
    expect(qr.at(-1)!.startsWith('1111111')).toBe(true);
  });
});
