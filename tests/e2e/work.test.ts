import type { Browser, BrowserContextOptions, Page } from 'playwright-core';

import { QUAY_STREET_SCULLERY } from '@/shared/layout/demo/quay-street-scullery';
import { importJob, openBrowserApp, openSignedIn, PHONE, WIDE, type BrowserApp } from '@/tests/helpers/browser-app';
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

async function openWork(options: BrowserContextOptions, part = 'Order of work', role: Role = 'owner'): Promise<Page> {
  const id = await importJob(app, QUAY_STREET_SCULLERY);
  const page = await openSignedIn(browser, app, `/jobs/${id}/work`, options, role);
  await page.getByRole('tab', { name: part }).click();
  return page;
}

const tick = (page: Page, step: string) => page.getByRole('button', { name: `Tick when done: ${step}` });
const done = (page: Page, step: string) => page.getByRole('button', { name: `Done: ${step}. Hold to undo` });
const kept = (page: Page) =>
  page.waitForResponse((answer) => answer.url().endsWith('/work') && answer.request().method() === 'POST');

async function hold(page: Page, step: string): Promise<void> {
  await done(page, step).click({ delay: 700 });
}

describe('the order of work', () => {
  it('is ticked on a phone by the shop hand, step after step, and says after a reload who did it', async () => {
    const page = await openWork(PHONE, 'Order of work', 'shop_hand');
    await page.getByText('0 of 19 steps done').waitFor();
    expect(await tick(page, 'Cut the pieces').count()).toBe(0);
    const box = await tick(page, 'Receive and check the slabs').boundingBox();
    expect(box!.height).toBeGreaterThanOrEqual(84);
    const [answer] = await Promise.all([kept(page), tick(page, 'Receive and check the slabs').tap()]);
    expect(answer.status()).toBe(200);
    await tick(page, 'Let the slabs settle in the shop').tap();
    // They settle for three days: cutting is not offered before.
    await page
      .getByText(/^Ready /)
      .first()
      .waitFor();
    await page.reload();
    await page.getByText('2 of 19 steps done').waitFor();
    await page
      .getByText(/^Done \d\d:\d\d by shop_hand$/)
      .first()
      .waitFor();
    // A shop hand ticks; the words are for others to change.
    await page.getByRole('button', { name: 'More for Let the slabs settle in the shop' }).tap();
    expect(await page.getByRole('menuitem').allTextContents()).toEqual(['Take the tick back']);
    await page.getByRole('menuitem', { name: 'Take the tick back' }).tap();
    await tick(page, 'Let the slabs settle in the shop').waitFor();
    await page.context().close();
  });

  it('takes a tick back when the done step is held', async () => {
    const page = await openWork(WIDE);
    await Promise.all([kept(page), tick(page, 'Receive and check the slabs').click()]);
    await done(page, 'Receive and check the slabs').click();
    await done(page, 'Receive and check the slabs').waitFor();
    await Promise.all([kept(page), hold(page, 'Receive and check the slabs')]);
    await tick(page, 'Receive and check the slabs').waitFor();
    await page.context().close();
  });

  it('is ticked without signal, and sends the tick when there is some', async () => {
    const page = await openWork(PHONE);
    await tick(page, 'Clear and level the cabinets').waitFor();
    await page.context().setOffline(true);
    await tick(page, 'Clear and level the cabinets').tap();
    await page.getByText(/^Ticked here, 1 to send/).waitFor();
    await page.getByText('1 of 19 steps done').waitFor();
    const [answer] = await Promise.all([kept(page), page.context().setOffline(false)]);
    expect(((await answer.json()) as { marks: { step: string }[] }).marks.map((mark) => mark.step)).toEqual([
      'Clear and level the cabinets',
    ]);
    await page.getByText(/^Ticked here/).waitFor({ state: 'detached' });
    await page.context().close();
  });

  it('gets its days, a step of the crew, other words, a step left out, and all of it back by undo', async () => {
    const page = await openWork(WIDE);
    await page.getByLabel('First day').fill('2027-03-15');
    await page
      .getByText(/^Mon.*Mar.*15.*, 8:00/)
      .first()
      .waitFor();
    await page.getByRole('button', { name: 'More for Sand' }).click();
    await page.getByRole('menuitem', { name: 'Leave it out' }).click();
    await page.getByRole('button', { name: 'Leave it out' }).click();
    await page.getByText('Say why, so that whoever comes next can follow.').waitFor();
    await page.getByLabel('Reason').fill('The mill sands it.');
    await page.getByRole('button', { name: 'Leave it out' }).click();
    await page.getByText('Left out: The mill sands it.').waitFor();
    await page.getByText('0 of 18 steps done').waitFor();
    await page.getByRole('button', { name: 'More for Load' }).click();
    await page.getByRole('menuitem', { name: 'Add a step before' }).click();
    await page.getByLabel('What is done').fill('Stamp the underside');
    await page.getByRole('button', { name: 'Add the step' }).click();
    await page.getByRole('heading', { name: 'Stamp the underside' }).waitFor();
    const titles = await page.getByRole('heading', { level: 3 }).allTextContents();
    expect(titles.indexOf('Stamp the underside')).toBe(titles.indexOf('Load') - 1);
    await page.getByText('Saved', { exact: true }).waitFor();
    await page.reload();
    await page.getByRole('heading', { name: 'Stamp the underside' }).waitFor();
    await page.getByText('Left out: The mill sands it.').waitFor();
    for (let i = 0; i < 2; i++) await page.getByRole('button', { name: 'Undo', exact: true }).click();
    await page.getByText('0 of 19 steps done').waitFor();
    await page.context().close();
  });
});

