import { readFileSync } from 'node:fs';
import path from 'node:path';

import type { FontName } from '@/geometry/scene/text-width';

const FOLDER = path.join(__dirname, '../../assets/fonts');

const FILES: Readonly<Record<FontName, string>> = {
  labelSemibold: 'BarlowCondensed-SemiBold.ttf',
  labelBold: 'BarlowCondensed-Bold.ttf',
  labelExtrabold: 'BarlowCondensed-ExtraBold.ttf',
  bodyRegular: 'AtkinsonHyperlegibleNext-Regular.ttf',
  bodyBold: 'AtkinsonHyperlegibleNext-Bold.ttf',
};

export const FONT_NAMES = Object.keys(FILES) as readonly FontName[];

const read = new Map<FontName, Buffer>();

/** The font's file, read once. */
export function fontFile(name: FontName): Buffer {
  const known = read.get(name) ?? readFileSync(path.join(FOLDER, FILES[name]));
  read.set(name, known);
  return known;
}
