import type { Browser, BrowserContextOptions, Page } from 'playwright-core';

import type { Role } from '@/shared/roles/roles';
import { openBrowserApp, type BrowserApp } from '@/tests/helpers/browser-app';
import { launchChromium } from '@/tests/helpers/chromium';
import { TEST_PASSWORD } from '@/tests/helpers/test-server';

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

const PHONE: BrowserContextOptions = { viewport: { width: 390, height: 844 }, hasTouch: true };
const WIDE: BrowserContextOptions = { viewport: { width: 1440, height: 900 } };

async function newRoom(options: BrowserContextOptions, name: string, role: Role = 'installer'): Promise<Page> {
  const context = await browser.newContext({ serviceWorkers: 'block', ...options });
  const page = await context.newPage();
  await page.goto(`${app.address}/`);
  await page.getByLabel('Work e-mail').fill(app.shop.people[role].email);
  await page.getByLabel('Password').fill(TEST_PASSWORD);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await page.getByRole('button', { name: 'New job' }).first().click();
  await page.getByLabel('Name of the job').fill(name);
  await page.getByRole('button', { name: 'Start measuring' }).click();
  await page.getByTestId('shape-U').waitFor();
  return page;
}

/** Middle of something the list twin of the drawing names, px of the page. */
async function place(page: Page, name: RegExp): Promise<{ x: number; y: number }> {
  const box = (await page.getByRole('button', { name }).first().boundingBox())!;
  return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
}

async function drag(page: Page, from: { x: number; y: number }, by: { x: number; y: number }): Promise<void> {
  await page.mouse.move(from.x, from.y);
  await page.mouse.down();
  for (let i = 1; i <= 8; i++) await page.mouse.move(from.x + (by.x * i) / 8, from.y + (by.y * i) / 8);
  await page.mouse.up();
}

/** A U of 96, 120 and 96 in, typed on the wide screen's pad by keyboard. */
async function tapedU(page: Page): Promise<void> {
  await page.getByTestId('shape-U').click();
  const pad = page.getByRole('group', { name: /^Length of / });
  for (const reading of ['96', '60', '120', '60', '96']) {
    await pad.waitFor();
    const title = await pad.getAttribute('aria-label');
    await page.keyboard.type(reading);
    await page.keyboard.press('Enter');
    // A slow machine shows the pad it had for a moment longer: the next one has another title.
    await page.waitForFunction((was) => {
      const now = document.querySelector('[role="group"][aria-label^="Length of "]');
      return now !== null && now.getAttribute('aria-label') !== was;
    }, title);
  }
  await page.getByRole('group', { name: /^Length of Cross/ }).waitFor();
  await page.keyboard.press('Escape');
}

describe('drawing the walls', () => {
  it('makes a U of four taps on a phone, and goes on to tape wall A', async () => {
    const page = await newRoom(PHONE, 'Drawn by hand');
    await page.getByRole('button', { name: 'Draw it yourself' }).tap();
    for (const [x, y] of [[90, 420], [94, 160], [300, 164], [296, 420]] as const) await page.touchscreen.tap(x, y); // prettier-ignore
    await page.getByRole('button', { name: 'More for wall C' }).waitFor();
    expect(await page.getByRole('button', { name: /as drawn/ }).allTextContents()).toHaveLength(5);
    await page.getByRole('button', { name: 'Done drawing' }).tap();
    await page.getByRole('group', { name: 'Length of Wall A' }).waitFor();
    await page.getByRole('button', { name: 'Corner A-B, not checked' }).waitFor();
    await page.context().close();
  });

  it('splits a taped wall from the list, keeps its tape as a cross, and takes it back by undo', async () => {
    const page = await newRoom(WIDE, 'Split in two');
    await tapedU(page);
    await page.getByRole('button', { name: 'Draw', exact: true }).click();
    await page.getByRole('button', { name: 'More for wall B' }).click();
    await page.getByRole('menuitem', { name: 'Split in two' }).click();
    await page.getByRole('button', { name: 'More for wall D' }).waitFor();
    await page.getByRole('button', { name: 'Done drawing' }).click();
    await page.getByTestId('reading-tie t1').getByText('Cross A-B to C-D').waitFor();
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByTestId('reading-tie t1').waitFor({ state: 'detached' });
    await page.getByTestId('reading-wall B').getByText('taped once').waitFor();
    await page.context().close();
  });
});

