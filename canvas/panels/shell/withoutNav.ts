import { useEffect, useSyncExternalStore } from 'react';

/** How many screens ask for the bottom bar's room: while drawing on a phone, the tools sit there instead. */
let asking = 0;
const listeners = new Set<() => void>();

function change(by: number) {
  asking += by;
  for (const listener of listeners) listener();
}

function watch(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** Takes the phone's bottom bar away while `active`, and gives it back after. A side rail stays. */
export function useWithoutNav(active: boolean): void {
  useEffect(() => {
    if (!active) return;
    change(1);
    return () => change(-1);
  }, [active]);
}

/** Whether the bottom bar may be shown. */
export function useNavShown(): boolean {
  return useSyncExternalStore(watch, () => asking === 0);
}
