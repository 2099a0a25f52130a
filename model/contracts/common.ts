/** Parts that several contracts share. */
import { z } from 'zod';

export const ROLES = ['lead', 'designer', 'mason', 'observer'] as const;
export const roleSchema = z.enum(ROLES);
export type Role = z.infer<typeof roleSchema>;

export const siteIdSchema = z.uuid();
export const writeIdSchema = z.uuid();
export const versionSchema = z.number().int().min(0).max(2_147_483_647);
export const whenSchema = z.iso.datetime({ offset: true });

/** Every refusal: a code for programs, the field where there is one, and words for people. */
export const errorSchema = z.strictObject({
  error: z.strictObject({
    code: z.enum([
      'badInput',
      'tooLarge',
      'signedOut',
      'notAllowed',
      'notFound',
      'stale',
      'alreadyThere',
      'expired',
      'tooMany',
      'unavailable',
      'broken',
    ]),
    message: z.string(),
    field: z.string().optional(),
  }),
});
export type ErrorBody = z.infer<typeof errorSchema>;
export type ErrorCode = ErrorBody['error']['code'];

/** What each role may do on a site: the one table that the server holds and the client shows by. */
export const PERMISSIONS = {
  read: ['lead', 'designer', 'mason', 'observer'],
  editDrawing: ['lead', 'designer'],
  editSurvey: ['lead', 'designer', 'mason'],
  saveRevision: ['lead', 'designer'],
  manageSite: ['lead'],
  manageCrew: ['lead'],
} as const satisfies Record<string, readonly Role[]>;
export type Permission = keyof typeof PERMISSIONS;

export function may(role: Role, permission: Permission): boolean {
  return (PERMISSIONS[permission] as readonly Role[]).includes(role);
}
