/** What is not yet on the server, kept on this device per person and site. */
import { createStore, del, get, set, type UseStore } from 'idb-keyval';
import type { Drawing } from '../../../model/drawing/schema';
import { drawingSchema } from '../../../model/drawing/schema';
import type { Survey } from '../../../model/drawing/surveySchema';
import { surveySchema } from '../../../model/drawing/surveySchema';
import type { LocalDraft } from '../../store/autosave';
import type { LocalCopy } from '../../store/saver';

let place: UseStore | null = null;

function drafts(): UseStore | null {
  if (typeof indexedDB === 'undefined') return null;
  place ??= createStore('polewright-drafts', 'drafts');
  return place;
}

type Part = 'drawing' | 'survey';

function keyOf(userId: string, siteId: string, part: Part): string {
  return `${userId}/${siteId}/${part}`;
}

/** Keeps a copy, or forgets it. A browser that refuses storage keeps nothing: the page itself still holds the draft. */
export async function keepLocal<T>(
  of: { readonly userId: string; readonly siteId: string; readonly part: Part },
  copy: LocalCopy<T> | null,
): Promise<void> {
  const store = drafts();
  if (!store) return;
  const key = keyOf(of.userId, of.siteId, of.part);
  try {
    if (copy) await set(key, copy, store);
    else await del(key, store);
  } catch {
    // Private windows and full disks refuse.
  }
}

async function recall<T>(key: string, isWhole: (value: unknown) => boolean): Promise<LocalCopy<T> | null> {
  const store = drafts();
  if (!store) return null;
  try {
    const copy = await get<LocalCopy<T>>(key, store);
    // A copy written by an older page may no longer be a drawing as it is known now.
    return copy && isWhole(copy.value) && Number.isInteger(copy.baseVersion) ? copy : null;
  } catch {
    return null;
  }
}

export async function recallLocal(userId: string, siteId: string): Promise<LocalDraft> {
  const [drawing, survey] = await Promise.all([
    recall<Drawing>(keyOf(userId, siteId, 'drawing'), (value) => drawingSchema.safeParse(value).success),
    recall<Survey>(keyOf(userId, siteId, 'survey'), (value) => surveySchema.safeParse(value).success),
  ]);
  return { drawing, survey };
}
