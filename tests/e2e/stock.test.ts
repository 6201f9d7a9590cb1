import type { Browser } from 'playwright-core';

import { openBrowserApp, openSignedIn, PHONE, WIDE, type BrowserApp } from '@/tests/helpers/browser-app';
import { launchChromium } from '@/tests/helpers/chromium';

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

const CSV = [
  'code,species,thickness,length,depth,price',
  'W84,white oak,1 1/2,84,25,410',
  'W96,white oak,1 1/2,-96,25,460',
  'W120,white oak,1 1/2,"10\' 0""",25,-1',
].join('\n');

describe('the stock', () => {
  it('takes a slab typed by the owner, keeps what is wrong beside its sentence, and undoes taking one out', async () => {
    const page = await openSignedIn(browser, app, '/stock', WIDE);
    await page.getByRole('button', { name: 'New slab' }).click();
    const dialog = page.getByRole('dialog', { name: 'New slab' });
    await dialog.getByLabel('Name').fill('M70');
    await dialog.getByLabel('Thickness').fill('1 1/2');
    await dialog.getByLabel('Length, along the grain').fill("5' 10");
    await dialog.getByLabel('Depth', { exact: true }).fill('25');
    await dialog.getByLabel('Price each').fill('-280');
    await dialog.getByRole('button', { name: 'Save' }).click();
    await dialog.getByText('-280 is negative. A price is never under zero.').waitFor();
    await dialog.getByLabel('Price each').fill('280');
    await dialog.getByRole('button', { name: 'Save' }).click();
    await page.getByText('M70 is stored').waitFor();
    await page.reload();
    await page.getByRole('row', { name: /^M70, 25 × 70 in/ }).click();
    await page.getByRole('dialog', { name: 'Slab M70' }).getByRole('button', { name: 'Take it out' }).click();
    await page.getByRole('row', { name: /^M70/ }).waitFor({ state: 'detached' });
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByRole('row', { name: /^M70/ }).waitFor();
  });

  it('shows a file before it stores anything, names its bad lines, and takes the import back', async () => {
    const page = await openSignedIn(browser, app, '/stock', PHONE);
    await page.getByRole('button', { name: 'From a file' }).click();
    await page
      .getByLabel('CSV file of slabs')
      .setInputFiles({ name: 'oak.csv', mimeType: 'text/csv', buffer: Buffer.from(CSV) });
    await page.getByText('oak.csv: 1 can be taken, 2 cannot. Nothing is stored yet.').waitFor();
    await page.getByText(/^length: .*negative/).waitFor();
    await page.getByText('price: -1 is negative. A price is never under zero.').waitFor();
    await page.getByRole('button', { name: 'Take 1 slab' }).click();
    await page.getByRole('button', { name: /^W84, 25 × 84 in/ }).waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByRole('button', { name: /^W84, 25/ }).waitFor({ state: 'detached' });
    expect(await page.evaluate(() => document.documentElement.scrollWidth <= window.innerWidth)).toBe(true);
  });

  it('shows a shop hand no price and nothing to change, and an installer nothing', async () => {
    const hand = await openSignedIn(browser, app, '/stock', PHONE, 'shop_hand');
    await hand.getByText('Only the owner changes these.').waitFor();
    expect(await hand.getByText('$').count()).toBe(0);
    expect(await hand.getByRole('button', { name: 'New slab' }).count()).toBe(0);
    const installer = await openSignedIn(
      browser,
      app,
      '/stock',
      { viewport: { width: 320, height: 700 } },
      'installer',
    );
    await installer.getByText('Owner, designer and shop hand see the stock.').waitFor();
  });
});
