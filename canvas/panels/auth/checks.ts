/** What the fields of the sign-in pages and of an invitation must hold, with the words for what is wrong. */
import { z } from 'zod';
import { emailSchema } from '../../../model/contracts/sites';
import type { Words } from '../../ui/words';

/** Shortest and longest password, as the server has them. */
export const PASSWORD_LEAST = 10;
export const PASSWORD_MOST = 128;

export function emailField(t: Words) {
  return z
    .string()
    .trim()
    .min(1, { error: t('auth.problems.emailNeeded'), abort: true })
    .refine((email) => emailSchema.safeParse(email).success, t('auth.problems.badEmail'));
}

/** A password that someone signs in with: only the server knows whether it is right. */
export function passwordField(t: Words) {
  return z.string().min(1, t('auth.problems.passwordNeeded'));
}

/** A password that is being chosen. */
export function newPasswordField(t: Words) {
  return z
    .string()
    .min(PASSWORD_LEAST, t('auth.problems.shortPassword'))
    .max(PASSWORD_MOST, t('auth.problems.longPassword'));
}

export function personNameField(t: Words) {
  return z.string().trim().min(1, t('auth.problems.nameNeeded'));
}
