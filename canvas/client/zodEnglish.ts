/** Stands in for zod's index of locales in the web client: English only. */
export { default as en } from 'zod/v4/locales/en.js';
