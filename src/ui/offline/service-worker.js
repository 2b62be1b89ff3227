/**
 * Answers for the network when there is none. The build puts VERSION and FILES in front. The page itself comes from the network while
 * there is one; files whose names hold their fingerprint come from what was stored. A new version waits until the page asks for it.
 */

/* global VERSION, FILES */
const CACHE = `poleward ${VERSION}`;

self.addEventListener('install', event => {
  event.waitUntil(caches.open(CACHE).then(cache => cache.addAll(FILES)));
});

self.addEventListener('activate', event => {
  event.waitUntil(
    caches
      .keys()
      .then(names =>
        Promise.all(
          names.filter(name => name.startsWith('poleward ') && name !== CACHE).map(name => caches.delete(name)),
        ),
      )
      .then(() => self.clients.claim()),
  );
});

self.addEventListener('message', event => {
  if (event.data === 'take over') self.skipWaiting();
});

self.addEventListener('fetch', event => {
  const { request } = event;
  if (request.method !== 'GET' || !request.url.startsWith(self.registration.scope)) return;
  event.respondWith(request.mode === 'navigate' ? pageFor(request) : fileFor(request));
});

async function pageFor(request) {
  try {
    return await fetch(request);
  } catch {
    return (await caches.match('./')) ?? Response.error();
  }
}

async function fileFor(request) {
  return (await caches.match(request, { ignoreVary: true })) ?? fetch(request);
}
