/** Sites, their crew, and invitations. */
import { z } from 'zod';
import { planPointSchema, unitsSchema } from '../drawing/schema';
import { roleSchema, siteIdSchema, whenSchema } from './common';

export const siteNameSchema = z.string().trim().min(1, 'a site needs a name').max(80);

export const newSiteSchema = z.strictObject({ name: siteNameSchema, units: unitsSchema });
export const changeSiteSchema = z.strictObject({ name: siteNameSchema });

export const siteSummarySchema = z.strictObject({
  id: siteIdSchema,
  name: z.string(),
  role: roleSchema,
  people: z.number().int(),
  lastRevision: z.number().int().nullable(),
  /** The draft differs from the last revision. */
  draftChanged: z.boolean(),
  /** Outlines of its walls, for the small picture in the list. */
  outline: z.array(z.array(planPointSchema)),
  changedAt: whenSchema,
});
export const sitesSchema = z.strictObject({ sites: z.array(siteSummarySchema) });

export const siteSchema = z.strictObject({
  id: siteIdSchema,
  name: z.string(),
  role: roleSchema,
  createdAt: whenSchema,
});

export const memberSchema = z.strictObject({
  userId: z.string(),
  name: z.string(),
  email: z.string(),
  role: roleSchema,
  joinedAt: whenSchema,
});
export const invitationSchema = z.strictObject({
  id: z.uuid(),
  email: z.string(),
  role: roleSchema,
  invitedBy: z.string(),
  createdAt: whenSchema,
  expiresAt: whenSchema,
});
export const crewSchema = z.strictObject({ members: z.array(memberSchema), invitations: z.array(invitationSchema) });

export const emailSchema = z
  .email('this is not an e-mail address')
  .max(254)
  .transform((email) => email.toLowerCase());
export const inviteSchema = z.strictObject({ email: emailSchema, role: roleSchema });
export const changeRoleSchema = z.strictObject({ role: roleSchema });

/** What an invitation's link shows before it is accepted. */
export const invitationViewSchema = z.strictObject({
  siteName: z.string(),
  role: roleSchema,
  invitedBy: z.string(),
  email: z.string(),
  state: z.enum(['open', 'accepted', 'expired']),
});
export const acceptedSchema = z.strictObject({ siteId: siteIdSchema });

export type NewSite = z.infer<typeof newSiteSchema>;
export type SiteSummary = z.infer<typeof siteSummarySchema>;
export type Site = z.infer<typeof siteSchema>;
export type Crew = z.infer<typeof crewSchema>;
export type Member = z.infer<typeof memberSchema>;
export type Invitation = z.infer<typeof invitationSchema>;
export type InvitationView = z.infer<typeof invitationViewSchema>;
export type Invite = z.input<typeof inviteSchema>;
