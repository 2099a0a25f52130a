import { emailSchema } from '../../../model/contracts/sites';
import type { Words } from '../../ui/words';

/** Shortest and longest password, as the server has them. */
export const PASSWORD_LEAST = 10;
export const PASSWORD_MOST = 128;

/** True, or what is wrong with the address. */
export function checkEmail(t: Words, value: string): true | string {
  if (value.trim() === '') return t('auth.problems.emailNeeded');
  return emailSchema.safeParse(value.trim()).success || t('auth.problems.badEmail');
}

/** True, or what is wrong with a password that is being chosen. */
export function checkNewPassword(t: Words, value: string): true | string {
  if (value.length < PASSWORD_LEAST) return t('auth.problems.shortPassword');
  return value.length <= PASSWORD_MOST || t('auth.problems.longPassword');
}
