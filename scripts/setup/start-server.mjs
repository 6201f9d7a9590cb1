// @ts-check
import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { buildWebApp, webAppIsStale } from '../web/build.mjs';
import { clusterHome, stateFolder } from '../pg/home.mjs';
import { holdCluster, releaseCluster } from '../pg/holders.mjs';
import { checkStopped, passSignalsOn, run, runUntilStopped } from './children.mjs';
import { ensureDebianPackages } from './debian-packages.mjs';
import { ensureNpmPackages } from './npm-packages.mjs';
import { exitCodeFor, Interrupted, sentenceFor, SetupProblem } from './problem.mjs';
import { POSTGRESQL } from './required-packages.mjs';
import { step } from './steps.mjs';

const SERVER = ['--import', 'tsx', 'server/index.ts'];

/**
 * `npm start`: sets up what is missing, then runs the server until it is stopped. Sets the exit code.
 *
 * @param {string} root - absolute path of the checkout
 */
export async function startServer(root) {
  passSignalsOn();
  try {
    loadSettingsFile(root);
    await ensureNpmPackages(root);
    const environment = withoutEmpty({ ...process.env, NODE_ENV: process.env.NODE_ENV || 'production' });
    environment.TOKEN_SECRET ??= keptSecret(stateFolder(root, environment));
    process.exitCode = environment.DATABASE_URL
      ? await serve(root, environment)
      : await serveWithOwnDatabase(root, environment);
  } catch (error) {
    process.exitCode = exitCodeFor(error);
    if (!(error instanceof Interrupted)) console.error(sentenceFor(error, root));
  }
}

/**
 * @param {string} root
 * @param {NodeJS.ProcessEnv} environment
 */
async function serveWithOwnDatabase(root, environment) {
  await ensureDebianPackages([POSTGRESQL]);
  checkStopped();
  const home = clusterHome(stateFolder(root, environment));
  const url = await step('Starting the database', () => holdCluster(home));
  try {
    return await serve(root, { ...environment, DATABASE_URL: url });
  } finally {
    const stopped = await releaseCluster(home);
    if (stopped) console.log('The database is stopped; its data stays.');
  }
}

/**
 * @param {string} root
 * @param {NodeJS.ProcessEnv} environment
 * @returns {Promise<number>} the server's exit code
 */
async function serve(root, environment) {
  checkStopped();
  if (webAppIsStale(root)) {
    // A wrong setting is better told now than after the minute that the build takes.
    const check = await run(process.execPath, [...SERVER, '--check'], { cwd: root, env: environment, show: true });
    if (check.code !== 0) return check.code;
    await buildWebApp(root);
  }
  const { code } = await runUntilStopped(process.execPath, SERVER, { cwd: root, env: environment });
  return code;
}

/**
 * Settings may be kept in a file `.env`; what the shell gives goes before it.
 *
 * @param {string} root
 */
function loadSettingsFile(root) {
  const file = path.join(root, '.env');
  if (existsSync(file)) process.loadEnvFile(file);
}

/**
 * Signs people in across restarts, so it is made once and kept where only this user can read it.
 *
 * @param {string} state
 */
function keptSecret(state) {
  const file = path.join(state, 'token-secret');
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('hex'), { mode: 0o600 });
  const secret = readFileSync(file, 'utf8');
  if (secret.length < 64)
    throw new SetupProblem(`${file} is damaged: delete it and start again; people will have to sign in anew.`);
  return secret;
}

/**
 * @param {NodeJS.ProcessEnv} environment
 * @returns {NodeJS.ProcessEnv} without the names that were given no value
 */
function withoutEmpty(environment) {
  const given = Object.entries(environment).filter(([, value]) => value !== '');
  return /** @type {NodeJS.ProcessEnv} */ (Object.fromEntries(given));
}
