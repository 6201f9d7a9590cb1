// @ts-check
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';

import { SetupProblem } from '../setup/problem.mjs';
import { startCluster, stopCluster } from './cluster.mjs';

const LOCK_TRIES = 600;
const LOCK_PAUSE_MS = 200;

/**
 * Starts the cluster of a home folder and notes that this process uses it, so that of two programs started from one
 * checkout the first to end does not take the database away from the other.
 *
 * @param {string} home
 * @returns {Promise<string>} the database's address
 */
export function holdCluster(home) {
  return locked(home, async () => {
    const { url } = await startCluster(home);
    mkdirSync(holders(home), { recursive: true });
    writeFileSync(path.join(holders(home), String(process.pid)), '');
    return url;
  });
}

/**
 * Gives the cluster back; the last one to do so stops it.
 *
 * @param {string} home
 * @returns {Promise<boolean>} true when it was stopped now
 */
export function releaseCluster(home) {
  return locked(home, async () => {
    rmSync(path.join(holders(home), String(process.pid)), { force: true });
    for (const name of readdirSync(holders(home))) {
      if (isAlive(name)) return false;
      rmSync(path.join(holders(home), name), { force: true });
    }
    return stopCluster(home);
  });
}

/** @param {string} home */
function holders(home) {
  return path.join(home, 'holders');
}

/** @param {string} pid */
function isAlive(pid) {
  return existsSync(`/proc/${pid}`);
}

/**
 * Lets one process at a time start or stop the cluster.
 *
 * @template T
 * @param {string} home
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
async function locked(home, work) {
  const lock = path.join(home, 'lock');
  for (let tries = 1; !take(lock); tries += 1) {
    if (tries === LOCK_TRIES) {
      throw new SetupProblem(`Another start has been busy with ${home} for two minutes: end it, or delete ${lock}.`);
    }
    await sleep(LOCK_PAUSE_MS);
  }
  try {
    return await work();
  } finally {
    rmSync(lock, { force: true });
  }
}

/** @param {string} lock */
function take(lock) {
  try {
    writeFileSync(lock, String(process.pid), { flag: 'wx' });
    return true;
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EEXIST') throw error;
    const owner = existsSync(lock) ? readFileSync(lock, 'utf8') : '';
    if (owner !== '' && !isAlive(owner)) rmSync(lock, { force: true });
    return false;
  }
}
