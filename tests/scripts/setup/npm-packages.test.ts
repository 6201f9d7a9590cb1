import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

import { installedByLock } from '@/scripts/setup/npm-packages.mjs';

const LOCK = {
  '': { name: 'offsquare' },
  'node_modules/knex': { version: '3.3.0' },
  'node_modules/fsevents': { version: '2.3.3', optional: true },
};

let root: string;

beforeEach(() => {
  root = mkdtempSync(path.join(os.tmpdir(), 'offsquare-npm-'));
  mkdirSync(path.join(root, 'node_modules'));
  writeFileSync(path.join(root, 'package-lock.json'), JSON.stringify({ packages: LOCK }));
});

afterEach(() => rmSync(root, { recursive: true }));

function record(packages: object): void {
  writeFileSync(path.join(root, 'node_modules/.package-lock.json'), JSON.stringify({ packages }));
}

describe('installedByLock', () => {
  it('misses everything where npm has never been', () => {
    expect(installedByLock(root)).toBe(false);
  });

  it('is content when every package has the version of the lock, optional ones or not', () => {
    record({ 'node_modules/knex': { version: '3.3.0' } });
    expect(installedByLock(root)).toBe(true);
  });

  it('notices another version and a package that is missing', () => {
    record({ 'node_modules/knex': { version: '3.2.0' } });
    expect(installedByLock(root)).toBe(false);
    record({});
    expect(installedByLock(root)).toBe(false);
  });
});
