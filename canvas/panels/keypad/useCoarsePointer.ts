import { useSyncExternalStore } from 'react';

const QUERY = '(pointer: coarse)';

function watch(changed: () => void): () => void {
  const list = globalThis.matchMedia?.(QUERY);
  list?.addEventListener('change', changed);
  return () => list?.removeEventListener('change', changed);
}

/** True where the first way of pointing is a finger: lengths are then entered on the tape keypad. */
export function useCoarsePointer(): boolean {
  return useSyncExternalStore(
    watch,
    () => globalThis.matchMedia?.(QUERY).matches ?? false,
    () => false,
  );
}
