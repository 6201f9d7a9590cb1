import { randomUUID } from 'node:crypto';
import { existsSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import path from 'node:path';

import type { Knex } from 'knex';
import { pino } from 'pino';
import type { Browser, BrowserContextOptions, Page } from 'playwright-core';

import { createApp } from '@/server/app';
import { close, listen } from '@/server/listen';
import { DEMO_RACK, DEMO_SLABS } from '@/shared/layout/demo/demo-stock';
import { freshDatabase } from './database';
import { addShop, TEST_CONFIG, TEST_PASSWORD, type TestShop } from './test-server';
import type { Role } from '@/shared/roles/roles';

const WEB_ROOT = path.resolve(__dirname, '../../dist');

export interface BrowserApp {
  readonly address: string;
  readonly db: Knex;
  readonly shop: TestShop;
  readonly close: () => Promise<void>;
}

/** The built app on a port of its own, with one shop of its own that has slabs in stock. */
export async function openBrowserApp(): Promise<BrowserApp> {
  if (!existsSync(path.join(WEB_ROOT, 'index.html'))) throw new Error('The web app is not built: npm test builds it.');
  const { db, drop } = await freshDatabase();
  const shop = await addShop(db, 'Tidewater Tops');
  await stock(db, shop);
  const app = createApp({ config: TEST_CONFIG, db, log: pino({ level: 'silent' }), webRoot: WEB_ROOT });
  const server = await listen(app, 0, '127.0.0.1');
  return {
    address: `http://localhost:${(server.address() as AddressInfo).port}`,
    db,
    shop,
    close: async () => {
      await close(server);
      await drop();
    },
  };
}

/** The same invented slabs as the demo shop sells. */
async function stock(db: Knex, shop: TestShop): Promise<void> {
  await db('stock_slabs').insert(
    DEMO_SLABS.map(({ id, price, ...slab }) => ({ shop_id: shop.id, code: id, price_cents: price, ...slab })),
  );
  await db('rack_pieces').insert(
    DEMO_RACK.map(({ id, price, defects, ...piece }) => ({
      shop_id: shop.id,
      person_id: shop.people.shop_hand.id,
      code: id,
      price_cents: price,
      defects: JSON.stringify(defects ?? []),
      ...piece,
    })),
  );
}

/** Signs somebody of the shop in, as a person does, and waits for the jobs. */
export async function signIn(page: Page, { address, shop }: BrowserApp, role: Role = 'owner'): Promise<void> {
  await page.goto(`${address}/`);
  await page.getByLabel('Work e-mail').fill(shop.people[role].email);
  await page.getByLabel('Password').fill(TEST_PASSWORD);
  await page.getByRole('button', { name: 'Sign in', exact: true }).tap();
  await page.getByRole('heading', { name: 'Jobs', exact: true }).waitFor();
}

/** Opens a job from a job file, as `POST /job-files` does for a person of this role; gives its id. */
export async function importJob(app: BrowserApp, file: unknown, role: Role = 'owner'): Promise<string> {
  const post = async (path: string, body: object, token?: string) => {
    const answer = await fetch(`${app.address}/api/v1${path}`, {
      method: 'POST',
      headers: {
        'content-type': 'application/json',
        'idempotency-key': randomUUID(),
        ...(token && { authorization: `Bearer ${token}` }),
      },
      body: JSON.stringify(body),
    });
    if (!answer.ok) throw new Error(`${path} answered ${answer.status}: ${await answer.text()}`);
    return answer.json() as Promise<Record<string, string>>;
  };
  const { email } = app.shop.people[role];
  const session = await post('/auth/sign-in', { email, password: TEST_PASSWORD });
  return (await post('/job-files', { file }, session.accessToken)).id!;
}

/** A page at an address of the app, signed in by hand; whoever is not signed in is brought back to the address. */
export async function openSignedIn(
  browser: Browser,
  app: BrowserApp,
  at: string,
  options: BrowserContextOptions,
  role: Role = 'owner',
): Promise<Page> {
  const context = await browser.newContext({ serviceWorkers: 'block', ...options });
  const page = await context.newPage();
  await page.goto(`${app.address}${at}`);
  await page.getByLabel('Work e-mail').fill(app.shop.people[role].email);
  await page.getByLabel('Password').fill(TEST_PASSWORD);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await page.waitForURL(`${app.address}${at}`);
  return page;
}

export const PHONE: BrowserContextOptions = { viewport: { width: 390, height: 844 }, hasTouch: true };
export const WIDE: BrowserContextOptions = { viewport: { width: 1440, height: 900 } };
