import i18next, { type TFunction } from 'i18next';
import type { en } from '../../model/words/en';
import { auth } from '../../model/words/en/auth';
import { common } from '../../model/words/en/common';
import { sites } from '../../model/words/en/sites';
import type { Say } from '../../model/words/say';

declare module 'i18next' {
  interface CustomTypeOptions {
    defaultNS: 'translation';
    resources: { translation: typeof en };
    returnNull: false;
  }
}

void i18next.init({
  lng: 'en',
  fallbackLng: 'en',
  initAsync: false,
  // What the first pages say; the rest comes with the screens that say it.
  resources: { en: { translation: { common, auth, sites } } },
  // React escapes what it renders.
  interpolation: { escapeValue: false },
});

/** Takes in more of the dictionary, by namespaces at its top: called by the chunk whose screens say them. */
export function addWords(words: Partial<typeof en>): void {
  i18next.addResourceBundle('en', 'translation', words, true, true);
}

export type Words = TFunction<'translation'>;

/** Words by key, with keys and figures checked against the dictionary. */
export function useWords(): Words {
  return i18next.t;
}

/** For the model's own words functions, which know keys only as strings. */
export const say: Say = (key, params) => String(i18next.t(key as never, params as never));
