// @ts-check
import { existsSync } from 'node:fs';
import path from 'node:path';

import { run } from '../setup/children.mjs';
import { step } from '../setup/steps.mjs';

/** Folders whose imports have a direction; package.json's `directions` names the same ones. */
const FOLDERS = ['app', 'components', 'geometry', 'shared', 'server', 'migrations', 'seeds'];

/**
 * @typedef {object} Count
 * @property {number} passed
 * @property {number} failed
 */

/**
 * Checks types, lint, import directions and formatting, all of them whatever the first ones say.
 *
 * @param {string} root - absolute path of the checkout
 * @returns {Promise<Count>}
 */
export async function runStaticChecks(root) {
  const folders = FOLDERS.filter((folder) => existsSync(path.join(root, folder)));
  const checks = [
    { title: 'Types', program: 'typescript/bin/tsc', args: ['--noEmit'] },
    { title: 'Lint', program: 'eslint/bin/eslint.js', args: ['.', '--max-warnings=0'] },
    {
      title: 'Import directions',
      program: 'dependency-cruiser/bin/dependency-cruise.mjs',
      args: [...folders, '--config', '.dependency-cruiser.cjs'],
    },
    { title: 'Format', program: 'prettier/bin/prettier.cjs', args: ['--check', '.'] },
  ];
  const count = { passed: 0, failed: 0 };
  for (const { title, program, args } of checks) {
    const passed = await runCheck(root, title, [path.join(root, 'node_modules', program), ...args]);
    count[passed ? 'passed' : 'failed'] += 1;
  }
  return count;
}

/**
 * @param {string} root
 * @param {string} title
 * @param {readonly string[]} args - of Node.js
 * @returns {Promise<boolean>}
 */
async function runCheck(root, title, args) {
  const { code, output } = await step(
    title,
    () => run(process.execPath, args, { cwd: root }),
    (ended) => (ended.code === 0 ? 'passed' : 'failed'),
  );
  if (code !== 0) console.log(output.trimEnd());
  return code === 0;
}
