import Drawing from 'dxf-writer';
import type { Browser, BrowserContextOptions, Locator, Page } from 'playwright-core';

import type { Layout } from '@/geometry/core/layout';
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

/** Opens one of the tops from their list. */
async function chooseTop(page: Page, name: RegExp): Promise<void> {
  await page.getByRole('tab', { name: /^Tops/ }).click();
  await page.getByRole('button', { name }).last().click();
}

/** A phone shows no word for it: waits until the server's own copy of the job has its seam pinned there. */
async function pinnedAt(page: Page, at: number): Promise<void> {
  const job = page.url().split('/jobs/')[1]!.split('/')[0]!;
  for (let i = 0; i < 100; i++) {
    const row = await app.db('layouts').where({ job_id: job }).first<{ doc: Layout }>('doc');
    if (row?.doc.seams[0]?.at === at) return;
    await page.waitForTimeout(100);
  }
  throw new Error(`the server has no seam pinned at ${at}`);
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

  it('say what cannot be laid, keep it as it was typed, and lay all the rest', async () => {
    const page = await openTops(WIDE);
    await chooseTop(page, /^Run on wall C/);
    // Past the end of its wall: refused where it is typed, and the pad keeps what was typed.
    await page.getByRole('button', { name: /^Run on wall C, ends at/ }).click();
    await page.keyboard.type('120');
    await page.keyboard.press('Enter');
    await page.getByText(/^Wall C is 86 1\/16 in long; the run would go 33 15\/16 in past its end\.$/).waitFor();
    await page.keyboard.press('Escape');
    await page.getByRole('button', { name: /^Run on wall C, ends at, 56 inches/ }).waitFor();
    // A joint with nothing to join.
    await twin(page, /^Left end of Run on wall A/).focus();
    await page.keyboard.press('Enter');
    await page.getByRole('radio', { name: 'Joint', exact: true }).click();
    const sentence = 'The run on wall A should end on a joint at its left, but no run joins it there.';
    await page.getByRole('button', { name: 'Back to the findings' }).click();
    await page.getByText(sentence, { exact: false }).first().waitFor();
    // A sink off the end of its top: drawn nowhere, kept in the list, named in a sentence.
    await twin(page, /^Sink/).focus();
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: /^Sink, centre, 75 inches/ }).click();
    await page.keyboard.type('3');
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: /^Sink, centre, 3 inches/ }).waitFor();
    await page.getByText('Sink reaches past the end of the run on wall B.').first().waitFor();
    expect(await page.getByRole('button', { name: /^Piece [PQRS],/ }).count()).toBeGreaterThanOrEqual(3);
    await saved(page);
    await page.reload();
    await page.getByText('Sink reaches past the end of the run on wall B.').first().waitFor();
    await page.getByText(sentence, { exact: false }).first().waitFor();
    // One step back for each change, in the order they were made.
    await chooseTop(page, /^Run on wall B/);
    await page.getByText(/centre at 3/).waitFor();
  });

  it('take a maker’s template over the typed size, typed and from a DXF file', async () => {
    const page = await openTops(WIDE);
    await twin(page, /^Sink/).focus();
    await page.keyboard.press('Enter');
    const field = page.getByLabel('Maker’s template', { exact: true });
    await field.fill('-14, 0\n14, 0\n14');
    await field.blur();
    await page.getByText('Line 3: give two lengths with a comma between them, such as 36 1/2, 0.').waitFor();
    expect(await field.inputValue()).toBe('-14, 0\n14, 0\n14');
    await field.fill('-14, 0\n14, 0\n14, 16\n-14, 16');
    await field.blur();
    await twin(page, /^Sink, 28 inches wide/).waitFor();
    const drawing = new Drawing();
    drawing.setUnits('Millimeters');
    drawing.drawPolyline([[0, 0], [812.8, 0], [812.8, 406.4], [0, 406.4]], true); // prettier-ignore
    await page.getByLabel('DXF file of the maker’s template').setInputFiles({
      name: 'sink.dxf',
      mimeType: 'application/dxf',
      buffer: Buffer.from(drawing.toDxfString()),
    });
    await twin(page, /^Sink, 32 inches wide/).waitFor();
    await page.getByRole('radio', { name: 'Apron front' }).click();
    await twin(page, /^Sink, 32 inches wide, strip in front 0 inches/).waitFor();
    await page.getByRole('button', { name: 'Do without' }).click();
    await twin(page, /^Sink, 30 inches wide/).waitFor();
  });

  it('turn an end into a waterfall: a leg of its own, in the picture too', async () => {
    const page = await openTops(WIDE);
    await twin(page, /^Left end of Run on wall A/).focus();
    await page.keyboard.press('Enter');
    await page.getByRole('radio', { name: 'Waterfall' }).click();
    await page.getByText(/^The leg is a piece of its own/).waitFor();
    // 34 1/2 in of cabinet and 1 1/2 in of top.
    await page.getByRole('button', { name: /, floor to show face, 36 inches/i }).waitFor();
    await twin(page, /^Piece [A-Z]+\d*, back 36 inches, front 36 inches/).waitFor();
    await page.getByRole('button', { name: 'Back to the findings' }).click();
    await page.getByRole('tab', { name: 'Pieces 5' }).waitFor();
    await page.getByRole('button', { name: 'Picture of the finished tops' }).click();
    await page.getByRole('img', { name: /5 pieces, one sink/ }).or(page.getByLabel(/5 pieces, one sink/)).first().waitFor(); // prettier-ignore
  });
});

