import { execFile, execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';

import type { Browser, BrowserContext, Page } from 'playwright-core';

import { formatLength } from '@/geometry/tape/format-length';
import type { PlanOutput } from '@/shared/layout/plan-output';
import { openBrowserApp, signIn, type BrowserApp } from '@/tests/helpers/browser-app';
import { launchChromium } from '@/tests/helpers/chromium';
import { typeLength, type Taps } from '@/tests/helpers/tape-pad';
import { TEST_PASSWORD } from '@/tests/helpers/test-server';
import { makeU, type TapedU } from '@/tests/helpers/u-room';

const run = promisify(execFile);

let app: BrowserApp;
let browser: Browser;
let context: BrowserContext;
let page: Page;
let folder: string;

beforeAll(async () => {
  folder = mkdtempSync(path.join(os.tmpdir(), 'offsquare-way-'));
  app = await openBrowserApp();
  browser = await launchChromium();
  context = await browser.newContext({
    viewport: { width: 390, height: 844 },
    isMobile: true,
    hasTouch: true,
    acceptDownloads: true,
    serviceWorkers: 'block',
  });
  page = await context.newPage();
  page.setDefaultTimeout(30_000);
});

afterAll(async () => {
  if (process.env.WHOLE_WAY_KEEP) execFileSync('cp', ['-r', folder, process.env.WHOLE_WAY_KEEP]);
  await browser.close();
  await app.close();
  rmSync(folder, { recursive: true });
});

/** The job file as the API exports it, fetched with a sign-in of its own. */
async function jobFile(jobId: string): Promise<unknown> {
  const api = `${app.address}/api/v1`;
  const signed = await fetch(`${api}/auth/sign-in`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: app.shop.people.owner.email, password: TEST_PASSWORD }),
  });
  const { accessToken } = (await signed.json()) as { accessToken: string };
  const file = await fetch(`${api}/jobs/${jobId}/file`, { headers: { authorization: `Bearer ${accessToken}` } });
  expect(file.status).toBe(200);
  return file.json();
}

const pdfText = (file: string): string[] =>
  execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8' }).split('\f').slice(0, -1);

/**
 * Every number a page gives to the saw, sorted: marks, angles, sizes, cut numbers. The foot, which names job, revision and
 * day, stays out; how a page's lines are cut up depends on the names in them.
 */
const sawNumbers = (text: string): string[] =>
  (text.split(/^\s*Job\s+Revision/m)[0]!.match(/\d+ \d+\/\d+|\d+\/\d+|\d+(\.\d+)?/g) ?? []).sort();

const ENDS: Readonly<Record<string, number>> = { 'A left end': 0, 'A-B': 1, 'B-C': 2, 'C right end': 3 };

/** Tapes the cross that the report asks for next. */
async function tapeCross(room: TapedU, taps: Taps): Promise<void> {
  const heading = page.getByRole('heading', { name: /^Cross / });
  const asked = page.locator('[data-testid^="reading-new tie"]').getByRole('button');
  await asked.or(heading).first().waitFor();
  if ((await heading.count()) === 0) {
    taps.count++;
    await asked.tap();
  }
  const [, from, to] = /^Cross (.+) to (.+)$/.exec((await heading.first().innerText()).trim())!;
  await typeLength(page, room.tie(ENDS[from!]!, ENDS[to!]!), taps);
}

/** Touches the drawing where its list twin says that something lies. */
async function tapDrawing(name: RegExp): Promise<void> {
  const box = (await page.getByRole('button', { name }).first().boundingBox())!;
  await page.touchscreen.tap(box.x + box.width / 2, box.y + box.height / 2);
}

/** Taps a button that leads to another page. */
async function tapTo(name: RegExp, address: RegExp): Promise<void> {
  await page.getByRole('button', { name }).tap();
  await page.waitForURL(address);
}

