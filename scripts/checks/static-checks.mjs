// @ts-check
import { existsSync } from 'node:fs';
import path from 'node:path';

import { run } from '../setup/children.mjs';
import { step, took } from '../setup/steps.mjs';

/** Folders whose imports have a direction; package.json's `directions` names the same ones. */
const FOLDERS = ['app', 'components', 'geometry', 'shared', 'server', 'migrations', 'seeds'];

/**
 * @typedef {object} Count
 * @property {number} passed
 * @property {number} failed
 *
 * @typedef {object} Check
 * @property {string} title
 * @property {string} program - inside node_modules
 * @property {readonly string[]} args
 */

/**
 * Checks types, lint, import directions and formatting, all at once, and says what each found.
 *
 * @param {string} root - absolute path of the checkout
 * @returns {Promise<Count>}
 */
export async function runStaticChecks(root) {
  const results = await step(
    'Types, lint, import directions and format',
    () => Promise.all(checksOf(root).map((check) => runCheck(root, check))),
    (ended) => (ended.every(({ code }) => code === 0) ? 'passed' : 'failed'),
  );
  for (const { title, code, output, time } of results) {
    console.log(`  ${title}: ${code === 0 ? 'passed' : 'failed'} in ${time}`);
    if (code !== 0) console.log(output.trimEnd());
  }
  const passed = results.filter(({ code }) => code === 0).length;
  return { passed, failed: results.length - passed };
}

/**
 * @param {string} root
 * @returns {Check[]}
 */
function checksOf(root) {
  const folders = FOLDERS.filter((folder) => existsSync(path.join(root, folder)));
  return [
    { title: 'Types', program: 'typescript/bin/tsc', args: ['--noEmit'] },
    { title: 'Lint', program: 'eslint/bin/eslint.js', args: ['.', '--max-warnings=0'] },
    {
      title: 'Import directions',
      program: 'dependency-cruiser/bin/dependency-cruise.mjs',
      args: [...folders, '--config', '.dependency-cruiser.cjs'],
    },
    { title: 'Format', program: 'prettier/bin/prettier.cjs', args: ['--check', '.'] },
  ];
}

/**
 * @param {string} root
 * @param {Check} check
 */
async function runCheck(root, { title, program, args }) {
  const began = Date.now();
  const { code, output } = await run(process.execPath, [path.join(root, 'node_modules', program), ...args], {
    cwd: root,
  });
  return { title, code, output, time: took(began) };
}
