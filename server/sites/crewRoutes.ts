import { z } from 'zod';
import { may } from '../../model/contracts/common';
import { changeRoleSchema, crewSchema } from '../../model/contracts/sites';
import { changeRole, listMembers, removeMember, type CrewChange } from '../../db/queries/crew';
import { listInvitations } from '../../db/queries/invitations';
import { Failure } from '../http/failure';
import { route, type Route } from '../http/route';
import { word } from '../words';
import { invitationAnswer } from './invitationAnswer';

const memberParams = z.object({ userId: z.string().regex(/^[\w-]{1,64}$/) });

function needDone(change: CrewChange): void {
  if (change === 'notThere') throw new Failure('notFound', word('server.notFound'));
  if (change === 'lastLead') throw new Failure('notAllowed', word('server.lastLead'), { field: 'role', status: 409 });
}

export const crewRoutes: readonly Route[] = [
  route({
    method: 'get',
    path: '/api/sites/:siteId/crew',
    summary: 'Who works on the site, and who is invited; open invitations are shown to a lead only',
    access: 'read',
    answer: crewSchema,
    handle: async ({ deps, site }) => {
      const members = await listMembers(deps.db, site.id);
      const invitations = site.role === 'lead' ? await listInvitations(deps.db, site.id, deps.now()) : [];
      return {
        members: members.map((member) => ({ ...member, joinedAt: member.joinedAt.toISOString() })),
        invitations: invitations.map(invitationAnswer),
      };
    },
  }),
  route({
    method: 'patch',
    path: '/api/sites/:siteId/members/:userId',
    summary: 'Give a member another role; the last lead stays lead (409)',
    access: 'manageCrew',
    params: memberParams,
    body: changeRoleSchema,
    answer: null,
    refusals: [409],
    handle: async ({ deps, site, params, body }) =>
      needDone(await changeRole(deps.db, site.id, params.userId, body.role)),
  }),
  route({
    method: 'delete',
    path: '/api/sites/:siteId/members/:userId',
    summary: 'Take a member off the site, or leave it yourself; the last lead stays (409)',
    access: 'read',
    params: memberParams,
    answer: null,
    refusals: [409],
    handle: async ({ deps, site, person, params }) => {
      if (params.userId !== person.id && !may(site.role, 'manageCrew')) {
        throw new Failure('notAllowed', word('server.notAllowed'));
      }
      needDone(await removeMember(deps.db, site.id, params.userId));
    },
  }),
];
