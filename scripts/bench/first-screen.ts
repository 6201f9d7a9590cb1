import { createServer } from 'node:http';
import { existsSync, readFileSync, statSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import path from 'node:path';
import { gzipSync } from 'node:zlib';

import type { Browser, Page } from 'playwright-core';

const TYPES: Readonly<Record<string, string>> = {
  '.css': 'text/css',
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.json': 'application/json',
  '.svg': 'image/svg+xml',
  '.ttf': 'font/ttf',
  '.webmanifest': 'application/manifest+json',
};

/** What a browser asked for until the first screen stood, in the bytes of its answer's body after gzip. */
export interface Asked {
  readonly file: string;
  readonly bytes: number;
}

/**
 * Opens an exported app in a browser that has seen nothing before.
 *
 * @param folder - absolute path of the exported app
 * @param ready - resolves when the first screen stands
 */
export async function askedForFirstScreen(
  browser: Browser,
  folder: string,
  ready: (page: Page) => Promise<unknown>,
): Promise<Asked[]> {
  const asked: Asked[] = [];
  const server = createServer((request, response) => {
    const address = new URL(request.url ?? '/', 'http://localhost').pathname;
    if (address.startsWith('/api/')) {
      // Nobody is signed in.
      response.writeHead(401, { 'Content-Type': 'application/problem+json' });
      response.end(JSON.stringify({ type: 'about:blank', title: 'Sign in', status: 401, code: 'not_signed_in' }));
      return;
    }
    const file = fileFor(folder, address);
    if (file === null) {
      response.writeHead(404).end();
      return;
    }
    const body = gzipSync(readFileSync(file), { level: 9 });
    asked.push({ file: path.relative(folder, file), bytes: body.length });
    const type = TYPES[path.extname(file)] ?? 'application/octet-stream';
    response.writeHead(200, { 'Content-Type': type, 'Content-Encoding': 'gzip' }).end(body);
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  // The service worker fetches the rest of the app for use without a signal, after the first screen.
  const context = await browser.newContext({ serviceWorkers: 'block', viewport: { width: 390, height: 844 } });
  try {
    const page = await context.newPage();
    await page.goto(`http://localhost:${(server.address() as AddressInfo).port}/`);
    await ready(page);
    await page.waitForLoadState('networkidle');
    return asked;
  } finally {
    await context.close();
    server.close();
  }
}

/** The file of an address, the page of the app for any other, null for a file that is missing. */
function fileFor(folder: string, address: string): string | null {
  const file = path.join(folder, path.normalize(decodeURIComponent(address)));
  if (existsSync(file) && statSync(file).isFile()) return file;
  return path.extname(address) === '' ? path.join(folder, 'index.html') : null;
}
