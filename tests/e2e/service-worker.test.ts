import { cpSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';

import express from 'express';
import type { Browser, BrowserContext, Page } from 'playwright-core';

import { fillServiceWorker } from '@/scripts/web/service-worker.mjs';
import { close, listen } from '@/server/listen';
import { securityHeaders } from '@/server/http/security-headers';
import { staticFiles } from '@/server/http/static-files';
import { launchChromium } from '@/tests/helpers/chromium';

const PUBLIC = path.resolve(__dirname, '../../public');

let dist: string;
let server: Server;
let address: string;
let browser: Browser;
let context: BrowserContext;
let page: Page;

/** A build of an app that shows which version it is and loads a part of itself on demand. */
function build(version: string): void {
  rmSync(dist, { recursive: true, force: true });
  mkdirSync(path.join(dist, '_expo/static'), { recursive: true });
  cpSync(PUBLIC, dist, { recursive: true });
  const write = (name: string, text: string) => writeFileSync(path.join(dist, name), text);
  write(`_expo/static/entry-${version}.js`, `document.getElementById('root').textContent = 'version ${version}';`);
  write(`_expo/static/part-${version}.js`, `export const part = 'part ${version}';`);
  write(
    'index.html',
    `<!doctype html><title>x</title><script src="/register-sw.js" defer></script><div id="root"></div>
     <script src="/_expo/static/entry-${version}.js" defer></script>`,
  );
  fillServiceWorker(dist);
}

beforeAll(async () => {
  dist = path.join(mkdtempSync(path.join(os.tmpdir(), 'offsquare-sw-')), 'dist');
  browser = await launchChromium();
});

afterAll(async () => {
  await browser.close();
  rmSync(path.dirname(dist), { recursive: true });
});

beforeEach(async () => {
  build('one');
  const app = express().use(securityHeaders());
  app.get('/api/v1/jobs', (_req, res) => void res.json(['a kitchen']));
  server = await listen(app.use(staticFiles(dist)), 0, '127.0.0.1');
  address = `http://localhost:${(server.address() as AddressInfo).port}`;
  context = await browser.newContext();
  page = await context.newPage();
});

afterEach(async () => {
  await context.close();
  await close(server);
});

const shown = () => page.textContent('#root');
const serviceWorkers = () => page.evaluate(async () => (await navigator.serviceWorker.getRegistrations()).length);

/** Asks the page again and again; Jest ends a wait that has no end. */
async function until(question: () => Promise<boolean>): Promise<void> {
  while (!(await page.evaluate(question))) await sleep(50);
}

async function installed(): Promise<void> {
  await until(async () => navigator.serviceWorker.controller !== null);
}

/** Serves another version and waits until the page has changed over to it. */
async function release(version: string): Promise<void> {
  build(version);
  await page.evaluate(async () => void (await (await navigator.serviceWorker.ready).update()));
  await until(async () => {
    const { installing, waiting, active } = await navigator.serviceWorker.ready;
    return installing === null && waiting === null && active?.state === 'activated';
  });
  await expect(kept()).resolves.toContain(`/_expo/static/part-${version}.js`);
}

/** Every address kept by the service worker, of all versions. */
function kept(): Promise<string[]> {
  return page.evaluate(async () => {
    const requests = await Promise.all((await caches.keys()).map(async (name) => (await caches.open(name)).keys()));
    return requests.flat().map((request) => new URL(request.url).pathname);
  });
}

describe('the service worker', () => {
  it('opens any address of the app without a signal', async () => {
    await page.goto(`${address}/jobs`);
    await installed();
    await context.setOffline(true);
    await page.goto(`${address}/jobs/7/room`);
    expect(await shown()).toBe('version one');
    expect(await page.evaluate(async () => (await import('/_expo/static/part-one.js' as string)).part)).toBe(
      'part one',
    );
  });

  it('never keeps an answer of the API', async () => {
    await page.goto(`${address}/jobs`);
    await installed();
    expect(await page.evaluate(async () => (await fetch('/api/v1/jobs')).json())).toEqual(['a kitchen']);
    expect((await kept()).sort()).toEqual([
      '/_expo/static/entry-one.js',
      '/_expo/static/part-one.js',
      '/index.html',
      '/logo.svg',
      '/manifest.webmanifest',
      '/register-sw.js',
    ]);
    await context.setOffline(true);
    expect(
      await page.evaluate(() =>
        fetch('/api/v1/jobs').then(
          () => 'answered',
          () => 'no signal',
        ),
      ),
    ).toBe('no signal');
  });

  it("is not installed by the customer's page, and leaves it to the network where it is installed", async () => {
    await page.goto(`${address}/view/abc`);
    expect(await shown()).toBe('version one');
    expect(await serviceWorkers()).toBe(0);

    await page.goto(`${address}/jobs`);
    await installed();
    await context.setOffline(true);
    await expect(page.goto(`${address}/view/abc`)).rejects.toThrow('ERR_INTERNET_DISCONNECTED');
  });

  it('changes to a new version by itself, and lets a page that is open load the rest of the old one', async () => {
    await page.goto(`${address}/jobs`);
    await installed();
    await release('two');
    expect(await shown()).toBe('version one');
    expect(await page.evaluate(async () => (await import('/_expo/static/part-one.js' as string)).part)).toBe(
      'part one',
    );

    await page.goto(`${address}/jobs`);
    expect(await shown()).toBe('version two');
  });

  it('keeps two versions at most', async () => {
    await page.goto(`${address}/jobs`);
    await installed();
    await release('two');
    await release('three');
    expect((await kept()).filter((file) => file.includes('part')).sort()).toEqual([
      '/_expo/static/part-three.js',
      '/_expo/static/part-two.js',
    ]);
  });
});
