import { useSyncExternalStore } from 'react';

function watch(changed: () => void): () => void {
  globalThis.addEventListener('online', changed);
  globalThis.addEventListener('offline', changed);
  return () => {
    globalThis.removeEventListener('online', changed);
    globalThis.removeEventListener('offline', changed);
  };
}

/** What the browser says of the network: false is certain, true only means that there is one. */
export function isOnline(): boolean {
  return globalThis.navigator?.onLine ?? true;
}

/** Whether there is a network, as it comes and goes. */
export function useOnline(): boolean {
  return useSyncExternalStore(watch, isOnline, () => true);
}
