import { createHash, randomBytes } from 'node:crypto';
import { z } from 'zod';
import {
  acceptedSchema,
  invitationSchema,
  invitationViewSchema,
  inviteSchema,
  type InvitationView,
} from '../../model/contracts/sites';
import { isMember } from '../../db/queries/crew';
import {
  acceptInvitation,
  findInvitation,
  putInvitation,
  revokeInvitation,
  type InvitationByToken,
} from '../../db/queries/invitations';
import { findSite } from '../../db/queries/sites';
import { Failure } from '../http/failure';
import { limitTries } from '../http/limits';
import { route, type Route } from '../http/route';
import { writeInvitationMail } from '../mail/letters';
import { word } from '../words';
import { invitationAnswer } from './invitationAnswer';

export const INVITATION_DAYS = 14;

const tokenParams = z.object({ token: z.string().regex(/^[A-Za-z0-9_-]{20,100}$/) });

function hashToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}

function stateOf(invitation: InvitationByToken, now: Date): InvitationView['state'] {
  if (invitation.acceptedAt !== null) return 'accepted';
  return invitation.expiresAt <= now ? 'expired' : 'open';
}

export const invitationRoutes: readonly Route[] = [
  route({
    method: 'post',
    path: '/api/sites/:siteId/invitations',
    summary: 'Ask someone to join, by mail; asking again replaces the invitation before',
    access: 'manageCrew',
    body: inviteSchema,
    answer: invitationSchema,
    status: 201,
    refusals: [409, 429, 503],
    before: ({ env }) => limitTries(env, { most: 60, minutes: 60 }),
    handle: async ({ deps, site, person, body }) => {
      const { email, role } = body;
      if (await isMember(deps.db, site.id, email)) {
        throw new Failure('alreadyThere', word('server.alreadyMember'), { field: 'email' });
      }
      const token = randomBytes(32).toString('base64url');
      const createdAt = deps.now();
      const expiresAt = new Date(createdAt.getTime() + INVITATION_DAYS * 24 * 60 * 60 * 1000);
      const tokenHash = hashToken(token);
      const invited = { siteId: site.id, email, role, tokenHash, invitedBy: person.id, createdAt, expiresAt };
      const id = await putInvitation(deps.db, invited);
      const link = `${deps.env.APP_URL}/invitation/${token}`;
      const about = { to: email, invitedBy: person.name, siteName: site.name, role, link, days: INVITATION_DAYS };
      await deps.mailer.send(writeInvitationMail(about)).catch(async (error: unknown) => {
        deps.log.error({ err: error }, 'an invitation could not be mailed');
        await revokeInvitation(deps.db, site.id, id);
        throw new Failure('unavailable', word('server.notMailed'));
      });
      return invitationAnswer({ id, email, role, invitedBy: person.name, createdAt, expiresAt });
    },
  }),
  route({
    method: 'delete',
    path: '/api/sites/:siteId/invitations/:invitationId',
    summary: 'Take an invitation back: its link stops working',
    access: 'manageCrew',
    params: z.object({ invitationId: z.uuid() }),
    answer: null,
    handle: async ({ deps, site, params }) => {
      const gone = await revokeInvitation(deps.db, site.id, params.invitationId);
      if (!gone) throw new Failure('notFound', word('server.notFound'));
    },
  }),
  route({
    method: 'get',
    path: '/api/invitations/:token',
    summary: 'What the invitation offers, for whoever holds its link',
    access: 'everyone',
    params: tokenParams,
    answer: invitationViewSchema,
    refusals: [429],
    before: ({ env }) => limitTries(env, { most: 120, minutes: 15 }),
    handle: async ({ deps, params }) => {
      const found = await findInvitation(deps.db, hashToken(params.token));
      if (found === null) throw new Failure('notFound', word('server.notFound'));
      const { siteName, role, invitedBy, email } = found;
      return { siteName, role, invitedBy, email, state: stateOf(found, deps.now()) };
    },
  }),
  route({
    method: 'post',
    path: '/api/invitations/:token/accept',
    summary: 'Join the site; only the account with the address that was asked may',
    access: 'signedIn',
    params: tokenParams,
    answer: acceptedSchema,
    refusals: [403, 409, 410, 429],
    before: ({ env }) => limitTries(env, { most: 60, minutes: 15 }),
    handle: async ({ deps, params, person }) => {
      const acceptance = await acceptInvitation(deps.db, {
        tokenHash: hashToken(params.token),
        userId: person.id,
        email: person.email,
        now: deps.now(),
      });
      switch (acceptance.state) {
        case 'accepted':
          return { siteId: acceptance.siteId };
        case 'alreadyAccepted':
          // Pressed twice, or the link opened again: fine while they are on the crew.
          if (await findSite(deps.db, acceptance.siteId, person.id)) return { siteId: acceptance.siteId };
          throw new Failure('alreadyThere', word('server.invitationUsed'));
        case 'otherAddress':
          throw new Failure('notAllowed', word('server.invitationOtherAddress'));
        case 'expired':
          throw new Failure('expired', word('server.invitationExpired'));
        case 'notThere':
          throw new Failure('notFound', word('server.notFound'));
      }
    },
  }),
];
