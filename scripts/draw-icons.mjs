// @ts-check
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

import { chromium } from 'playwright-core';

import { onPath } from './setup/debian-packages.mjs';

/** Draws the app's icons in public/ from public/logo.svg; run it by hand when the logo changes. */
const folder = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../public');

/** `share`: how much of the square the logo takes; a maskable icon may lose everything outside the middle 80 %. */
const ICONS = [
  { name: 'icon-180.png', size: 180, share: 0.7 },
  { name: 'icon-192.png', size: 192, share: 0.7 },
  { name: 'icon-512.png', size: 512, share: 0.7 },
  { name: 'icon-maskable-512.png', size: 512, share: 0.52 },
];

async function drawIcons() {
  const executablePath = onPath('chromium');
  if (!executablePath) throw new Error('Chromium is not installed: run npm test once, which installs it.');
  const logo = readFileSync(path.join(folder, 'logo.svg'), 'utf8');
  const browser = await chromium.launch({ executablePath, args: ['--no-sandbox', '--disable-dev-shm-usage'] });
  try {
    for (const { name, size, share } of ICONS) {
      const page = await browser.newPage({ viewport: { width: size, height: size }, colorScheme: 'light' });
      await page.setContent(
        `<body style="margin:0;height:100vh;display:grid;place-items:center;background:#f6f2e8">
           <div style="width:${share * 100}vw;height:${share * 100}vw">${logo}</div>
         </body>`,
      );
      await page.screenshot({ path: path.join(folder, name) });
      await page.close();
    }
  } finally {
    await browser.close();
  }
}

drawIcons().catch((error) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
