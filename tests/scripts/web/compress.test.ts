import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { brotliDecompressSync, gunzipSync } from 'node:zlib';

import { compressTwins } from '@/scripts/web/compress.mjs';

const TEXT = 'const wall = 96.25;\n'.repeat(500);

let dist: string;

beforeEach(() => {
  dist = mkdtempSync(path.join(os.tmpdir(), 'offsquare-dist-'));
});

afterEach(() => rmSync(dist, { recursive: true }));

describe('compressTwins', () => {
  it('leaves two smaller twins that unpack to the same bytes', async () => {
    const file = path.join(dist, 'entry.js');
    writeFileSync(file, TEXT);
    await compressTwins(dist);
    expect(brotliDecompressSync(readFileSync(`${file}.br`)).toString()).toBe(TEXT);
    expect(gunzipSync(readFileSync(`${file}.gz`)).toString()).toBe(TEXT);
    expect(readFileSync(`${file}.br`).length).toBeLessThan(TEXT.length / 10);
  });

  it('leaves pictures and files that fit into one packet alone', async () => {
    writeFileSync(path.join(dist, 'icon.png'), TEXT);
    writeFileSync(path.join(dist, 'small.js'), 'x'.repeat(1_000));
    await compressTwins(dist);
    expect(existsSync(path.join(dist, 'icon.png.br'))).toBe(false);
    expect(existsSync(path.join(dist, 'small.js.gz'))).toBe(false);
  });
});
