import type { Words } from '../ui/words';
import { ApiError } from './api';

/** What a failure means to the person: our words for its code, with the server's own where it named a field. */
export function errorWords(t: Words, error: unknown): string {
  if (!(error instanceof ApiError)) return t('common.errors.broken');
  if (error.code === 'badInput' && error.field !== undefined) return error.message;
  return t(`common.errors.${error.code}`);
}
