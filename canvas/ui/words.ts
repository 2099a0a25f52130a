import { createInstance, type TFunction } from 'i18next';
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

const dictionary = createInstance();

void dictionary.init({
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
  dictionary.addResourceBundle('en', 'translation', words, true, true);
}

export type Words = TFunction<'translation'>;

/** Words by key, with keys and figures checked against the dictionary. */
export function useWords(): Words {
  return dictionary.t;
}

/** For the model's own words functions, which know keys only as strings. */
export const say: Say = (key, params) => String(dictionary.t(key as never, params as never));
