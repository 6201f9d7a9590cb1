import { cpSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

import { fillServiceWorker, filesToKeep } from '@/scripts/web/service-worker.mjs';

const PUBLIC = path.resolve(__dirname, '../../../public');
const ENTRY = '_expo/static/js/web/entry-1a.js';

let dist: string;

function write(name: string, content = name): void {
  mkdirSync(path.dirname(path.join(dist, name)), { recursive: true });
  writeFileSync(path.join(dist, name), content);
}

beforeEach(() => {
  dist = mkdtempSync(path.join(os.tmpdir(), 'offsquare-dist-'));
  cpSync(PUBLIC, dist, { recursive: true });
  write(ENTRY);
});

afterEach(() => rmSync(dist, { recursive: true }));

function filled(): string {
  cpSync(path.join(PUBLIC, 'sw.js'), path.join(dist, 'sw.js'));
  fillServiceWorker(dist);
  return readFileSync(path.join(dist, 'sw.js'), 'utf8');
}

const versionIn = (source: string) => /VERSION = '([0-9a-f]{16})'/.exec(source)?.[1];

describe('filesToKeep', () => {
  it("keeps the page, code and fonts and leaves twins, maps, the solver and the router's pictures", () => {
    for (const name of [
      `${ENTRY}.br`,
      `${ENTRY}.gz`,
      `${ENTRY}.map`,
      'assets/highs.2b.wasm',
      'assets/fonts/Bold.3c.ttf',
      'assets/node_modules/expo-router/assets/file.4d.png',
      '.build-hash',
      'metadata.json',
    ]) {
      write(name);
    }
    expect(filesToKeep(dist)).toEqual([
      `/${ENTRY}`,
      '/assets/fonts/Bold.3c.ttf',
      '/index.html',
      '/logo.svg',
      '/manifest.webmanifest',
      '/register-sw.js',
    ]);
  });
});

describe('fillServiceWorker', () => {
  it('writes the list and a version of 16 digits', () => {
    const source = filled();
    expect(source).toContain(`"/${ENTRY}"`);
    expect(versionIn(source)).toBeDefined();
    expect(source).not.toContain('__');
  });

  it('gives the same version to the same files and another one when a byte differs', () => {
    const first = versionIn(filled());
    expect(versionIn(filled())).toBe(first);
    write(ENTRY, 'changed');
    expect(versionIn(filled())).not.toBe(first);
  });

  it('refuses a service worker that has no place for them', () => {
    write('sw.js', "const VERSION = '__VERSION__';");
    expect(() => fillServiceWorker(dist)).toThrow("public/sw.js must hold '__FILES__' exactly once");
  });
});
