import path from 'node:path';

import type { Page } from 'playwright-core';

import { launchChromium } from '@/tests/helpers/chromium';
import { buildWebApp } from '../web/build.mjs';
import type { BenchRow } from './bench-row';
import { withEmptyApp } from './empty-app';
import { type Asked, askedForFirstScreen } from './first-screen';

const ROOT = path.resolve(__dirname, '../..');

/** What travels until somebody can sign in, against an app of the same packages that shows nothing. */
export async function rows(): Promise<BenchRow[]> {
  await buildWebApp(ROOT);
  const browser = await launchChromium();
  try {
    const ours = await askedForFirstScreen(browser, path.join(ROOT, 'dist'), signInStands);
    const empty = await withEmptyApp(ROOT, (folder) => askedForFirstScreen(browser, folder, emptyStands));
    return [
      row('bytes to the first screen, everything', kilobytes(ours), kilobytes(empty)),
      row('bytes to the first screen, code only', kilobytes(ours, '.js'), kilobytes(empty, '.js')),
      {
        name: 'bytes to the first screen, fonts',
        value: kilobytes(ours, '.ttf'),
        unit: 'kB',
        against: null,
        ratio: null,
      },
    ];
  } finally {
    await browser.close();
  }
}

const signInStands = (page: Page) => page.getByLabel('Password').waitFor();
const emptyStands = (page: Page) => page.getByText('empty').waitFor();

const row = (name: string, value: number, empty: number): BenchRow => ({
  name,
  value,
  unit: 'kB',
  against: { name: 'Expo Router app with one empty screen', value: empty },
  ratio: value / empty,
});

/** Thousands of bytes after gzip, of the files that end in this way. */
const kilobytes = (asked: readonly Asked[], ending = ''): number =>
  asked.filter(({ file }) => file.endsWith(ending)).reduce((sum, { bytes }) => sum + bytes, 0) / 1000;
