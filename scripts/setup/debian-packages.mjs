// @ts-check
import { accessSync, constants } from 'node:fs';
import path from 'node:path';

import { run } from './children.mjs';
import { diskFull, saysDiskFull, SetupProblem } from './problem.mjs';
import { step } from './steps.mjs';

/** Another apt at work, such as the nightly update, is waited for, s. */
const LOCK_PATIENCE = ['-o', 'DPkg::Lock::Timeout=120'];

/**
 * @typedef {object} DebianPackage
 * @property {string} name - as apt knows it
 * @property {() => boolean} present - whether what it brings is already here, from wherever
 * @property {string} [insteadOf] - what a person can do who cannot install it, 'set DATABASE_URL to a server you have'
 */

/**
 * What has to be known of the machine; tests give one of their own.
 *
 * @typedef {object} Machine
 * @property {number | undefined} uid - of the user, 0 for root
 * @property {(program: string) => string | null} find
 * @property {(command: string, args: readonly string[]) => Promise<import('./children.mjs').Ended>} run
 */

/** @type {Machine} */
const THIS_MACHINE = { uid: process.getuid?.(), find: onPath, run };

/**
 * Installs the packages that are missing. Root does so directly, others through sudo if it asks for no password.
 *
 * @param {readonly DebianPackage[]} packages
 * @param {Machine} [machine]
 * @throws {SetupProblem} when this user may not install, or apt-get cannot
 */
export async function ensureDebianPackages(packages, machine = THIS_MACHINE) {
  const missing = packages.filter((candidate) => !candidate.present());
  if (missing.length === 0) return;
  const names = missing.map(({ name }) => name);
  const asRoot = await rootPrefix(machine);
  if (!asRoot) throw new SetupProblem(mayNotInstall(missing));
  await step(`Installing ${names.join(' and ')} from Debian's packages`, () => install(machine, asRoot, names));
  const still = missing.filter((candidate) => !candidate.present());
  if (still.length > 0) {
    throw new SetupProblem(
      `Installing ${list(still)} did not bring what is needed: check that this is Debian or a relative of it.`,
    );
  }
}

/**
 * @param {string} program
 * @returns {string | null} its path, looked for as a shell would
 */
export function onPath(program) {
  for (const folder of (process.env.PATH ?? '').split(path.delimiter)) {
    const candidate = path.join(folder, program);
    try {
      accessSync(candidate, constants.X_OK);
      if (folder) return candidate;
    } catch {
      // Not in this folder.
    }
  }
  return null;
}

/**
 * @param {Machine} machine
 * @returns {Promise<string[] | null>} words to put before a command so that root runs it; null when we may not
 */
async function rootPrefix({ uid, find, run: runProgram }) {
  if (!find('apt-get')) return null;
  if (uid === 0) return [];
  if (!find('sudo')) return null;
  const { code } = await runProgram('sudo', ['-n', 'true']);
  return code === 0 ? ['sudo', '-n'] : null;
}

/**
 * @param {Machine} machine
 * @param {readonly string[]} asRoot
 * @param {readonly string[]} names
 */
async function install(machine, asRoot, names) {
  const apt = (/** @type {string[]} */ ...args) => {
    const words = [...asRoot, 'env', 'DEBIAN_FRONTEND=noninteractive', 'apt-get', '-q', ...LOCK_PATIENCE, ...args];
    return machine.run(/** @type {string} */ (words[0]), words.slice(1));
  };
  const first = await apt('install', '-y', '--no-install-recommends', ...names);
  if (first.code === 0) return;
  if (saysDiskFull(first.output)) throw diskFull('/');
  // A fresh machine has no package lists yet, and old lists name files that are gone.
  const update = await apt('update');
  const second = await apt('install', '-y', '--no-install-recommends', ...names);
  if (second.code === 0) return;
  const output = update.output + second.output;
  if (saysDiskFull(output)) throw diskFull('/');
  const said = output.match(/^E: .*$/m)?.[0] ?? `exit code ${second.code}`;
  throw new SetupProblem(
    `apt-get could not install ${names.join(' ')} (${said}): put that right, then run the same command again.`,
  );
}

/** @param {readonly DebianPackage[]} missing */
function mayNotInstall(missing) {
  const names = missing.map(({ name }) => name).join(' ');
  const otherWay = missing.map(({ insteadOf }) => insteadOf).find(Boolean);
  return (
    `This needs ${list(missing)} from Debian's packages, and this user may not install: ` +
    `run "sudo apt-get install -y --no-install-recommends ${names}"${otherWay ? `, or ${otherWay}` : ''}.`
  );
}

/** @param {readonly DebianPackage[]} packages */
function list(packages) {
  return packages.map(({ name }) => name).join(' and ');
}
