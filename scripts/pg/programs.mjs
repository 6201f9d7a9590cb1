// @ts-check
import { spawn } from 'node:child_process';
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';

import { onPath } from '../setup/debian-packages.mjs';
import { SetupProblem } from '../setup/problem.mjs';

const DEBIAN_FOLDER = '/usr/lib/postgresql';

/**
 * Finds the folder with PostgreSQL's server programs.
 *
 * @param {string | null} [major] - version that made the data, such as '15'; null takes the newest
 * @returns {string | null}
 */
export function serverPrograms(major = null) {
  const versions = existsSync(DEBIAN_FOLDER) ? readdirSync(DEBIAN_FOLDER) : [];
  const newestFirst = versions.filter((name) => /^\d+$/.test(name)).sort((a, b) => Number(b) - Number(a));
  for (const version of newestFirst) {
    const folder = path.join(DEBIAN_FOLDER, version, 'bin');
    if ((major === null || major === version) && existsSync(path.join(folder, 'initdb'))) return folder;
  }
  const initdb = onPath('initdb');
  return initdb && major === null ? path.dirname(initdb) : null;
}

/**
 * PostgreSQL refuses to run as root, so root hands it to the user that Debian's package made.
 *
 * @returns {{uid?: number, gid?: number}} nothing for an ordinary user, who runs it as himself
 * @throws {SetupProblem} when root has nobody to hand it to
 */
export function serverAccount() {
  if (process.getuid?.() !== 0) return {};
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((entry) => entry.startsWith('postgres:'));
  if (!line) {
    throw new SetupProblem(
      'PostgreSQL does not run as root and this machine has no user "postgres": install Debian\'s package postgresql, or start as an ordinary user.',
    );
  }
  const [, , uid, gid] = line.split(':');
  return { uid: Number(uid), gid: Number(gid) };
}

/**
 * Runs one of PostgreSQL's programs as the server's user. A signal sent to us does not reach it: these calls are short and leaving
 * one half done is worse than waiting.
 *
 * @param {string} program - absolute path
 * @param {readonly string[]} args
 * @param {{input?: string, silent?: boolean}} [options] `silent` for a program that leaves a server behind, which would hold our pipe open
 * @returns {Promise<{code: number, output: string}>}
 */
export function runServerProgram(program, args, { input, silent = false } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, {
      ...serverAccount(),
      // The server's user may not be able to enter the folder we were called from.
      cwd: '/',
      detached: true,
      // Nothing of ours: a PGDATA or PGPORT of the shell must not lead it to another cluster.
      env: { NODE_ENV: process.env.NODE_ENV, PATH: process.env.PATH, LC_ALL: 'C.UTF-8' },
      stdio: silent ? 'ignore' : [input === undefined ? 'ignore' : 'pipe', 'pipe', 'pipe'],
    });
    let output = '';
    for (const stream of [child.stdout, child.stderr]) {
      stream?.setEncoding('utf8').on('data', (text) => {
        output += text;
      });
    }
    // One that ends before it has read everything tells why by its output and exit code.
    child.stdin?.on('error', () => {}).end(input);
    child.once('error', reject);
    child.once(silent ? 'exit' : 'close', (code) => resolve({ code: code ?? 1, output }));
  });
}
