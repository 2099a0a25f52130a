import { ApiError } from '../../client/api';
import { errorWords } from '../../client/errorWords';
import type { Words } from '../../ui/words';

/** As `errorWords`, but the crew's own conflict has a name: a site keeps a lead. */
export function crewErrorWords(t: Words, error: unknown): string {
  return error instanceof ApiError && error.status === 409 ? t('crew.lastLead') : errorWords(t, error);
}
