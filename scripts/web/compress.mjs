// @ts-check
import { readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { promisify } from 'node:util';
import zlib from 'node:zlib';

import { filesUnder } from './content-hash.mjs';

const brotli = promisify(zlib.brotliCompress);
const gzip = promisify(zlib.gzip);

const TEXT = /\.(js|css|html|json|svg|ttf|webmanifest)$/;
/** Below this the answer fits into one packet anyway, bytes. */
const WORTH_IT = 1_400;

/**
 * Leaves a `.br` and a `.gz` twin beside every larger text file, so that the server never compresses while it answers.
 *
 * @param {string} dist - absolute folder of the exported app
 */
export async function compressTwins(dist) {
  for (const name of filesUnder(dist, '.').filter((file) => TEXT.test(file))) {
    const file = path.join(dist, name);
    const bytes = readFileSync(file);
    if (bytes.length < WORTH_IT) continue;
    const [br, gz] = await Promise.all([
      brotli(bytes, { params: { [zlib.constants.BROTLI_PARAM_SIZE_HINT]: bytes.length } }),
      gzip(bytes, { level: 9 }),
    ]);
    writeFileSync(`${file}.br`, br);
    writeFileSync(`${file}.gz`, gz);
  }
}
