import i18next, { type TFunction } from 'i18next';
import { en } from '../../model/words/en';
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
  resources: { en: { translation: en } },
  // React escapes what it renders.
  interpolation: { escapeValue: false },
});

export type Words = TFunction<'translation'>;

/** Words by key, with keys and figures checked against the dictionary. */
export function useWords(): Words {
  return i18next.t;
}

/** For the model's own words functions, which know keys only as strings. */
export const say: Say = (key, params) => String(i18next.t(key as never, params as never));
