// @ts-check
import { accessSync, constants } from 'node:fs';
import path from 'node:path';

import { run } from './children.mjs';
import { diskFull, saysDiskFull, SetupProblem } from './problem.mjs';
import { step } from './steps.mjs';

/**
 * @typedef {object} DebianPackage
 * @property {string} name - as apt knows it
 * @property {() => boolean} present - whether what it brings is already here, from wherever
 * @property {string} [insteadOf] - what a person can do who cannot install it, 'set DATABASE_URL to a server you have'
 */

/**
 * Installs the packages that are missing. Root does so directly, others through sudo if it asks for no password.
 *
 * @param {readonly DebianPackage[]} packages
 */
export async function ensureDebianPackages(packages) {
  const missing = packages.filter((candidate) => !candidate.present());
  if (missing.length === 0) return;
  const names = missing.map(({ name }) => name);
  const asRoot = await rootPrefix();
  if (!asRoot) throw new SetupProblem(mayNotInstall(missing));
  await step(`Installing ${names.join(' and ')} from Debian's packages`, () => install(asRoot, names));
  const still = missing.filter((candidate) => !candidate.present());
  if (still.length > 0) {
    throw new SetupProblem(
      `${list(still)} is still not found after installing it: check that this is Debian or a relative of it.`,
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

/** @returns {Promise<string[] | null>} words to put before a command so that root runs it; null when we may not */
async function rootPrefix() {
  if (!onPath('apt-get')) return null;
  if (process.getuid?.() === 0) return [];
  if (!onPath('sudo')) return null;
  const { code } = await run('sudo', ['-n', 'true']);
  return code === 0 ? ['sudo', '-n'] : null;
}

/**
 * @param {readonly string[]} asRoot
 * @param {readonly string[]} names
 */
async function install(asRoot, names) {
  const first = await apt(asRoot, ['install', '-y', '--no-install-recommends', ...names]);
  if (first.code === 0) return;
  if (saysDiskFull(first.output)) throw diskFull('/');
  // A fresh machine has no package lists yet, and old lists name files that are gone.
  const update = await apt(asRoot, ['update']);
  const second = await apt(asRoot, ['install', '-y', '--no-install-recommends', ...names]);
  if (second.code === 0) return;
  const output = update.output + second.output;
  if (saysDiskFull(output)) throw diskFull('/');
  const said = output.match(/^E: .*$/m)?.[0] ?? `exit code ${second.code}`;
  throw new SetupProblem(
    `apt-get could not install ${names.join(' ')} (${said}): put that right, then run the same command again.`,
  );
}

/**
 * @param {readonly string[]} asRoot
 * @param {readonly string[]} args
 */
function apt(asRoot, args) {
  const [command, ...rest] = [
    ...asRoot,
    'env',
    'DEBIAN_FRONTEND=noninteractive',
    'apt-get',
    '-q',
    '-o',
    'DPkg::Lock::Timeout=120',
    ...args,
  ];
  return run(/** @type {string} */ (command), rest);
}

/** @param {readonly DebianPackage[]} missing */
function mayNotInstall(missing) {
  const names = missing.map(({ name }) => name).join(' ');
  const otherWay = missing.map(({ insteadOf }) => insteadOf).find(Boolean);
  return (
    `${list(missing)} is not installed and this user may not install it: ` +
    `run "sudo apt-get install -y --no-install-recommends ${names}"${otherWay ? `, or ${otherWay}` : ''}.`
  );
}

/** @param {readonly DebianPackage[]} packages */
function list(packages) {
  return packages.map(({ name }) => name).join(' and ');
}
