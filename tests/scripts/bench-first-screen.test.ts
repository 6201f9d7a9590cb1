import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { gzipSync } from 'node:zlib';

import { build } from 'esbuild';
import type { Browser } from 'playwright-core';

import { askedForFirstScreen } from '@/scripts/bench/first-screen';
import { launchChromium } from '@/tests/helpers/chromium';

const root = path.resolve(__dirname, '../..');

/** Files of this project that these routes bring with them at once, not counting what they load later. */
async function broughtAtOnce(routes: readonly string[]): Promise<string[]> {
  const { metafile } = await build({
    absWorkingDir: root,
    entryPoints: [...routes],
    alias: { '@': root },
    loader: { '.ttf': 'empty' },
    packages: 'external',
    bundle: true,
    splitting: true,
    format: 'esm',
    jsx: 'automatic',
    outdir: 'out',
    write: false,
    metafile: true,
  });
  const outputs = metafile.outputs;
  const waiting = Object.keys(outputs).filter((name) => routes.includes(outputs[name]!.entryPoint ?? ''));
  const seen = new Set<string>();
  for (let name = waiting.pop(); name !== undefined; name = waiting.pop()) {
    if (seen.has(name)) continue;
    seen.add(name);
    const now = outputs[name]!.imports.filter(({ kind, external }) => kind === 'import-statement' && !external);
    waiting.push(...now.map((imported) => imported.path));
  }
  return [...seen].flatMap((name) => Object.keys(outputs[name]!.inputs));
}

const heavy = (file: string) =>
  /^(geometry\/(?!core\/)|shared\/layout\/|components\/(canvas|editor|room|tops|slabs|sheets)\/)/.test(file);

describe('what the first screens bring with them', () => {
  it('is neither canvas nor geometry nor the screens of a job, for sign-in and for the list', async () => {
    const files = await broughtAtOnce([
      'app/_layout.tsx',
      'app/(auth)/sign-in.tsx',
      'app/(shop)/_layout.tsx',
      'app/(shop)/jobs/index.tsx',
      'app/(shop)/jobs/[jobId]/_layout.tsx',
      'app/(shop)/jobs/[jobId]/room.tsx',
    ]);
    expect(files).toContain('components/auth/SignInScreen.tsx');
    expect(files).toContain('components/jobs/JobsScreen.tsx');
    expect(files.filter(heavy)).toEqual([]);
  });

  it('is all of it in the part that comes with the first job', async () => {
    const files = await broughtAtOnce(['components/shell/job-screens.ts']);
    expect(files).toContain('geometry/plan/make-plan.ts');
    expect(files).toContain('components/room/RoomScreen.tsx');
  });
});

describe('askedForFirstScreen', () => {
  let browser: Browser;
  let folder: string;
  beforeAll(async () => {
    browser = await launchChromium();
    folder = mkdtempSync(path.join(os.tmpdir(), 'offsquare-first-screen-'));
    mkdirSync(path.join(folder, '_expo'));
  });
  afterAll(async () => {
    await browser?.close();
    rmSync(folder, { recursive: true, force: true });
  });

  it('counts what a browser asks for after gzip, nothing else, and answers the API with "sign in"', async () => {
    const page = '<!doctype html><title>-</title><script src="/_expo/entry.js"></script><p id="state"></p>';
    const code = `fetch('/api/v1/me').then((answer) => { state.textContent = answer.status; });${'// words\n'.repeat(500)}`;
    writeFileSync(path.join(folder, 'index.html'), page);
    writeFileSync(path.join(folder, '_expo/entry.js'), code);
    writeFileSync(path.join(folder, '_expo/later.js'), code);

    const asked = await askedForFirstScreen(browser, folder, (opened) => opened.getByText('401').waitFor());
    const gzipped = (text: string) => gzipSync(text, { level: 9 }).length;
    expect(asked).toEqual([
      { file: 'index.html', bytes: gzipped(page) },
      { file: path.join('_expo', 'entry.js'), bytes: gzipped(code) },
    ]);
  });
});
