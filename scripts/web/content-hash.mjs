// @ts-check
import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';

/** Everything the web app is made from; what is not there yet is skipped. */
export const WEB_SOURCES = [
  'app',
  'assets',
  'components',
  'geometry',
  'public',
  'shared',
  'scripts/web',
  'app.json',
  'babel.config.js',
  'metro.config.js',
  'package-lock.json',
  'tsconfig.json',
];

/**
 * Names the content of files and folders: the same bytes under the same names give the same text, whatever the dates.
 *
 * @param {string} root - absolute folder
 * @param {readonly string[]} names - files and folders inside it
 * @returns {string} 64 hexadecimal digits
 */
export function contentHash(root, names) {
  const hash = createHash('sha256');
  for (const file of names.flatMap((name) => filesUnder(root, name))) {
    const bytes = readFileSync(path.join(root, file));
    hash.update(`${file}\0${bytes.length}\0`).update(bytes);
  }
  return hash.digest('hex');
}

/**
 * Lists files, in an order that does not depend on the disk.
 *
 * @param {string} root
 * @param {string} name - file or folder inside root
 * @returns {string[]} paths from root with forward slashes
 */
export function filesUnder(root, name) {
  const full = path.join(root, name);
  if (!existsSync(full)) return [];
  if (!statSync(full).isDirectory()) return [name];
  return readdirSync(full)
    .sort()
    .flatMap((entry) => filesUnder(root, path.posix.join(name, entry)));
}
