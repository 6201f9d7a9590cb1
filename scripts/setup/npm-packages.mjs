// @ts-check
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, rmSync, statfsSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { run } from './children.mjs';
import { withHome } from './own-folders.mjs';
import { diskFull, saysDiskFull, SetupProblem } from './problem.mjs';
import { step } from './steps.mjs';

/** npm's own list of what it has put into node_modules. */
const RECORD = 'node_modules/.package-lock.json';
/** Room for all packages of the lock file with a little to spare. */
const NEEDED_MB = 1_000;
const STAMP = 'node_modules/.offsquare-lock';

/**
 * Installs the packages of the lock file unless node_modules already holds them.
 *
 * @param {string} root - absolute path of the checkout
 */
export async function ensureNpmPackages(root) {
  const wanted = lockHash(root);
  const stamp = path.join(root, STAMP);
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return;
  if (!installedByLock(root)) await step('Installing npm packages from the lock file', () => install(root));
  try {
    writeFileSync(stamp, wanted);
  } catch {
    // Somebody else's checkout: without the note the next start compares the two lists again, which is quick.
  }
}

/**
 * @param {string} root
 * @returns {string} changes whenever the lock file does
 */
function lockHash(root) {
  return createHash('sha256')
    .update(readFileSync(path.join(root, 'package-lock.json')))
    .digest('hex');
}

/**
 * npm keeps its own record of what it has put into node_modules; where it agrees with the lock, nothing is missing.
 *
 * @param {string} root
 */
export function installedByLock(root) {
  const record = path.join(root, RECORD);
  if (!existsSync(record)) return false;
  const wanted = packagesOf(path.join(root, 'package-lock.json'));
  const present = packagesOf(record);
  return Object.entries(wanted).every(
    ([name, entry]) => name === '' || entry.optional || entry.link || present[name]?.version === entry.version,
  );
}

/**
 * @param {string} file
 * @returns {Record<string, {version?: string, optional?: boolean, link?: boolean}>}
 */
function packagesOf(file) {
  return JSON.parse(readFileSync(file, 'utf8')).packages ?? {};
}

/** @param {string} root */
async function install(root) {
  refuseWithoutSpace(root);
  // Under `npm start` npm says where it is itself, which is right even when PATH is not.
  const script = process.env.npm_execpath;
  const [command, first] = script ? [process.execPath, [script]] : ['npm', []];
  const { code, output } = await run(command, [...first, 'ci', '--no-audit', '--no-fund'], {
    cwd: root,
    env: withHome(),
  });
  // npm only warns of files that it could not write for want of space, and calls that a success.
  const full = saysDiskFull(output);
  if (code === 0 && !full) return;
  // What it says it has installed is not to be believed at the next start.
  rmSync(path.join(root, RECORD), { force: true });
  if (full) throw diskFull(root);
  if (/EACCES|EPERM/.test(output)) {
    const place = /npm error path (.+)/.exec(output)?.[1] ?? root;
    throw new SetupProblem(
      `npm may not write to ${place}: give this user the right to write there, or use a checkout of your own.`,
    );
  }
  if (/ENOTFOUND|EAI_AGAIN|ECONNREFUSED|ETIMEDOUT|ECONNRESET/.test(output)) {
    throw new SetupProblem(
      'The npm registry cannot be reached: check the network and "npm config get registry", then run the same command again.',
    );
  }
  throw new SetupProblem(`npm could not install the packages: ${lastLines(output)}`);
}

/**
 * On a full disk npm tries each of its thousand packages in vain for minutes before it ends.
 *
 * @param {string} root
 */
function refuseWithoutSpace(root) {
  const { bavail, bsize, blocks } = statfsSync(root);
  const freeMb = Math.floor((bavail * bsize) / 1e6);
  // Some network disks do not say how large they are.
  if (blocks === 0 || freeMb >= NEEDED_MB) return;
  throw new SetupProblem(
    `The npm packages need ${NEEDED_MB} MB and the disk that holds ${root} has ${freeMb} MB left: free some space there, then run the same command again.`,
  );
}

/** @param {string} output */
function lastLines(output) {
  return output.trim().split('\n').slice(-6).join('\n');
}
