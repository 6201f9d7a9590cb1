import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

import { contentHash, filesUnder } from '@/scripts/web/content-hash.mjs';

let root: string;

beforeEach(() => {
  root = mkdtempSync(path.join(os.tmpdir(), 'offsquare-hash-'));
  mkdirSync(path.join(root, 'app/jobs'), { recursive: true });
  writeFileSync(path.join(root, 'app/index.tsx'), 'a');
  writeFileSync(path.join(root, 'app/jobs/list.tsx'), 'b');
  writeFileSync(path.join(root, 'app.json'), '{}');
});

afterEach(() => rmSync(root, { recursive: true }));

const hash = () => contentHash(root, ['app', 'app.json', 'metro.config.js']);

describe('contentHash', () => {
  it('stays when only dates change', () => {
    const before = hash();
    utimesSync(path.join(root, 'app/index.tsx'), 0, 0);
    expect(hash()).toBe(before);
    expect(before).toMatch(/^[0-9a-f]{64}$/);
  });

  it('changes with a byte, a name, a new file and a file that appears among the names', () => {
    const seen = [hash()];
    writeFileSync(path.join(root, 'app/index.tsx'), 'A');
    seen.push(hash());
    writeFileSync(path.join(root, 'app/extra.tsx'), '');
    seen.push(hash());
    writeFileSync(path.join(root, 'metro.config.js'), '');
    seen.push(hash());
    expect(new Set(seen).size).toBe(4);
  });

  it('tells a byte that moved from one file to the next', () => {
    writeFileSync(path.join(root, 'app/index.tsx'), 'ab');
    writeFileSync(path.join(root, 'app/jobs/list.tsx'), '');
    const before = hash();
    writeFileSync(path.join(root, 'app/index.tsx'), 'a');
    writeFileSync(path.join(root, 'app/jobs/list.tsx'), 'b');
    expect(hash()).not.toBe(before);
  });
});

describe('filesUnder', () => {
  it('lists files by name with forward slashes', () => {
    expect(filesUnder(root, 'app')).toEqual(['app/index.tsx', 'app/jobs/list.tsx']);
    expect(filesUnder(root, 'nothing')).toEqual([]);
  });
});
