import { mkdirSync, mkdtempSync, rmSync, statSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

import { clusterHome, stateFolder } from '@/scripts/pg/home.mjs';

let folder: string;

beforeEach(() => {
  folder = mkdtempSync(path.join(os.tmpdir(), 'offsquare-home-'));
});

afterEach(() => rmSync(folder, { recursive: true, force: true }));

describe('stateFolder', () => {
  it('takes the folder that OFFSQUARE_DATA names and leaves its mode alone', () => {
    const data = path.join(folder, 'data');
    mkdirSync(data);
    const before = statSync(data).mode;
    expect(stateFolder(folder, { OFFSQUARE_DATA: data })).toBe(data);
    expect(statSync(data).mode).toBe(before);
  });

  it('reads a relative OFFSQUARE_DATA from the checkout', () => {
    expect(stateFolder(folder, { OFFSQUARE_DATA: 'kept' })).toBe(path.join(folder, 'kept'));
  });

  it('says what to set when the place cannot be written', () => {
    const file = path.join(folder, 'file');
    writeFileSync(file, '');
    expect(() => stateFolder(folder, { OFFSQUARE_DATA: path.join(file, 'data') })).toThrow(
      `There is no place for the data, since ${file}/data cannot be written: set OFFSQUARE_DATA to a folder that can.`,
    );
  });
});

describe('clusterHome', () => {
  it('is a private folder inside', () => {
    const home = clusterHome(folder);
    expect(home).toBe(path.join(folder, 'database'));
    expect(statSync(home).mode & 0o777).toBe(0o700);
  });
});
