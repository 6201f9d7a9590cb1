// @ts-check
import { existsSync, mkdtempSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

import { destroyCluster, startCluster } from './cluster.mjs';
import { handOver } from './home.mjs';

const PREFIX = 'offsquare-test-pg-';
/** A folder without an owner's note that is older than this was left by a run that died while making it, ms. */
const ABANDONED_MS = 3_600_000;

/**
 * Starts a cluster that lives as long as one test run.
 *
 * @returns {Promise<{home: string, url: string}>} hand `home` to `stopThrowaway` at the end
 */
export async function startThrowaway() {
  await sweepThrowaways();
  const home = mkdtempSync(path.join(temporaryFolder(), PREFIX));
  handOver(home);
  writeFileSync(path.join(home, 'owner'), String(process.pid));
  try {
    const { url } = await startCluster(home, { throwaway: true });
    return { home, url };
  } catch (error) {
    await destroyCluster(home);
    throw error;
  }
}

/** @param {string} home */
export async function stopThrowaway(home) {
  await destroyCluster(home);
}

/** Removes clusters of test runs that were killed before they could do it themselves. */
export async function sweepThrowaways() {
  for (const name of readdirSync(temporaryFolder())) {
    if (!name.startsWith(PREFIX)) continue;
    const home = path.join(temporaryFolder(), name);
    try {
      if (abandoned(home)) await destroyCluster(home);
    } catch (error) {
      // Another user's run: it is neither ours to look at nor to remove.
      const { code } = /** @type {NodeJS.ErrnoException} */ (error);
      if (code !== 'EACCES' && code !== 'EPERM' && code !== 'ENOENT') throw error;
    }
  }
}

/** @param {string} home */
function abandoned(home) {
  const note = path.join(home, 'owner');
  readdirSync(home);
  if (!existsSync(note)) return Date.now() - statSync(home).mtimeMs > ABANDONED_MS;
  return !existsSync(`/proc/${readFileSync(note, 'utf8')}`);
}

/**
 * The server's user must be able to enter it, which a private TMPDIR of root's would not let him.
 */
function temporaryFolder() {
  return process.getuid?.() === 0 ? '/tmp' : os.tmpdir();
}
