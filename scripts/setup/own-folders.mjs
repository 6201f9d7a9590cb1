// @ts-check
import { accessSync, constants, mkdirSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

/**
 * A folder for what may be lost, of this user alone: under a name that all users share only the first could write.
 *
 * @param {string} purpose - part of its name
 * @returns {string} absolute path of a folder that exists
 */
export function temporaryFolder(purpose) {
  const folder = path.join(os.tmpdir(), `offsquare-${purpose}-${process.getuid?.() ?? 'user'}`);
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  return folder;
}

/**
 * The environment for programs that keep caches in the user's home. Users that exist for a service have none that
 * can be written; they get a temporary one.
 *
 * @param {NodeJS.ProcessEnv} [environment]
 * @returns {NodeJS.ProcessEnv}
 */
export function withHome(environment = process.env) {
  if (environment.HOME && canWrite(environment.HOME)) return environment;
  const home = temporaryFolder('home');
  return { ...environment, HOME: home, npm_config_cache: path.join(home, '.npm') };
}

/** @param {string} folder */
function canWrite(folder) {
  try {
    accessSync(folder, constants.W_OK | constants.X_OK);
    return true;
  } catch {
    return false;
  }
}
