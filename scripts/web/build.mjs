// @ts-check
import { existsSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { run } from '../setup/children.mjs';
import { temporaryFolder, withHome } from '../setup/own-folders.mjs';
import { diskFull, saysDiskFull, SetupProblem } from '../setup/problem.mjs';
import { step } from '../setup/steps.mjs';
import { compressTwins } from './compress.mjs';
import { contentHash, WEB_SOURCES } from './content-hash.mjs';
import { fillServiceWorker } from './service-worker.mjs';

const HASH_FILE = '.build-hash';

/**
 * @param {string} root - absolute path of the checkout
 * @returns {boolean} whether dist/ was built from other sources than those here now
 */
export function webAppIsStale(root) {
  const file = path.join(root, 'dist', HASH_FILE);
  return !existsSync(file) || readFileSync(file, 'utf8') !== contentHash(root, WEB_SOURCES);
}

/**
 * Builds the web app into dist/ unless it is there and fresh. What was there stays until the new one is whole.
 *
 * @param {string} root
 * @throws {SetupProblem} with what the bundler said when it refuses the sources
 */
export async function buildWebApp(root) {
  if (!webAppIsStale(root)) return;
  const fresh = path.join(root, '.expo', `web-build-${process.pid}`);
  try {
    // Taken first: a file saved during the build must make the result stale.
    const hash = contentHash(root, WEB_SOURCES);
    await step('Building the web app', async () => {
      await exportApp(root, fresh);
      fillServiceWorker(fresh);
      await compressTwins(fresh);
    });
    writeFileSync(path.join(fresh, HASH_FILE), hash);
    replaceFolder(path.join(root, 'dist'), fresh);
  } finally {
    rmSync(fresh, { recursive: true, force: true });
  }
}

/**
 * @param {string} root
 * @param {string} folder
 */
async function exportApp(root, folder) {
  const expo = path.join(root, 'node_modules/expo/bin/cli');
  const { code, output } = await run(process.execPath, [expo, 'export', '-p', 'web', '--output-dir', folder], {
    cwd: root,
    env: {
      ...withHome(),
      NODE_ENV: 'production',
      CI: '1',
      EXPO_NO_TELEMETRY: '1',
      EXPO_OFFLINE: '1',
      // The bundler's cache lies here.
      TMPDIR: temporaryFolder('build'),
    },
  });
  if (code === 0) return;
  if (saysDiskFull(output)) throw diskFull(root);
  throw new SetupProblem(`The web app could not be built:\n${output.trim().split('\n').slice(-30).join('\n')}`);
}

/**
 * @param {string} place
 * @param {string} fresh - folder that takes the place
 */
function replaceFolder(place, fresh) {
  const old = `${fresh}-old`;
  if (existsSync(place)) renameSync(place, old);
  renameSync(fresh, place);
  rmSync(old, { recursive: true, force: true });
}
