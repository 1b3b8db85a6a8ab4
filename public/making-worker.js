/* Keeps the pages of a making, and what they are made of, for when there is no connection. */
const KEPT = 'ellwise-making';
const PAGE = /^\/blankets\/[^/]+\/making$/;
const PART = /^\/_astro\//;

self.addEventListener('install', () => self.skipWaiting());
self.addEventListener('activate', (event) => event.waitUntil(self.clients.claim()));

self.addEventListener('message', (event) => {
  const { keep } = event.data ?? {};
  if (!Array.isArray(keep)) return;
  event.waitUntil(
    caches.open(KEPT).then((cache) =>
      // One part that cannot be had must not keep the others out.
      Promise.allSettled(keep.map((address) => cache.add(address))),
    ),
  );
});

self.addEventListener('fetch', (event) => {
  const { request } = event;
  const { origin, pathname } = new URL(request.url);
  if (request.method !== 'GET' || origin !== self.location.origin) return;
  if (PART.test(pathname)) event.respondWith(keptOrFetched(request));
  else if (request.mode === 'navigate' && PAGE.test(pathname)) {
    event.respondWith(fetchedOrKept(request));
  }
});

/** Parts carry a hash of their content in their name: what is kept is right for ever. */
async function keptOrFetched(request) {
  const cache = await caches.open(KEPT);
  const kept = await cache.match(request);
  if (kept) return kept;
  const answer = await fetch(request);
  if (answer.ok) await cache.put(request, answer.clone());
  return answer;
}

async function fetchedOrKept(request) {
  const cache = await caches.open(KEPT);
  try {
    const answer = await fetch(request);
    // Not a redirect to signing in, nor an error page.
    if (answer.ok && !answer.redirected) await cache.put(request, answer.clone());
    return answer;
  } catch (error) {
    const kept = await cache.match(request);
    if (kept) return kept;
    throw error;
  }
}
