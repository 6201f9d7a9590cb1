import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { brotliCompressSync, gzipSync } from 'node:zlib';

import express from 'express';
import request from 'supertest';

import { securityHeaders } from '@/server/http/security-headers';
import { staticFiles } from '@/server/http/static-files';

const SCRIPT = 'console.log("a kitchen");';
const PAGE = '<!doctype html><div id="root"></div>';

let folder: string;
let app: express.Express;

beforeAll(() => {
  folder = mkdtempSync(path.join(os.tmpdir(), 'offsquare-web-'));
  const write = (name: string, content: string | Buffer) => {
    mkdirSync(path.dirname(path.join(folder, name)), { recursive: true });
    writeFileSync(path.join(folder, name), content);
  };
  write('index.html', PAGE);
  write('sw.js', '// nothing');
  write('_expo/static/js/web/entry-1a2b.js', SCRIPT);
  write('_expo/static/js/web/entry-1a2b.js.br', brotliCompressSync(SCRIPT));
  write('_expo/static/js/web/entry-1a2b.js.gz', gzipSync(SCRIPT));
  write('.build-hash', 'x');
  app = express().use(securityHeaders(), staticFiles(folder));
});

afterAll(() => rmSync(folder, { recursive: true }));

const ENTRY = '/_expo/static/js/web/entry-1a2b.js';

describe('staticFiles', () => {
  it.each(['/', '/jobs/7/room', '/view/abc'])('answers %s with the page of the app', async (address) => {
    const answer = await request(app).get(address).expect(200);
    expect(answer.text).toBe(PAGE);
    expect(answer.headers['content-type']).toMatch('text/html');
  });

  it("asks for the page again each time, and never stores the customer's", async () => {
    expect((await request(app).get('/jobs')).headers['cache-control']).toBe('no-cache');
    expect((await request(app).get('/view/abc')).headers['cache-control']).toBe('no-store');
    expect((await request(app).get('/sw.js')).headers['cache-control']).toBe('no-cache');
  });

  it('lets files with a hash in their name be kept for a year', async () => {
    const answer = await request(app).get(ENTRY).expect(200);
    expect(answer.headers['cache-control']).toBe('public, max-age=31536000, immutable');
  });

  it.each([
    ['br', 'br'],
    ['gzip', 'gzip'],
    ['gzip, deflate, br', 'br'],
    ['identity', undefined],
  ])('serves a client that accepts "%s" in %s', async (accepted, encoding) => {
    const answer = await request(app).get(ENTRY).set('Accept-Encoding', accepted).buffer(true).parse(bytes).expect(200);
    expect(answer.headers['content-encoding']).toBe(encoding);
    expect(answer.headers['content-type']).toMatch('javascript');
    const expected = { br: brotliCompressSync(SCRIPT), gzip: gzipSync(SCRIPT), plain: Buffer.from(SCRIPT) };
    expect(answer.headers['content-length']).toBe(
      String(expected[(encoding ?? 'plain') as keyof typeof expected].length),
    );
  });

  it.each([
    '/_expo/static/js/web/entry-gone.js',
    '/assets/gone.ttf',
    '/favicon.ico',
    '/.build-hash',
    '/..%2f..%2fetc%2fpasswd.br',
  ])('answers %s with 404, not with a page', async (address) => {
    const answer = await request(app).get(address);
    expect(answer.status).toBe(404);
    expect(answer.text).toBe('There is no such file.\n');
  });

  it('says what to do when the app is not built', async () => {
    const empty = express().use(staticFiles(path.join(folder, 'nothing')));
    const answer = await request(empty).get('/').expect(503);
    expect(answer.text).toBe('The web app is not built yet: run npm start.\n');
  });
});

describe('securityHeaders', () => {
  it('allows own scripts, workers and WebAssembly and nothing foreign', async () => {
    const { headers } = await request(app).get('/');
    const policy = String(headers['content-security-policy']).split(';');
    expect(policy).toContain("script-src 'self' 'wasm-unsafe-eval'");
    expect(policy).toContain("worker-src 'self' blob:");
    expect(policy).toContain("default-src 'self'");
    expect(policy.join()).not.toMatch(/https?:|\*/);
    expect(headers['referrer-policy']).toBe('no-referrer');
    expect(headers['x-content-type-options']).toBe('nosniff');
  });
});

/** Keeps the answer as it came over the wire. */
function bytes(response: request.Response, done: (error: Error | null, body: unknown) => void): void {
  const stream = response as unknown as NodeJS.ReadableStream;
  stream.on('data', () => {});
  stream.on('end', () => done(null, null));
}
