import { existsSync } from 'node:fs';

import { chromium, type Browser } from 'playwright-core';

const PROGRAM = '/usr/bin/chromium';

/**
 * Starts Debian's Chromium without a window; close it in `afterAll`.
 *
 * @throws Error when it is not installed
 */
export async function launchChromium(): Promise<Browser> {
  if (!existsSync(PROGRAM)) throw new Error(`${PROGRAM} is missing: run npm test, which installs it`);
  // Its sandbox does not work for root, and containers have too little shared memory for its pages.
  return chromium.launch({ executablePath: PROGRAM, args: ['--no-sandbox', '--disable-dev-shm-usage'] });
}
