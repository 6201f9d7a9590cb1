import { pageList, sheetItems } from '@/components/sheets/sheet-list';
import { planFiles } from '@/components/sheets/plan-files';
import { printedBefore } from '@/components/sheets/printed-before';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { SHEET_KINDS } from '@/geometry/scene/sheet-kinds';
import DxfParser from 'dxf-parser';

import { alderJob, HEAD } from '../../geometry/scene/alder-job';

const job = alderJob();
const source = { ...job, settings: DEFAULT_SETTINGS, head: HEAD, paper: 'letter', prices: true } as const;

describe('what can be printed', () => {
  it('is a card for each slab, then one for every other kind, with the pages the server counts', () => {
    const items = sheetItems(source);
    const cut = items.filter((item) => item.kind === 'cut');
    expect(cut).toHaveLength(job.plan.nest!.slabs.length);
    expect(cut.flatMap((item) => item.numbers)).toEqual(cut.flatMap((item) => item.pages).map((_, i) => i + 1));
    expect([...new Set(items.map((item) => item.kind))].sort()).toEqual([...SHEET_KINDS].sort());
  });

  it('has no cut sheets while nothing lies on slabs, and still all that needs none', () => {
    const kinds = sheetItems({ ...source, plan: { ...job.plan, nest: null } }).map((item) => item.kind);
    expect(kinds).not.toContain('cut');
    expect(kinds).toEqual(expect.arrayContaining(['joint', 'fit', 'finish']));
  });
});

it.each([
  [[1, 2, 3, 5], '1-3,5'],
  [[4], '4'],
  [[7, 6, 2], '2,6-7'],
  [[], ''],
])('writes pages %j as "%s"', (numbers, text) => {
  expect(pageList(numbers)).toBe(text);
});

it('names the newest printed revision that is not the newest of the job', () => {
  const print = (revision: number) => ({ revision, kinds: ['cut'], at: '2031-05-12T09:00:00.000Z', by: 'Sol' });
  expect(printedBefore([print(3), print(1), print(2)], 3)?.revision).toBe(2);
  expect(printedBefore([print(3)], 3)).toBeNull();
  expect(printedBefore([print(1)], null)).toBeNull();
});

it('makes files on the device that other programs read: DXF, SVG, CSV, the job file', () => {
  const files = planFiles({ ...job, settings: DEFAULT_SETTINGS, jobName: 'Alder', number: '0142', prices: false });
  const text = (end: string) => files.find((file) => file.name.endsWith(end))!.write();
  expect(new DxfParser().parseSync(text('tops.dxf'))!.entities.length).toBeGreaterThan(job.plan.pieces.length);
  expect(text('pieces.svg')).toMatch(/^<\?xml|^<svg/);
  const rows = text('pieces.csv').trim().split('\r\n');
  expect(rows).toHaveLength(job.plan.pieces.length + 1);
  expect(JSON.parse(text('job.json'))).toMatchObject({ format: 'offsquare-job' });
});
