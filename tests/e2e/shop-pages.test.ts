import type { Browser, Page } from 'playwright-core';

import type { Role } from '@/shared/roles/roles';
import { openBrowserApp, openSignedIn, type BrowserApp } from '@/tests/helpers/browser-app';
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

const open = (role: Role, at: string, width: number): Promise<Page> =>
  openSignedIn(browser, app, at, { viewport: { width, height: 844 } }, role);

/** Whether something on the page is wider than the screen. */
const overflows = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth > document.documentElement.clientWidth);

describe('settings', () => {
  it('are changed by the owner, undone from the message, and still there after a reload', async () => {
    const page = await open('owner', '/settings', 1440);
    const gap = page.getByLabel('Back gap');
    await gap.waitFor();
    expect(await gap.inputValue()).toBe('1/4');
    await gap.fill('5/16');
    await gap.press('Enter');
    await page.getByText('Back gap is stored').waitFor();
    await page.reload();
    // What this device remembers shows first, what the server has a moment later.
    await page.waitForFunction(
      () => document.querySelector<HTMLInputElement>('[aria-label="Back gap"]')?.value === '5/16',
    );
    await gap.fill('3/8');
    await gap.press('Tab');
    await page.getByRole('button', { name: 'Undo' }).click();
    await page.getByText('Undid Back gap').waitFor();
    await page.waitForFunction(
      () => document.querySelector<HTMLInputElement>('[aria-label="Back gap"]')?.value === '5/16',
    );
  });

  it('keep what was typed beside the sentence that says why it cannot be', async () => {
    const page = await open('owner', '/settings', 390);
    const shortest = page.getByLabel('Shortest piece');
    await shortest.fill('0');
    await shortest.press('Enter');
    await page.getByText('This has to be more than nothing.').waitFor();
    expect(await shortest.inputValue()).toBe('0');
    expect(await overflows(page)).toBe(false);
  });

  it('can be read by an installer and not changed', async () => {
    const page = await open('installer', '/settings', 320);
    await page.getByText('Only the owner changes these.').waitFor();
    expect(await page.getByLabel('Back gap').isEditable()).toBe(false);
    expect(await overflows(page)).toBe(false);
  });
});

describe('crew', () => {
  it('is invited by the owner, who can take an invitation back', async () => {
    const page = await open('owner', '/crew', 390);
    await page.getByRole('button', { name: 'Invite' }).click();
    await page.getByLabel('E-mail').fill('nessa@carrowquay.example');
    await page.getByLabel('Role', { exact: true }).selectOption({ label: 'Shop hand' });
    await page.getByRole('button', { name: 'Send the invitation' }).click();
    await page.getByText('An invitation is on its way to nessa@carrowquay.example').waitFor();
    await page.getByText(/^Shop hand; the link works until/).waitFor();
    expect(await overflows(page)).toBe(false);
    await page.getByRole('button', { name: 'Take back' }).click();
    await page.getByText(/^Shop hand; the link works until/).waitFor({ state: 'detached' });
  });

  it('keeps its last owner, and says so', async () => {
    const page = await open('owner', '/crew', 1440);
    const role = page.getByLabel(new RegExp(`^Role of ${app.shop.people.owner.name}`));
    await role.selectOption({ label: 'Designer' });
    await page
      .getByText(/last owner|needs an owner|one owner/i)
      .first()
      .waitFor();
    expect(await role.inputValue()).toBe('owner');
  });

  it('is only looked at by a shop hand', async () => {
    const page = await open('shop_hand', '/crew', 390);
    await page.getByText('Owner', { exact: true }).first().waitFor();
    expect(await page.getByRole('button', { name: 'Invite' }).count()).toBe(0);
  });
});
