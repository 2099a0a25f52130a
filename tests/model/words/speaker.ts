/** The dictionary as the screens say it, and one that refuses a key or a figure that is not there. */
import { createInstance } from 'i18next';
import { en } from '../../../model/words/en';
import type { Say } from '../../../model/words/say';

/** Throws where a key has no words or the words ask for a figure that was not given. */
export function strictSay(): Say {
  const words = createInstance();
  void words.init({
    lng: 'en',
    resources: { en: { translation: en } },
    initAsync: false,
    interpolation: { escapeValue: false },
    missingInterpolationHandler: (text: string, match: RegExpExecArray) => {
      throw new Error(`nothing given for ${match[0]} in “${text}”`);
    },
  });
  return (key, params) => {
    const count = params?.['count'];
    if (!words.exists(key, count === undefined ? {} : { count: Number(count) })) throw new Error(`no words for ${key}`);
    return String(words.t(key as never, params as never));
  };
}
