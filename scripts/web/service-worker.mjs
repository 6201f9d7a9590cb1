// @ts-check
import { readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { contentHash, filesUnder } from './content-hash.mjs';

const VERSION_MARK = '__VERSION__';
const FILES_MARK = "'__FILES__'";

/** Kept for use without a signal: code, fonts and pictures of the app, and its one page. */
const KEPT = /^(_expo\/static\/|assets\/)|^(index\.html|register-sw\.js|logo\.svg|manifest\.webmanifest)$/;
/** The compressed twins are the server's affair, the solver runs on the server, and the router's own pictures are never shown. */
const LEFT_OUT = /\.(br|gz|map|wasm)$|^assets\/node_modules\/expo-router\//;

/**
 * Lists what the service worker fetches when it is installed.
 *
 * @param {string} dist - absolute folder of the exported app
 * @returns {string[]} addresses beginning with a slash
 */
export function filesToKeep(dist) {
  return filesUnder(dist, '.')
    .filter((file) => KEPT.test(file) && !LEFT_OUT.test(file))
    .map((file) => `/${file}`);
}

/**
 * Writes the list of files and a version made from their content into the exported service worker.
 *
 * @param {string} dist
 * @throws {Error} when the service worker has no place for them
 */
export function fillServiceWorker(dist) {
  const file = path.join(dist, 'sw.js');
  const source = readFileSync(file, 'utf8');
  for (const mark of [VERSION_MARK, FILES_MARK]) {
    if (source.split(mark).length !== 2) throw new Error(`public/sw.js must hold ${mark} exactly once`);
  }
  const keep = filesToKeep(dist);
  const version = contentHash(
    dist,
    keep.map((address) => address.slice(1)),
  ).slice(0, 16);
  writeFileSync(
    file,
    source.replace(VERSION_MARK, version).replace(FILES_MARK, () => JSON.stringify(keep).slice(1, -1)),
  );
}
