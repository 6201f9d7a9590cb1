import type { Browser, BrowserContextOptions, Locator, Page } from 'playwright-core';

import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { distance } from '@/geometry/core/vector';
import { layRoom } from '@/geometry/plan/lay-room';
import { spokenLength } from '@/geometry/tape/format-length';
import { parseJobFile } from '@/shared/layout/parse-job-file';
import { QUAY_STREET_SCULLERY } from '@/shared/layout/demo/quay-street-scullery';
import { importJob, openBrowserApp, openSignedIn, PHONE, WIDE, type BrowserApp } from '@/tests/helpers/browser-app';
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

/** The tops of a U whose long run has its seam in the sink, fresh for each test. */
async function openTops(options: BrowserContextOptions): Promise<Page> {
  const id = await importJob(app, QUAY_STREET_SCULLERY);
  const page = await openSignedIn(browser, app, `/jobs/${id}/tops`, options);
  await twin(page, /^Piece P,/).waitFor();
  return page;
}

/** What the list beside the drawing calls something on it. */
const twin = (page: Page, name: RegExp): Locator => page.getByRole('button', { name }).first();

const middle = async (place: Locator) => {
  const box = (await place.boundingBox())!;
  return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
};

/** px that an inch takes on the drawing: the middles of two miters are as far apart as the plan has them. */
async function pxPerInch(page: Page): Promise<number> {
  const px = [await middle(twin(page, /^Miter P to Q/)), await middle(twin(page, /^Miter R to S/))] as const;
  const parsed = parseJobFile(QUAY_STREET_SCULLERY);
  if (!parsed.ok) throw new Error(parsed.errors[0]!.message);
  const { joints } = layRoom(parsed.layout, DEFAULT_SETTINGS).tops;
  const [a, b] = joints.map(({ from, to }) => [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2] as const);
  return Math.hypot(px[1].x - px[0].x, px[1].y - px[0].y) / distance(a!, b!);
}

const saved = (page: Page) => page.getByText('Saved', { exact: true }).waitFor();

describe('tops on a wide screen, by mouse and keyboard', () => {
  it('change the joint of a corner, say what it cuts, and take it back by undo', async () => {
    const page = await openTops(WIDE);
    await twin(page, /^Miter P to Q/).focus();
    await page.keyboard.press('Enter');
    await page.getByText(/^Corner 91\.04 degrees, cut at 45\.52 and 45\.52/).waitFor();
    await page.getByRole('radio', { name: 'Butt, B through' }).click();
    await twin(page, /^Butt joint P to Q, 25/).waitFor();
    await page.keyboard.press('Control+z');
    await twin(page, /^Miter P to Q/).waitFor();
    await page.keyboard.press('Shift+Control+z');
    await twin(page, /^Butt joint P to Q/).waitFor();
    await saved(page);
    await page.reload();
    await twin(page, /^Butt joint P to Q/).waitFor();
  });

  it('slide the seam with its handle, live, and come to rest at the middle of the sink', async () => {
    const page = await openTops(WIDE);
    const visible = page.getByText('visible seam Q to R').first();
    await visible.waitFor();
    await twin(page, /^Seam Q to R, 8 inches visible/).waitFor();
    const from = await middle(twin(page, /^Seam Q to R/));
    const scale = await pxPerInch(page);
    // The handle stands 52 px before the seam's front end, which is 12 1/2 in from its middle.
    const handle = { x: from.x, y: from.y + 12.5 * scale + 52 };
    await page.mouse.move(handle.x, handle.y);
    await page.mouse.down();
    await page.mouse.move(handle.x + 22 * scale, handle.y, { steps: 12 });
    // Past the side of the sink all of the seam shows.
    await twin(page, /^Seam Q to R, 25 inches visible/).waitFor();
    await page.mouse.move(handle.x + 0.4 * scale, handle.y, { steps: 12 });
    await page.mouse.up();
    await twin(page, /^Seam Q to R, 8 inches visible/).waitFor();
    await page.getByRole('button', { name: 'One sixteenth to the right' }).click();
    await page.getByRole('button', { name: 'Sink centre', pressed: false }).click();
    await page.getByRole('button', { name: 'Sink centre', pressed: true }).waitFor();
  });

  it('take a depth typed on the drawing, and keep what cannot be beside the sentence that says why', async () => {
    const page = await openTops(WIDE);
    await page.getByRole('tab', { name: /^Tops/ }).click();
    await page
      .getByRole('button', { name: /^Run on wall A/ })
      .last()
      .click();
    await page.getByRole('button', { name: /^Run on wall A, depth, 25 inches/ }).click();
    await page.keyboard.type('0');
    await page.keyboard.press('Enter');
    await page.getByText('A top’s depth has to be more than nothing.').waitFor();
    await page.keyboard.press('Backspace');
    await page.keyboard.type('22 1/2');
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: /^Run on wall A, depth, 22 and 1 half inches/ }).waitFor();
    // The corner is 91.0404 degrees; f is the angle of the joint to the back of the shallower run, J its length.
    const t = (91.0404 * Math.PI) / 180;
    const f = Math.atan2(22.5 * Math.sin(t), 25 + 22.5 * Math.cos(t));
    await twin(page, new RegExp(`^Miter P to Q, ${spokenLength(22.5 / Math.sin(f), '1/16')}`)).waitFor();
  });

  it('zoom to a finding, accept it with a reason, and keep who and why', async () => {
    const page = await openTops(WIDE);
    const before = await pxPerInch(page);
    await page.getByText(/^Joint P to Q opens up to/).first().click(); // prettier-ignore
    await page.waitForTimeout(300);
    expect(await pxPerInch(page)).toBeGreaterThan(before * 1.2);
    await page.getByRole('button', { name: /^Accept: Joint P to Q/ }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByRole('button', { name: 'Accept', exact: true }).click();
    await dialog.getByText('Say why, so that whoever cuts it can follow.').waitFor();
    await dialog.getByLabel('Reason').fill('Edge-grain staves are ordered');
    await dialog.getByRole('button', { name: 'Accept', exact: true }).click();
    await page.getByText(/Edge-grain staves are ordered/).waitFor();
    await saved(page);
    await page.reload();
    await page.getByText(/Edge-grain staves are ordered/).waitFor();
  });

  it('hide what a layer holds, show the picture, and compare with what was before', async () => {
    const page = await openTops(WIDE);
    await page.getByRole('button', { name: 'Layers' }).click();
    await page.getByRole('menuitem', { name: 'Show hardware' }).or(page.getByRole('menuitem', { name: 'Hide hardware' })).click(); // prettier-ignore
    await page.getByRole('button', { name: 'Picture of the finished tops' }).click();
    await page.getByRole('button', { name: 'Back to the plan' }).click();
    await twin(page, /^Miter P to Q/).focus();
    await page.keyboard.press('Enter');
    await page.getByRole('radio', { name: 'Butt, A through' }).click();
    await page.getByRole('button', { name: 'Compare before and after' }).click();
    await page.getByRole('list', { name: 'Pieces that differ' }).waitFor();
    const hold = await middle(page.getByRole('button', { name: 'Hold to see it' }));
    await page.mouse.move(hold.x, hold.y);
    await page.mouse.down();
    await twin(page, /^Miter P to Q/).waitFor();
    await page.mouse.up();
    await twin(page, /^Butt joint P to Q/).waitFor();
  });
});

