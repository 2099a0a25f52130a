import type { Words } from '../../ui/words';

/** True, or what is wrong with a site's name. */
export function checkSiteName(t: Words, value: string): true | string {
  if (value.trim() === '') return t('sites.newSite.nameNeeded');
  return value.trim().length <= 80 || t('sites.newSite.nameLong');
}
