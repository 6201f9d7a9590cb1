import type { Locator, Page } from 'playwright-core';

import { spokenLength } from '@/geometry/tape/format-length';

/** Counts the taps of a person at the fraction pad. */
export interface Taps {
  count: number;
}

/** Types a length on the pad by touch, to the sixteenth, and goes on. */
export async function typeLength(page: Page, inches: number, taps: Taps): Promise<void> {
  const sixteenths = Math.round(inches * 16);
  const tap = async (button: Locator) => {
    taps.count++;
    await button.tap();
  };
  const key = (name: string) => page.getByRole('button', { name, exact: true });
  for (const digit of String(Math.floor(sixteenths / 16))) await tap(key(digit));
  const part = sixteenths % 16;
  if (part > 0) await tap(key(spokenLength(part / 16, '1/16')));
  await tap(page.getByRole('button', { name: /^Next: / }));
}
