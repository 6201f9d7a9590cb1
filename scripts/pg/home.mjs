// @ts-check
import { createHash } from 'node:crypto';
import { accessSync, chmodSync, chownSync, constants, existsSync, mkdirSync, realpathSync } from 'node:fs';
import path from 'node:path';

import { SetupProblem } from '../setup/problem.mjs';
import { serverAccount } from './programs.mjs';

const SYSTEM_FOLDER = '/var/lib/offsquare';
const NOT_WRITABLE = ['EACCES', 'EPERM', 'EROFS', 'ENOTDIR', 'ENOENT'];

/**
 * Decides where this checkout keeps what it must not lose, and makes the folder. Each checkout has its own.
 *
 * Root's goes under /var/lib, since the user that runs PostgreSQL can seldom enter the folders above a checkout of
 * root's. Others keep it with their own state, or inside the checkout when they have no home.
 *
 * @param {string} root - absolute path of the checkout
 * @param {Readonly<Record<string, string | undefined>>} environment - OFFSQUARE_DATA names a folder to use instead
 * @returns {string} absolute path
 * @throws {SetupProblem} when none of the places can be written
 */
export function stateFolder(root, environment) {
  const places = candidates(realpathSync(root), environment);
  const place = places.find(canKeep);
  if (place) return place;
  throw new SetupProblem(
    `There is no place for the data, since ${places.join(' and ')} cannot be written: set OFFSQUARE_DATA to a folder that can.`,
  );
}

/**
 * Makes the folder of the database cluster, private to the user that runs PostgreSQL.
 *
 * @param {string} state - see `stateFolder`
 * @returns {string} absolute path
 */
export function clusterHome(state) {
  const home = path.join(state, 'database');
  mkdirSync(home, { recursive: true });
  handOver(home);
  return home;
}

/**
 * Makes a folder private to the user that runs PostgreSQL.
 *
 * @param {string} folder
 */
export function handOver(folder) {
  chmodSync(folder, 0o700);
  const { uid, gid } = serverAccount();
  if (uid !== undefined && gid !== undefined) chownSync(folder, uid, gid);
}

/**
 * @param {string} root
 * @param {Readonly<Record<string, string | undefined>>} environment
 * @returns {string[]}
 */
function candidates(root, environment) {
  if (environment.OFFSQUARE_DATA) return [path.resolve(root, environment.OFFSQUARE_DATA)];
  const name = `${path.basename(root)}-${createHash('sha256').update(root).digest('hex').slice(0, 10)}`;
  if (process.getuid?.() === 0) return [path.join(SYSTEM_FOLDER, name)];
  const state = environment.XDG_STATE_HOME || (environment.HOME && path.join(environment.HOME, '.local/state'));
  const inside = path.join(root, '.data');
  return state ? [path.join(state, 'offsquare', name), inside] : [inside];
}

/** @param {string} place */
function canKeep(place) {
  try {
    makeFolder(place);
    accessSync(place, constants.W_OK | constants.X_OK);
    return true;
  } catch (error) {
    if (NOT_WRITABLE.includes(/** @type {NodeJS.ErrnoException} */ (error).code ?? '')) return false;
    throw error;
  }
}

/** @param {string} folder */
function makeFolder(folder) {
  if (existsSync(folder)) return;
  makeFolder(path.dirname(folder));
  mkdirSync(folder);
  // A strict umask would lock the user that runs PostgreSQL out of folders that root makes.
  chmodSync(folder, process.getuid?.() === 0 ? 0o755 : 0o700);
}
