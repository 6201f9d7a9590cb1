/**
 * Writes seeds/demo from the demo's job files: seeds are plain data, so that they never change unseen when code does.
 * Run it after a change of shared/layout/demo or of the layout schema: node --import tsx scripts/write-demo-layouts.ts
 */
import { writeFileSync } from 'node:fs';
import path from 'node:path';

import { DEFAULT_SETTINGS } from '../geometry/core/settings';
import { thumbnailOf } from '../server/services/thumbnail';
import { DEMO_JOBS } from '../shared/layout/demo/demo-jobs';
import { DEMO_RACK, DEMO_SLABS } from '../shared/layout/demo/demo-stock';
import { parseJobFile } from '../shared/layout/parse-job-file';

const FOLDER = path.resolve(__dirname, '../seeds/demo');

function write(name: string, content: unknown): void {
  writeFileSync(path.join(FOLDER, `${name}.json`), `${JSON.stringify(content)}\n`);
}

for (const [name, file] of Object.entries(DEMO_JOBS)) {
  const parsed = parseJobFile(file);
  if (!parsed.ok)
    throw new Error(`${name}: ${parsed.errors.map(({ path: at, message }) => `${at} ${message}`).join('; ')}`);
  write(name, { name: parsed.name, doc: parsed.layout, thumbnail: thumbnailOf(parsed.layout, DEFAULT_SETTINGS) });
}
write('stock', { slabs: DEMO_SLABS, rack: DEMO_RACK });
