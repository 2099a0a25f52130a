/** Has the browser keep the page's own files, by the worker in `public/sw.js`; only what was built is worth keeping. */

/** Addresses of the scripts and typefaces that this page has loaded. */
function loadedFiles(): string[] {
  return performance
    .getEntriesByType('resource')
    .map(({ name }) => name)
    .filter((name) => name.startsWith(globalThis.location.origin));
}

async function tellLoaded(): Promise<void> {
  const registration = await navigator.serviceWorker.ready;
  registration.active?.postMessage({ keep: loadedFiles() });
}

/**
 * Starts keeping the page's files, and once `more` has come (code fetched ahead of need), those too. Browsers offer this on
 * https and the loopback only; elsewhere nothing happens.
 */
export function keepPageFiles(more: Promise<unknown>): void {
  if (process.env.NODE_ENV !== 'production' || !('serviceWorker' in navigator)) return;
  navigator.serviceWorker
    .register('/sw.js')
    .then(tellLoaded)
    .then(() => more)
    .then(tellLoaded)
    .catch(() => {
      // A browser may refuse; the page then needs signal to open.
    });
}
