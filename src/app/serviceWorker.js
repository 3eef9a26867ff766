// Lets the page open again without a network. The build writes VERSION and FILES above this (see vite.config.ts).
// It takes over only once no page of the version before is open, so a page never mixes two versions.
/* global VERSION, FILES */

const CACHE = `steelyard ${VERSION}`;
/** Milliseconds after which a network that does not answer counts as none. */
const PATIENCE = 4000;

self.addEventListener('install', (event) => {
  event.waitUntil(caches.open(CACHE).then((cache) => cache.addAll(FILES)));
});

self.addEventListener('activate', (event) => {
  event.waitUntil(dropOthers());
});

self.addEventListener('fetch', (event) => {
  const { request } = event;
  if (request.method !== 'GET' || new URL(request.url).origin !== self.location.origin) return;
  event.respondWith(request.mode === 'navigate' ? fresh(request) : kept(request));
});

async function dropOthers() {
  const names = await caches.keys();
  const others = names.filter((name) => name.startsWith('steelyard ') && name !== CACHE);
  await Promise.all(others.map((name) => caches.delete(name)));
}

/** The page from the network, else as it was kept. */
async function fresh(request) {
  try {
    return await fetch(request, { signal: AbortSignal.timeout(PATIENCE) });
  } catch {
    const cache = await caches.open(CACHE);
    return (await cache.match('./index.html')) ?? Response.error();
  }
}

/** Files carry their content in their name, so a kept one is never stale. */
async function kept(request) {
  const cache = await caches.open(CACHE);
  return (await cache.match(request, { ignoreVary: true })) ?? fetch(request);
}