describe('what stands along a wall', () => {
  it('is put there by a tap, dragged, refused with the number where it overlaps, and nudged by 1/16', async () => {
    const page = await newRoom(WIDE, 'Sink and range');
    await tapedU(page);
    const wall = await place(page, /^Wall B, 120 inches/);
    await page.getByRole('button', { name: 'Sink', exact: true }).click();
    await page.mouse.click(wall.x, wall.y);
    const sink = page.getByRole('button', { name: /^Sink base on wall B, 36 inches wide, at 42 inches/ });
    await sink.waitFor();

    await page.getByRole('button', { name: 'Gap', exact: true }).click();
    await page.mouse.click(wall.x - 300, wall.y);
    await page.getByRole('button', { name: /^Range on wall B, 30 inches wide, at 0 inches/ }).waitFor();
    const range = await place(page, /^Range on wall B/);
    const perInch = ((await place(page, /^Sink base on wall B/)).x - range.x) / 45;
    await drag(page, range, { x: 30 * perInch, y: 0 });
    await page.getByText('It overlaps the sink base at 42 in by 18 in.').waitFor();
    await page.getByRole('button', { name: /^Range on wall B, 30 inches wide, at 0 inches/ }).waitFor();

    await page.getByRole('button', { name: /^Sink base on wall B/ }).focus();
    await page.keyboard.press('ArrowRight');
    await page.getByRole('button', { name: /^Sink base on wall B, 36 inches wide, at 42 and 1 sixteenth/ }).waitFor();
    await page.context().close();
  });
});

describe('the keyboard', () => {
  it('walks the walls with Tab, opens the pad with a digit, lists the keys with ?', async () => {
    const page = await newRoom(WIDE, 'By keyboard');
    await tapedU(page);
    await page.getByRole('button', { name: /^Wall A, / }).first().focus(); // prettier-ignore
    const walked: string[] = [];
    for (let i = 0; i < 5; i++) {
      walked.push((await page.evaluate(() => document.activeElement?.getAttribute('aria-label'))) ?? '');
      await page.keyboard.press('Tab');
    }
    expect(walked.map((name) => name.split(',')[0])).toEqual([
      'Wall A',
      'Corner A-B',
      'Wall B',
      'Corner B-C',
      'Wall C',
    ]);
    await page.getByRole('button', { name: /^Wall B, / }).first().focus(); // prettier-ignore
    await page.keyboard.press('7');
    await page.getByRole('group', { name: 'Length of Wall B' }).waitFor();
    await page.keyboard.press('Escape');
    await page.keyboard.press('?');
    await page.getByRole('dialog', { name: 'Keys' }).getByText('walk the walls, corners and crosses').waitFor();
    await page.context().close();
  });
});

describe('no signal', () => {
  it('keeps a reading on the phone, says how many wait, and sends them later', async () => {
    const page = await newRoom(PHONE, 'In the cellar');
    await page.context().setOffline(true);
    await page.getByTestId('shape-U').tap();
    await page.getByRole('button', { name: '9', exact: true }).tap();
    await page.getByRole('button', { name: '6', exact: true }).tap();
    await page.getByRole('button', { name: /^Next:/ }).tap();
    await page.getByText('Saved here, 2 to send').waitFor();
    await page.context().setOffline(false);
    await page.getByText('Saved here, 2 to send').waitFor({ state: 'detached' });
    await page.context().close();
  });
});