it('goes from tape readings to a cut sheet on a phone, and the sheet says what the plan command says', async () => {
  const seed = Number(process.env.WHOLE_WAY_SEED ?? Date.now() % 2147483647);
  console.log(`room of this run: WHOLE_WAY_SEED=${seed}`);
  let state = seed;
  // Park and Miller's minimal standard generator: the room is new in every run and can be had again.
  const room = makeU(() => (state = (state * 48271) % 2147483647) / 2147483647);
  const taps: Taps = { count: 0 };

  await signIn(page, app, 'owner');
  await page.getByRole('button', { name: 'New job' }).first().tap();
  await page.getByLabel('Name of the job').fill('Made-up scullery');
  await page.getByRole('button', { name: 'Start measuring' }).tap();
  await page.getByTestId('shape-U').tap();

  // The walk: wall A, corner A-B, wall B, corner B-C, wall C, then the crosses it asks for.
  await typeLength(page, room.walls[0], taps);
  await typeLength(page, room.triangles[0], taps);
  await typeLength(page, room.walls[1], taps);
  await typeLength(page, room.triangles[1], taps);
  await typeLength(page, room.walls[2], taps);
  for (let cross = 0; cross < 2; cross++) await tapeCross(room, taps);
  await page.keyboard.press('Escape');
  await page.getByText(/Closes within/).waitFor();
  expect(taps.count).toBeLessThan(60);

  // A sink base in the middle of wall B.
  await tapDrawing(/^Wall B, /);
  await page.getByRole('button', { name: 'Add sink base' }).tap();
  const middle = taped16(room.walls[1] / 2 - 18);
  await page.getByLabel('From the left end').fill(formatLength(middle, '1/16'));
  await page.getByLabel('From the left end').press('Enter');
  await page.getByRole('button', { name: 'Back to the report' }).tap();

  // Every wall carries tops once cabinets stand on all of them.
  for (const wall of ['A', 'C'] as const) {
    await tapDrawing(new RegExp(`^Wall ${wall}, `));
    await page.getByRole('button', { name: 'Add cabinet' }).tap();
    await page.getByRole('button', { name: 'Back to the report' }).tap();
  }
  await tapTo(/^(Lay|To) the tops$/, /\/tops$/);
  await page.getByRole('tab', { name: /Pieces/ }).tap();
  await page
    .getByRole('button', { name: /^Piece S/ })
    .first()
    .waitFor();

  await page.getByRole('button', { name: 'To the slabs' }).tap();
  await page.getByTestId('plan-summary').waitFor();
  await page.getByText('Trying plans').waitFor({ state: 'detached' });
  await tapTo(/^Make the sheets$/, /\/sheets$/);
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'All cut sheets' }).tap(),
  ]);
  const fromApp = path.join(folder, 'app.pdf');
  await download.saveAs(fromApp);

  const jobId = /jobs\/([0-9a-f-]+)\//.exec(page.url())![1]!;
  const file = path.join(folder, 'job.json');
  writeFileSync(file, JSON.stringify(await jobFile(jobId)));
  const sheets = path.join(folder, 'sheets');
  const { stdout } = await run('npm', ['run', '-s', 'plan', '--', file, '--sheets', sheets]);
  const plan = JSON.parse(stdout) as PlanOutput & { sheets: string[] };

  // The solved room is the room that was made up, within what a tape can tell.
  expect(plan.room!.corners[0]!.angle).toBeCloseTo(room.angles[0], 0);
  expect(plan.room!.corners[1]!.angle).toBeCloseTo(room.angles[1], 0);
  expect(plan.joints).toHaveLength(2);
  expect(plan.seams).toHaveLength(1);
  expect(plan.seams[0]!.inCutout).not.toBeNull();
  expect(plan.findings.filter((finding) => finding.severity === 'stop')).toEqual([]);

  const appPages = pdfText(fromApp);
  expect(appPages).toHaveLength(plan.slabs.length);
  plan.slabs.forEach((slab, i) => {
    for (const cut of slab.cuts) {
      if (cut.kind !== 'crosscut' || cut.pieces.length === 0) continue;
      const marks = cut.kerfSide === 'right' ? [cut.front, cut.back] : [cut.frontFar, cut.backFar];
      for (const mark of marks) expect(squeezed(appPages[i]!)).toContain(formatLength(mark, '1/16'));
    }
  });
  const cutSheet = plan.sheets.find((file) => file.endsWith('-cut.pdf'))!;
  const numbers = appPages.map(sawNumbers);
  for (const page of numbers) expect(page.length).toBeGreaterThan(10);
  expect(pdfText(cutSheet).map(sawNumbers)).toEqual(numbers);
  expect(readFileSync(fromApp).subarray(0, 5).toString()).toBe('%PDF-');

  // The server works the plan out again by itself before it freezes what this browser found.
  await page.getByRole('button', { name: 'Freeze revision 1' }).tap();
  await page.getByRole('button', { name: 'Sign off revision 1' }).tap();
  await page.getByText('Revision 1, signed off by').first().waitFor();
  const [signed] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'All cut sheets' }).tap(),
  ]);
  const final = path.join(folder, 'signed.pdf');
  await signed.saveAs(final);
  const signedPages = pdfText(final);
  expect(signedPages.map(sawNumbers)).toEqual(numbers);
  expect(signedPages.join('')).not.toContain('DRAFT');
});

const taped16 = (inches: number): number => Math.round(inches * 16) / 16;
const squeezed = (text: string): string => text.replaceAll(/\s+/g, ' ');