describe('tops on a phone, by touch', () => {
  it('choose an end on the drawing and make it open with a typed overhang', async () => {
    const page = await openTops(PHONE);
    const end = await middle(twin(page, /^Left end of Run on wall A/));
    await page.touchscreen.tap(end.x, end.y);
    await page.getByRole('radio', { name: 'Open', exact: true }).tap();
    await page
      .getByRole('button', { name: /^Left end, overhang/ })
      .first()
      .tap();
    await page.getByRole('button', { name: '2', exact: true }).tap();
    await page.getByRole('button', { name: /^Next: Done/ }).tap();
    await page
      .getByRole('button', { name: /^Left end, overhang, 2 inches/ })
      .first()
      .waitFor();
  });

  it('drag the sink along its base: strips and seam follow while the finger moves', async () => {
    const page = await openTops(PHONE);
    const sink = await middle(twin(page, /^Sink/));
    const letters = async () => (await twin(page, /^Seam Q to R/).getAttribute('aria-label'))!;
    expect(await letters()).toContain('8 inches visible');
    const scale = await pxPerInch(page);
    const session = await page.context().newCDPSession(page);
    const at = await middle(twin(page, /^Sink/));
    const touch = (type: 'touchStart' | 'touchMove' | 'touchEnd', dx: number) =>
      session.send('Input.dispatchTouchEvent', {
        type,
        touchPoints: type === 'touchEnd' ? [] : [{ x: at.x + dx - 11 * scale, y: at.y }],
      });
    await touch('touchStart', 0);
    for (let i = 1; i <= 10; i++) await touch('touchMove', (i / 10) * 6 * scale);
    await touch('touchEnd', 0);
    expect((await middle(twin(page, /^Sink/))).x).toBeGreaterThan(sink.x);
    await page.getByRole('button', { name: /^Undo/ }).first().tap();
    await page.getByText(/^Undid sink/).waitFor();
  });

  it('add an island and a backsplash, and say what is wrong with a cutout off the top', async () => {
    const page = await openTops(PHONE);
    await page.getByRole('button', { name: 'Add a top' }).first().tap();
    await page.getByRole('button', { name: 'Add a rectangle' }).or(page.getByRole('button', { name: /rectangle/i })).first().tap(); // prettier-ignore
    await twin(page, /^Piece T, back 72 inches/).waitFor();
    await page.getByRole('button', { name: 'Cut sink' }).tap();
    await page
      .getByRole('button', { name: /from the front/i })
      .first()
      .tap();
    await page.getByRole('button', { name: '3', exact: true }).tap();
    await page.getByRole('button', { name: '0', exact: true }).tap();
    await page.getByRole('button', { name: /^Next: Done/ }).tap();
    await page
      .getByText(/the cutout would reach .* past its back edge\./)
      .first()
      .waitFor();
    expect(await page.evaluate(() => document.documentElement.scrollWidth <= window.innerWidth)).toBe(true);
  });
});
