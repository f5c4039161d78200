// Keeps the served page for use without a network. The build writes the list of files and their
// version in place of these two names, so a change of any file is a change of this script too.
/* global OFFLINE_FILES, OFFLINE_VERSION */

const worker = /** @type {ServiceWorkerGlobalScope} */ (/** @type {unknown} */ (self));

/** The scope is in the name because two copies may live at one origin in different folders. */
const PREFIX = `shiftgauge ${worker.registration.scope} `;
const CACHE = PREFIX + OFFLINE_VERSION;

worker.addEventListener('install', (event) => event.waitUntil(fill()));
worker.addEventListener('activate', (event) => event.waitUntil(dropOldCaches()));
worker.addEventListener('message', (event) => {
  if (event.data === 'take over') worker.skipWaiting();
});
worker.addEventListener('fetch', (event) => {
  const { method, url } = event.request;
  if (method === 'GET' && url.startsWith(worker.registration.scope)) {
    event.respondWith(answer(event.request));
  }
});

/** All files or none, each past the browser's own cache, so that no two versions are mixed. */
async function fill() {
  const cache = await caches.open(CACHE);
  await cache.addAll(OFFLINE_FILES.map((name) => new Request(name, { cache: 'reload' })));
}

async function dropOldCaches() {
  for (const name of await caches.keys()) {
    if (name.startsWith(PREFIX) && name !== CACHE) await caches.delete(name);
  }
  await worker.clients.claim();
}

/** @param {Request} request */
async function answer(request) {
  const cache = await caches.open(CACHE);
  const folder = request.url.split(/[?#]/)[0] === worker.registration.scope;
  const kept = await cache.match(folder ? 'index.html' : request, { ignoreSearch: true });
  return kept ?? fetch(request);
}
