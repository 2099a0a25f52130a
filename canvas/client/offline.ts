/** Keeps the answers that were seen, so that a site can be read again where there is no signal. */
import { dehydrate, hydrate, type DehydratedState, type QueryClient } from '@tanstack/react-query';
import { clear, createStore, get, set, type UseStore } from 'idb-keyval';

const KEPT_AS = 'answers';
/** Raised when the shape of answers changes, so that old ones are not read. */
const SHAPE = 1;
const WAIT_MS = 1500;

let store: UseStore | null = null;

function answers(): UseStore | null {
  if (typeof indexedDB === 'undefined') return null;
  store ??= createStore('polewright-answers', 'answers');
  return store;
}

interface Kept {
  readonly shape: number;
  readonly userId: string;
  readonly state: DehydratedState;
}

/** Brings back what this person saw here before; newer answers already held are not overwritten. */
export async function recallOffline(client: QueryClient, userId: string): Promise<void> {
  const place = answers();
  if (!place) return;
  try {
    const kept = await get<Kept>(KEPT_AS, place);
    if (kept?.shape === SHAPE && kept.userId === userId) {
      hydrate(client, kept.state);
      // What was written down may lag behind what was seen, so it is shown at once and asked for again.
      await client.invalidateQueries({ queryKey: ['sites'], refetchType: 'none' });
    } else if (kept) await clear(place);
  } catch {
    // A browser may refuse storage, in a private window for one: then there is nothing to recall.
  }
}

/** Writes answers down as they come, a moment after the last. Returns what stops it. */
export function keepOffline(client: QueryClient, userId: string): () => void {
  const place = answers();
  if (!place) return () => {};
  let timer: ReturnType<typeof setTimeout> | undefined;
  const stop = client.getQueryCache().subscribe((event) => {
    if (event.type !== 'updated' || event.action.type !== 'success' || event.query.queryKey[0] !== 'sites') return;
    clearTimeout(timer);
    timer = setTimeout(() => {
      const state = dehydrate(client, {
        shouldDehydrateQuery: (query) => query.queryKey[0] === 'sites' && query.state.status === 'success',
        shouldDehydrateMutation: () => false,
      });
      const kept: Kept = { shape: SHAPE, userId, state };
      set(KEPT_AS, kept, place).catch(() => {
        // As above: storage refused.
      });
    }, WAIT_MS);
  });
  return () => {
    clearTimeout(timer);
    stop();
  };
}

/** Forgets it all: called on signing out. */
export async function forgetOffline(): Promise<void> {
  const place = answers();
  if (place) await clear(place).catch(() => {});
}