describe('tops on a phone, by touch', () => {
  it('nudge a seam by touch, take it back, and find it pinned after a reload', async () => {
    const page = await openTops(PHONE);
    const seam = await middle(twin(page, /^Seam Q to R/));
    const scale = await pxPerInch(page);
    await page.touchscreen.tap(seam.x, seam.y + 12.5 * scale + 52);
    await page.getByRole('button', { name: 'One sixteenth to the right' }).tap();
    await page.getByRole('button', { name: 'One sixteenth to the right' }).tap();
    await page.getByRole('button', { name: /^Seam Q to R, from the left end of wall B, 75 and 1 eighth inches/ }).waitFor(); // prettier-ignore
    await page.getByRole('button', { name: /^Undo/ }).first().tap();
    await page.getByRole('button', { name: /75 and 1 sixteenth inches/ }).waitFor();
    await pinnedAt(page, 75 + 1 / 16);
    await page.reload();
    await twin(page, /^Seam Q to R/).waitFor();
    await page.touchscreen.tap(seam.x, seam.y + 12.5 * scale + 52);
    await page.getByRole('button', { name: /75 and 1 sixteenth inches/ }).waitFor();
  });

  it('cut a strip, type how many, and see it as one more piece', async () => {
    const page = await openTops(PHONE);
    await page.getByRole('button', { name: 'Add a top' }).first().tap();
    await page.getByRole('button', { name: 'Add a backsplash' }).tap();
    await twin(page, /^Piece T, /).waitFor();
    const count = page.getByLabel('How many');
    await count.fill('0');
    await count.blur();
    await page.getByText('Type a whole number from 1 to 200.').waitFor();
    expect(await count.inputValue()).toBe('0');
    await count.fill('2');
    await count.blur();
    await page.getByText('Type a whole number from 1 to 200.').waitFor({ state: 'detached' });
    expect(await page.evaluate(() => document.documentElement.scrollWidth <= window.innerWidth)).toBe(true);
  });
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
    const seam = await middle(twin(page, /^Seam Q to R/));
    await touch('touchStart', 0);
    for (let i = 1; i <= 10; i++) await touch('touchMove', (i / 10) * 6 * scale);
    // The finger is still down: sink and seam have come along, and as much of the seam shows as before.
    await page.waitForTimeout(300);
    expect(((await middle(twin(page, /^Seam Q to R/))).x - seam.x) / scale).toBeGreaterThan(5);
    expect(await letters()).toContain('8 inches visible');
    await touch('touchEnd', 0);
    const moved = ((await middle(twin(page, /^Sink/))).x - sink.x) / scale;
    expect(Math.abs(moved - 6)).toBeLessThan(0.6);
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
