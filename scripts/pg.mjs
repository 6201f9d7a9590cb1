// @ts-check
import path from 'node:path';
import { fileURLToPath } from 'node:url';

import { clusterState, clusterUrl, destroyCluster, startCluster, stopCluster } from './pg/cluster.mjs';
import { clusterHome, stateFolder } from './pg/home.mjs';
import { sentenceFor, SetupProblem } from './setup/problem.mjs';

const USAGE = 'Usage: node scripts/pg.mjs start|stop|status|url|destroy';
const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '..');

/**
 * The database of this checkout by hand; `npm start` does all of it by itself.
 *
 * @param {string | undefined} command
 * @param {string} home
 * @returns {Promise<string>} what to print
 */
async function perform(command, home) {
  switch (command) {
    case 'start':
      return (await startCluster(home)).url;
    case 'stop':
      return (await stopCluster(home)) ? 'stopped' : 'was not running';
    case 'status':
      return `${await clusterState(home)} in ${home}`;
    case 'url':
      return clusterUrl(home) ?? 'no database yet: run npm start';
    case 'destroy':
      await destroyCluster(home);
      return `deleted ${home}`;
    default:
      throw new SetupProblem(USAGE);
  }
}

async function main() {
  try {
    console.log(await perform(process.argv[2], clusterHome(stateFolder(root, process.env))));
  } catch (error) {
    console.error(sentenceFor(error, root));
    process.exitCode = 1;
  }
}

main();
