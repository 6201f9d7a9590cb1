import { execFileSync, spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { pathToFileURL } from 'node:url';

import { clusterState, destroyCluster } from '@/scripts/pg/cluster.mjs';
import { handOver } from '@/scripts/pg/home.mjs';
import { holdCluster, releaseCluster } from '@/scripts/pg/holders.mjs';

const HOLDERS = pathToFileURL(path.resolve(__dirname, '../../../scripts/pg/holders.mjs')).href;

let home: string;

beforeEach(() => {
  home = mkdtempSync(path.join(process.getuid?.() === 0 ? '/tmp' : os.tmpdir(), 'offsquare-holders-'));
  handOver(home);
});

afterEach(() => destroyCluster(home));

/** Another program of the same checkout, which holds the database until it is told to give it back. */
function otherProgram(then: string) {
  const source = `
    import { holdCluster, releaseCluster } from '${HOLDERS}';
    await holdCluster(${JSON.stringify(home)});
    console.log('holding');
    ${then}
  `;
  return spawn(process.execPath, ['--input-type=module', '-e', source], { stdio: ['pipe', 'pipe', 'inherit'] });
}

describe('holdCluster', () => {
  it('lets two programs start at the same moment and share one server', async () => {
    const other = otherProgram(
      `process.stdin.once('data', () => releaseCluster(${JSON.stringify(home)}).then(() => process.exit()));`,
    );
    const [url] = await Promise.all([holdCluster(home), once(other.stdout, 'data')]);
    expect(url).toMatch(/^postgres:/);

    expect(await releaseCluster(home)).toBe(false);
    expect(await clusterState(home)).toBe('running');

    other.stdin.write('enough\n');
    await once(other, 'close');
    expect(await clusterState(home)).toBe('stopped');
  });

  it('does not wait for a program that was killed while it held the database', async () => {
    const other = otherProgram('setInterval(() => {}, 1000);');
    await once(other.stdout, 'data');
    other.kill('SIGKILL');
    await once(other, 'close');

    await holdCluster(home);
    expect(await releaseCluster(home)).toBe(true);
    expect(await clusterState(home)).toBe('stopped');
  });
});

describe('scripts/pg.mjs', () => {
  it('names its commands when it is given none', () => {
    const script = path.resolve(__dirname, '../../../scripts/pg.mjs');
    const call = () =>
      execFileSync(process.execPath, [script], { env: { ...process.env, OFFSQUARE_DATA: home }, stdio: 'pipe' });
    expect(call).toThrow(/start\|stop\|status\|url\|destroy/);
  });
});
