import { z } from 'zod';
import { siteNameSchema } from '../../../model/contracts/sites';
import type { Words } from '../../ui/words';

/** A site's name as the contract has it, with the words for what is wrong. */
export function siteNameField(t: Words) {
  return z
    .string()
    .trim()
    .min(1, { error: t('sites.newSite.nameNeeded'), abort: true })
    .refine((name) => siteNameSchema.safeParse(name).success, t('sites.newSite.nameLong'));
}
