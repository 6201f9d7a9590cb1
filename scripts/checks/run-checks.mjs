// @ts-check
import { sweepThrowaways } from '../pg/throwaway.mjs';
import { passSignalsOn } from '../setup/children.mjs';
import { ensureDebianPackages } from '../setup/debian-packages.mjs';
import { exitCodeFor, Interrupted, sentenceFor } from '../setup/problem.mjs';
import { ensureNpmPackages } from '../setup/npm-packages.mjs';
import { CHROMIUM, POPPLER, POSTGRESQL } from '../setup/required-packages.mjs';
import { buildWebApp } from '../web/build.mjs';
import { runJest } from './jest-run.mjs';
import { runStaticChecks } from './static-checks.mjs';

/**
 * `npm test`: sets up what is missing, then every check and every test. Sets the exit code.
 *
 * @param {string} root - absolute path of the checkout
 * @param {readonly string[]} args - file names and options for Jest
 */
export function runEverything(root, args) {
  return closing(root, async () => {
    await ensureNpmPackages(root);
    await ensureDebianPackages([POSTGRESQL, CHROMIUM, POPPLER]);
    await buildWebApp(root);
    const checks = await runStaticChecks(root);
    const tests = await runJest(root, args);
    return [checks, tests];
  });
}

/**
 * `npm run check`: what needs neither a database nor a browser. Sets the exit code.
 *
 * @param {string} root
 * @param {readonly string[]} args - file names and options for Jest
 */
export function runQuickChecks(root, args) {
  return closing(root, async () => {
    await ensureNpmPackages(root);
    const checks = await runStaticChecks(root);
    const tests = await runJest(root, ['--selectProjects', 'unit', ...args]);
    return [checks, tests];
  });
}

/**
 * Ends with one line that says how many passed and failed, or with the sentence that says why there is none.
 *
 * @param {string} root
 * @param {() => Promise<import('./static-checks.mjs').Count[]>} work
 */
async function closing(root, work) {
  passSignalsOn();
  try {
    const counts = await work();
    const passed = counts.reduce((sum, count) => sum + count.passed, 0);
    const failed = counts.reduce((sum, count) => sum + count.failed, 0);
    process.exitCode = failed === 0 && passed > 0 ? 0 : 1;
    console.log(`\n${passed} passed, ${failed} failed`);
  } catch (error) {
    process.exitCode = exitCodeFor(error);
    if (!(error instanceof Interrupted)) console.error(sentenceFor(error, root));
    // Jest had no time to delete its database.
    await sweepThrowaways();
  }
}