describe('wood and finish', () => {
  it.each([
    ['a phone', PHONE],
    ['a wide screen', WIDE],
  ])('follow a climate that is picked or typed, on %s', async (_where, options) => {
    const page = await openWork(options, 'Wood');
    const house = page.getByLabel('Kind of house');
    await house.selectOption({ label: 'House left unheated in winter' });
    await page.getByText('Unheated in winter.').waitFor();
    // Table 4-2 of the Wood Handbook: 40 F and 80 % lie near 16 %.
    await page.getByText(/^wood at 16\.\d %$/).waitFor();
    await house.selectOption({ label: 'Air conditioned the year round' });
    await page.getByText('Unheated in winter.').waitFor({ state: 'detached' });
    const typed = page.getByLabel('House in summer, temperature');
    await typed.fill('21 C');
    await typed.press('Enter');
    await page.getByLabel('House in summer, relative humidity').fill('65');
    await page.getByLabel('House in summer, relative humidity').press('Enter');
    // 70 F and 65 %: 12.0 % in the same table.
    await page.getByText('wood at 12.0 %').waitFor();
    await page.getByLabel('House in winter, relative humidity').fill('120');
    await page.getByLabel('House in winter, relative humidity').press('Enter');
    await page.getByText('Type a relative humidity from 0 to 100 %.').waitFor();
    await page.getByRole('radio', { name: 'Table' }).click();
    await page.getByRole('row', { name: 'Jul' }).waitFor();
    expect(await page.evaluate(() => document.documentElement.scrollWidth <= window.innerWidth)).toBe(true);
    await page.context().close();
  });

  it('lead from a figure to the line that says where it is from', async () => {
    const page = await openWork(WIDE, 'Wood');
    await page.getByRole('button', { name: 'Where from: hard maple: change of width, radial' }).click();
    await page.getByRole('row', { name: /^hard maple: change of width, radial, 0\.00165/ }).waitFor();
    await page.getByText('Wood Handbook (USDA FPL-GTR-190, GTR-282) Table 13-5').first().waitFor();
    await page.context().close();
  });

  it('choose a finish with what is known of it, and warn of a film where food is cut', async () => {
    const page = await openWork(PHONE, 'Finish');
    await page.getByRole('radio', { name: /^Film finish/ }).tap();
    // The scullery's top is one that food is prepared on.
    expect(await page.getByRole('checkbox', { name: /^Food is prepared/ }).isChecked()).toBe(true);
    await page.getByText('A film is cut by knives.').waitFor();
    await page.getByRole('radio', { name: /^Hard wax oil/ }).tap();
    await page.getByText('A film is cut by knives.').waitFor({ state: 'detached' });
    await page.getByText('10 days').waitFor();
    await page.context().close();
  });

  it('choose a screw from stock, and hold the sign-off when it comes through', async () => {
    const page = await openWork(WIDE, 'Hardware');
    await page.getByLabel('Length').selectOption({ label: '3 in' });
    await page.getByText('This screw comes too near to the face.').waitFor();
    await page.getByText('Saved', { exact: true }).waitFor();
    await page.getByRole('link', { name: /^Tops/ }).click();
    await page.getByText('Sign-off is held.').waitFor();
    await page.context().close();
  });
});

describe('findings', () => {
  it('are accepted with a reason, and open again when their number changes', async () => {
    const page = await openWork(WIDE, 'Wood');
    await page.getByRole('link', { name: /^Tops/ }).click();
    const accept = page.getByRole('button', { name: /^Accept: .*(open|miter)/i }).first();
    const said = (await accept.getAttribute('aria-label'))!;
    await accept.click();
    await page.getByRole('button', { name: 'Accept', exact: true }).click();
    await page.getByText('Say why, so that whoever cuts it can follow.').waitFor();
    await page.getByLabel('Reason').fill('They heat the house.');
    await page.getByRole('button', { name: 'Accept', exact: true }).click();
    await page.getByText(/: They heat the house\.$/).waitFor();
    await page.getByRole('link', { name: /^Work/ }).click();
    await page.getByRole('tab', { name: 'Wood' }).click();
    const dry = page.getByLabel('House in winter, relative humidity');
    await dry.fill('18');
    await dry.press('Enter');
    await page.getByRole('link', { name: /^Tops/ }).click();
    await page.getByText(/^Open again: the number has changed since .* \(They heat the house\.\)\.$/).waitFor();
    expect(await page.getByRole('button', { name: said, exact: true }).count()).toBe(0);
    await page.context().close();
  });
});
