/**
 * Keeps the page's own files on the device, so that a site opens where there is no signal. What belongs to people (everything
 * under /api/) is never touched here: the client keeps that itself, for the person signed in.
 */
const CACHE = 'polewright-files-1';
const MOST_FILES = 150;
/** Named by their content: one that is kept is right for ever. */
const NEVER_CHANGES = /^\/(?:_expo\/static|assets)\//;

self.addEventListener('install', (event) => {
  event.waitUntil(
    caches
      .open(CACHE)
      .then(async (cache) => cache.put('/', await fetch('/', { headers: { accept: 'text/html' } })))
      .then(() => self.skipWaiting()),
  );
});

self.addEventListener('activate', (event) => {
  event.waitUntil(
    caches
      .keys()
      .then((names) => Promise.all(names.filter((name) => name !== CACHE).map((name) => caches.delete(name))))
      .then(() => self.clients.claim()),
  );
});

/** The page names the files that it loaded before this worker stood in front of it. */
self.addEventListener('message', (event) => {
  if (!Array.isArray(event.data?.keep)) return;
  const ours = event.data.keep.filter((url) => {
    const { origin, pathname } = new URL(url, self.location.href);
    return origin === self.location.origin && NEVER_CHANGES.test(pathname);
  });
  event.waitUntil(keepAll(ours));
});

/** A script names the chunks it may fetch later: they are kept with it, whether or not they were needed yet. */
const CHUNKS = /"(\/_expo\/static\/[^"]+\.js)"/g;

async function keepAll(urls) {
  const cache = await caches.open(CACHE);
  const wanted = [...urls];
  const seen = new Set();
  for (let url = wanted.shift(); url !== undefined; url = wanted.shift()) {
    const { href, pathname } = new URL(url, self.location.href);
    if (seen.has(href)) continue;
    seen.add(href);
    if (!(await cache.match(href))) await cache.add(href).catch(() => {});
    const kept = pathname.endsWith('.js') ? await cache.match(href) : undefined;
    if (kept) for (const [, chunk] of (await kept.text()).matchAll(CHUNKS)) wanted.push(chunk);
  }
  // Files of older builds go first: they were kept first.
  const files = (await cache.keys()).filter((request) => NEVER_CHANGES.test(new URL(request.url).pathname));
  await Promise.all(files.slice(0, Math.max(0, files.length - MOST_FILES)).map((request) => cache.delete(request)));
}

self.addEventListener('fetch', (event) => {
  const { request } = event;
  const url = new URL(request.url);
  if (request.method !== 'GET' || url.origin !== self.location.origin || url.pathname.startsWith('/api/')) return;
  if (NEVER_CHANGES.test(url.pathname)) event.respondWith(keptFirst(request));
  else if (request.mode === 'navigate') event.respondWith(networkFirst(request, '/'));
  else event.respondWith(networkFirst(request, request));
});

async function keptFirst(request) {
  const cache = await caches.open(CACHE);
  const kept = await cache.match(request);
  if (kept) return kept;
  const fresh = await fetch(request);
  if (fresh.ok) await cache.put(request, fresh.clone());
  return fresh;
}

/** Fresh where there is signal; else what was kept under `name`. Every address shows the one page. */
async function networkFirst(request, name) {
  const cache = await caches.open(CACHE);
  try {
    const fresh = await fetch(request);
    if (fresh.ok) await cache.put(name, fresh.clone());
    return fresh;
  } catch (error) {
    const kept = await cache.match(name);
    if (kept) return kept;
    throw error;
  }
}
