/** The server's words, from the same dictionary as the screens'. */
import { createInstance } from 'i18next';
import { en } from '../model/words/en';
import type { Say } from '../model/words/say';

const words = createInstance();
void words.init({
  lng: 'en',
  fallbackLng: 'en',
  resources: { en: { translation: en } },
  initAsync: false,
  // Mails are plain text, JSON is escaped by whoever shows it, and the mail page escapes for itself.
  interpolation: { escapeValue: false },
});

type Path<T> = { [K in keyof T & string]: T[K] extends string ? K : `${K}.${Path<T[K]>}` }[keyof T & string];

/** Keys of the words that the server itself says. */
export type WordKey = `server.${Path<typeof en.server>}` | `mail.${Path<typeof en.mail>}`;

/** Any words of the dictionary, for the model's functions that are given a `Say`. */
export const say: Say = (key, params) => String(words.t(key as never, params as never));

/** The words for a key, with its figures filled in. */
export function word(key: WordKey, params?: Readonly<Record<string, string | number>>): string {
  return say(key, params);
}
