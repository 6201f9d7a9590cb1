import type { Browser, Locator, Page } from 'playwright-core';

import { openBrowserApp, signIn, type BrowserApp } from '@/tests/helpers/browser-app';
import { launchChromium } from '@/tests/helpers/chromium';
import type { Role } from '@/shared/roles/roles';

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

const PHONE = {
  viewport: { width: 390, height: 844 },
  hasTouch: true,
  isMobile: true,
  serviceWorkers: 'block',
} as const;

async function phoneOf(role: Role): Promise<Page> {
  const context = await browser.newContext(PHONE);
  const page = await context.newPage();
  await signIn(page, app, role);
  return page;
}

const SIXTEENTHS = ['no fraction', '1 sixteenth', '1 eighth', '3 sixteenths', '1 quarter', '5 sixteenths', '3 eighths', '7 sixteenths', '1 half', '9 sixteenths', '5 eighths', '11 sixteenths', '3 quarters', '13 sixteenths', '7 eighths', '15 sixteenths']; // prettier-ignore

/** A hand on a phone: every tap is counted. */
class Hand {
  taps = 0;
  constructor(readonly page: Page) {}

  async tap(what: Locator): Promise<void> {
    this.taps++;
    await what.tap();
  }

  /** Types a length on the pad, inches and sixteenths, and Next. */
  async read(whole: number, sixteenths = 0): Promise<void> {
    for (const digit of String(whole)) await this.tap(this.page.getByRole('button', { name: digit, exact: true }));
    if (sixteenths > 0)
      await this.tap(this.page.getByRole('button', { name: `${SIXTEENTHS[sixteenths]} of an inch`, exact: true }));
    await this.tap(this.page.getByRole('button', { name: /^Next:/ }));
  }

  pad = (title: string) => this.page.getByRole('group', { name: `Length of ${title}`, exact: true }).waitFor();
}

async function newRoom(page: Page, name: string): Promise<void> {
  await page.getByRole('button', { name: /New job/ }).first().click(); // prettier-ignore
  await page.getByLabel('Name of the job').fill(name);
  await page.getByRole('button', { name: 'Start measuring' }).click();
  await page.getByTestId('shape-U').waitFor();
}

const report = (page: Page) => page.getByTestId('fit-report');

describe('the tape walk on a phone', () => {
  it('enters a U with two triangles and two ties in 32 taps, and says that it closes', async () => {
    const page = await phoneOf('installer');
    await newRoom(page, 'Scullery on Capstan Row');
    const hand = new Hand(page);

    await hand.tap(page.getByTestId('shape-U'));
    await hand.pad('Wall A');
    await hand.read(98, 4);
    await hand.pad('Mark to mark');
    await hand.read(60, 8);
    await hand.pad('Wall B');
    await hand.read(148, 7);
    await hand.pad('Mark to mark');
    await hand.read(59, 4);
    await hand.pad('Wall C');
    await hand.read(86, 1);
    await hand.pad('Cross A left end to C right end');
    await hand.read(148, 9);
    await hand.pad('Cross A-B to C right end');
    await hand.read(169, 11);

    await report(page).getByText('7 readings, 2 spare. You can lay tops.').waitFor();
    expect(hand.taps).toBeLessThan(60);
    expect(hand.taps).toBe(32);
    await page.context().close();
  });

  it('names the wall that slipped, takes a second tape, and is right once the first is taken away', async () => {
    const page = await phoneOf('installer');
    await newRoom(page, 'Galley on Hawser Lane');
    const hand = new Hand(page);
    await hand.tap(page.getByTestId('shape-U'));
    await hand.read(98, 4);
    await hand.read(60, 8);
    await hand.read(149, 7);
    await hand.read(59, 4);
    await hand.read(86, 1);
    await hand.read(148, 9);
    await hand.read(169, 11);
    await page.getByRole('button', { name: 'Tape this cross' }).tap();
    await hand.read(179, 8);

    await page.getByRole('heading', { name: 'Re-take wall B' }).waitFor();
    await page.getByRole('button', { name: 'Tape wall B again' }).tap();
    await hand.read(148, 7);
    await page.getByRole('button', { name: 'Take 149 7/16 away' }).tap();
    await report(page).getByText('8 readings, 3 spare. You can lay tops.').waitFor();
    await page.context().close();
  });

  it('keeps what was typed beside a sentence when it cannot be', async () => {
    const page = await phoneOf('installer');
    await newRoom(page, 'Larder on Fender Steps');
    const hand = new Hand(page);
    await hand.tap(page.getByTestId('shape-U'));
    await hand.read(0);
    await page.getByText('A length of nothing is no reading. Tape it again.').waitFor();
    await page.getByRole('button', { name: 'Take back' }).tap();
    await hand.read(98);
    await hand.pad('Mark to mark');
    await hand.read(99);
    await page.getByText(/The marks are at most 84 in apart, so the tape cannot read 99 in/).waitFor();
    await page
      .getByRole('group', { name: 'Length of Mark to mark' })
      .getByText('99', { exact: true })
      .first()
      .waitFor();
    await page.context().close();
  });
});

describe('a shop hand', () => {
  it('looks at the room and has nothing to type with', async () => {
    const page = await phoneOf('shop_hand');
    await page.getByText('Scullery on Capstan Row').first().tap();
    await page.waitForURL(/\/jobs\/[^/]+/);
    if (!page.url().endsWith('/room')) await page.goto(page.url().replace(/(\/jobs\/[^/]+).*/, '$1/room'));
    await page.getByText('You may look at the room, not change it.').waitFor();
    await page.getByTestId('reading-wall B').getByRole('button').tap();
    await page.getByRole('heading', { name: 'Wall B' }).waitFor();
    expect(await page.getByRole('button', { name: /Tape it again|Take away/ }).count()).toBe(0);
    await page.context().close();
  });
});

describe('readings that contradict each other', () => {
  it('are kept when they are given twice; the drawing stays, and the report names the corner', async () => {
    const page = await phoneOf('installer');
    await newRoom(page, 'Wash house on Anchor Row');
    const hand = new Hand(page);
    await hand.tap(page.getByTestId('shape-U'));
    await hand.read(98);
    await hand.pad('Mark to mark');
    await hand.read(99);
    await page.getByText(/Press Next once more to keep it as it is/).waitFor();
    await hand.tap(page.getByRole('button', { name: /^Next:/ }));
    for (const [title, reading] of [
      ['Wall B', 148],
      ['Mark to mark', 60],
      ['Wall C', 86],
    ] as const) {
      await hand.pad(title);
      await hand.read(reading);
    }
    await page.getByRole('heading', { name: 'These readings do not fit together' }).waitFor();
    await report(page)
      .getByText(/corner A-B/i)
      .waitFor();
    const plan = page.getByRole('group', { name: 'Plan of the room' });
    await plan.getByRole('button', { name: 'Wall B, 148 inches' }).waitFor();
    await page.context().close();
  });
});
