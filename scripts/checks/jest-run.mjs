// @ts-check
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

import { run } from '../setup/children.mjs';

/**
 * Runs the tests and shows what Jest says while it works.
 *
 * @param {string} root - absolute path of the checkout
 * @param {readonly string[]} args - file names and options for Jest
 * @returns {Promise<import('./static-checks.mjs').Count>} a file that could not be run at all counts as one failed test
 */
export async function runJest(root, args) {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'offsquare-results-'));
  try {
    const results = path.join(folder, 'results.json');
    const jest = path.join(root, 'node_modules/jest/bin/jest.js');
    const { code } = await run(
      process.execPath,
      [jest, '--maxWorkers=2', '--json', `--outputFile=${results}`, ...args],
      { cwd: root, env: { ...process.env, NODE_ENV: 'test' }, show: true },
    );
    return countResults(existsSync(results) ? readFileSync(results, 'utf8') : null, code);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/**
 * @param {string | null} json - what Jest wrote; null when it ended before it could
 * @param {number} code - Jest's exit code
 * @returns {import('./static-checks.mjs').Count}
 */
export function countResults(json, code) {
  if (json === null) return { passed: 0, failed: 1 };
  const { numPassedTests, numFailedTests, numRuntimeErrorTestSuites } = JSON.parse(json);
  const failed = numFailedTests + numRuntimeErrorTestSuites;
  // Jest also fails for reasons that are no test's, such as a teardown that threw or no file that matches.
  return { passed: numPassedTests, failed: failed === 0 && code !== 0 ? 1 : failed };
}
