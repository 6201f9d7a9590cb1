// Kept to what very old versions of Node.js can read, so that they are refused with a sentence, not a stack trace.
import path from 'path';
import { fileURLToPath } from 'url';

import { nodeVersionProblem } from './setup/node-version.mjs';

const problem = nodeVersionProblem(process.versions.node);
if (problem) {
  console.error(problem);
  process.exitCode = 1;
} else {
  const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '..');
  import('./checks/run-checks.mjs').then(({ runQuickChecks }) => runQuickChecks(root, process.argv.slice(2)));
}
