// @ts-check
import path from 'node:path';
import { fileURLToPath } from 'node:url';

import { passSignalsOn } from './setup/children.mjs';
import { sentenceFor } from './setup/problem.mjs';
import { buildWebApp, webAppIsStale } from './web/build.mjs';

/** Builds dist/ by hand; `npm start` and `npm test` do so when it is stale. */
const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '..');

passSignalsOn();
if (!webAppIsStale(root)) console.log('The web app is up to date.');
buildWebApp(root).catch((error) => {
  console.error(sentenceFor(error, root));
  process.exitCode = 1;
});
