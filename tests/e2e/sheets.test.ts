import { readFileSync } from 'node:fs';

import AdmZip from 'adm-zip';
import DxfParser from 'dxf-parser';
import type { Browser, Download, Page } from 'playwright-core';

import { QUAY_STREET_SCULLERY } from '@/shared/layout/demo/quay-street-scullery';
import { importJob, openBrowserApp, openSignedIn, PHONE, WIDE, type BrowserApp } from '@/tests/helpers/browser-app';
import { launchChromium } from '@/tests/helpers/chromium';

import { poppler } from '../server/sheets/pdf-reading';

let app: BrowserApp;
let browser: Browser;

beforeAll(async () => {
  app = await openBrowserApp();
  browser = await launchChromium();
});

afterAll(async () => {
  await browser.close();
  await app.close();
});

async function fileOf(page: Page, press: () => Promise<void>): Promise<Buffer> {
  const [download] = await Promise.all([page.waitForEvent('download'), press()]);
  return readFileSync((await (download as Download).path())!);
}

const pagesOf = (pdf: Buffer) => Number(/Pages:\s+(\d+)/.exec(poppler('pdfinfo', [], pdf, false))![1]);

describe('the sheets on a wide screen', () => {
  it('show every kind, leave pages out, and come as PDF, DXF and one archive', async () => {
    const id = await importJob(app, QUAY_STREET_SCULLERY);
    const page = await openSignedIn(browser, app, `/jobs/${id}/sheets`, { ...WIDE, acceptDownloads: true });
    await page.getByRole('button', { name: /^Cut sheet 1,/ }).waitFor();
    for (const name of [
      'Joint sheet',
      'Fit sheet',
      'Order sheet',
      'Finish sheet',
      'Template',
      'Label',
      'Customer page',
    ])
      await page.getByRole('button', { name: new RegExp(`^${name},`) }).waitFor();
    await page.getByRole('button', { name: /^Fit sheet,/ }).click();
    await page.getByRole('checkbox', { name: 'Page 1 of 2' }).click();
    const one = await fileOf(page, () => page.getByRole('button', { name: 'Download' }).click());
    expect(pagesOf(one)).toBe(1);
    expect(poppler('pdftotext', ['-layout'], one)).toContain('Fit sheet, continued');

    await page.getByRole('button', { name: /^Label,/ }).click();
    await page.getByLabel('Labels in the printer').selectOption({ label: 'Single, 4 × 2 in' });
    const labels = await fileOf(page, () => page.getByRole('button', { name: 'Download' }).click());
    expect(poppler('pdfinfo', [], labels, false)).toMatch(/Page size:\s+288 x 144 pts/);

    await page.getByRole('button', { name: 'Send and export' }).click();
    const dxf = await fileOf(page, () => page.getByRole('menuitem', { name: 'Tops, DXF' }).click());
    expect(new DxfParser().parseSync(dxf.toString())!.entities.length).toBeGreaterThan(4);
    await page.getByRole('button', { name: 'Send and export' }).click();
    const zip = await fileOf(page, () => page.getByRole('menuitem', { name: 'Everything in one archive' }).click());
    expect(new AdmZip(zip).getEntries().map((entry) => entry.entryName)).toContain('joint.pdf');
  });

  it('warn that an older revision was printed, and are mailed to somebody of the crew', async () => {
    const id = await importJob(app, QUAY_STREET_SCULLERY);
    const page = await openSignedIn(browser, app, `/jobs/${id}/sheets`, { ...WIDE, acceptDownloads: true });
    await page.getByRole('button', { name: /^Cut sheet 1,/ }).waitFor();
    await page.getByRole('button', { name: 'Freeze revision 1' }).click();
    await page.getByText('Revision 1 is frozen.').waitFor();
    await fileOf(page, () => page.getByRole('button', { name: 'Download', exact: true }).click());
    await page.getByRole('radio', { name: 'Draft' }).click();
    await page.getByRole('button', { name: 'Freeze revision 2' }).click();
    await page.getByText('Revision 2 is frozen.').waitFor();
    await page.getByText('Revision 1 was printed.').waitFor();

    await page.getByRole('button', { name: 'Send and export' }).click();
    await page.getByRole('menuitem', { name: 'Mail to somebody of the crew' }).click();
    await page.getByRole('button', { name: 'Send', exact: true }).click();
    await page.getByText('Choose who gets it.').waitFor();
    await page.getByLabel('To', { exact: true }).selectOption({ label: app.shop.people.shop_hand.name });
    await page.getByRole('button', { name: 'Send', exact: true }).click();
    await page.getByText(`A mail is on its way to ${app.shop.people.shop_hand.name}`).waitFor();
    expect(await app.db('outbox').where({ kind: 'sheets' })).toHaveLength(1);
  });
});

describe('the sheets on a phone', () => {
  it('stay within the screen and say what to do while there is nothing to print', async () => {
    const id = await importJob(app, QUAY_STREET_SCULLERY);
    const page = await openSignedIn(browser, app, `/jobs/${id}/sheets`, PHONE);
    await page.getByRole('button', { name: /^Print all \d+ pages/ }).waitFor();
    expect(await page.evaluate(() => document.documentElement.scrollWidth <= window.innerWidth)).toBe(true);
    const empty = await importJob(app, { ...QUAY_STREET_SCULLERY, runs: [], cutouts: [], joints: [], seams: [] });
    await page.goto(`${app.address}/jobs/${empty}/sheets`);
    await page.getByText('Nothing to print yet').waitFor();
  });
});

describe('a job file', () => {
  it('is drawn and counted before it is opened, and refused with the place that is wrong', async () => {
    const page = await openSignedIn(browser, app, '/jobs', WIDE);
    const choose = async (name: string, file: unknown) =>
      page
        .getByLabel('Job file', { exact: true })
        .setInputFiles({ name, mimeType: 'application/json', buffer: Buffer.from(JSON.stringify(file)) });
    await page.getByRole('button', { name: 'New job' }).first().click();
    await page.getByRole('button', { name: 'From a job file' }).click();
    await choose('bad.json', { ...QUAY_STREET_SCULLERY, runs: [{ id: '1', wall: 'Q', left: { kind: 'open' }, right: { kind: 'open' } }], cutouts: [], joints: [], seams: [] }); // prettier-ignore
    await page.getByText('bad.json cannot be opened. Nothing was stored.').waitFor();
    await page.getByText('runs[0].wall: There is no wall "Q" in this room.').waitFor();
    await choose('scullery.json', { ...QUAY_STREET_SCULLERY, name: 'Scullery from a file' });
    await page.getByText('Scullery from a file').waitFor();
    await page.getByText('3 walls, 3 runs, 0 islands, 1 cutout, 4 pieces').waitFor();
    await page.getByRole('button', { name: 'Open as a new job' }).click();
    await page.waitForURL(/\/tops$/);
    await page
      .getByRole('button', { name: /^Piece P,/ })
      .first()
      .waitFor();
  });
});
