/**
 * Lets the app open without a signal: it keeps the app's own files and nothing else. What people type is kept by the
 * app itself; answers of the API and the customer's page are never stored here.
 *
 * The build writes the version, made from the content of the files, and the list of files.
 */
const VERSION = '__VERSION__';
const FILES = ['__FILES__'];

const PREFIX = 'offsquare-';
const CURRENT = PREFIX + VERSION;
const PAGE = '/index.html';
const NEVER = /^\/(api|view)(\/|$)/;

self.addEventListener('install', (event) => {
  event.waitUntil(keepFiles().then(() => self.skipWaiting()));
});

self.addEventListener('activate', (event) => {
  event.waitUntil(forgetOldFiles().then(() => self.clients.claim()));
});

self.addEventListener('fetch', (event) => {
  const { request } = event;
  const { origin, pathname } = new URL(request.url);
  if (request.method !== 'GET' || origin !== self.location.origin || NEVER.test(pathname)) return;
  if (request.mode === 'navigate') event.respondWith(keptOr(PAGE, request));
  else if (FILES.includes(pathname) || pathname.startsWith('/_expo/')) event.respondWith(keptOr(pathname, request));
});

async function keepFiles() {
  const cache = await caches.open(CURRENT);
  // 'no-cache' asks the server again, so that a version is never made of yesterday's page and today's code.
  await cache.addAll(FILES.map((file) => new Request(file, { cache: file === PAGE ? 'no-cache' : 'default' })));
}

/** The version before stays: a page that is still open may yet load a part of it. */
async function forgetOldFiles() {
  const ours = (await caches.keys()).filter((name) => name.startsWith(PREFIX) && name !== CURRENT);
  await Promise.all(ours.slice(0, -1).map((name) => caches.delete(name)));
}

/** From this version, else from the one before, else from the network. */
async function keptOr(path, request) {
  const current = await (await caches.open(CURRENT)).match(path);
  return current ?? (await caches.match(path)) ?? fetch(request);
}
