import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { acceptedSchema, invitationViewSchema, type Invite } from '../../model/contracts/sites';
import { call } from './api';
import { crewQuery } from './crew';
import { nothing } from './nothing';
import { sitesQuery } from './sites';

export function invitationQuery(token: string) {
  return queryOptions({
    queryKey: ['invitation', token],
    queryFn: ({ signal }) => call(invitationViewSchema, `/api/invitations/${encodeURIComponent(token)}`, { signal }),
  });
}

/** What an invitation's link shows. */
export function useInvitation(token: string) {
  return useQuery(invitationQuery(token));
}

/** Accepts it for whoever is signed in; answers the site's id. */
export function useAcceptInvitation(token: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => call(acceptedSchema, `/api/invitations/${encodeURIComponent(token)}/accept`, { method: 'POST' }),
    onSuccess: () => client.invalidateQueries({ queryKey: sitesQuery.queryKey }),
  });
}

export function useInvite(siteId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (invite: Invite) => call(nothing, `/api/sites/${siteId}/invitations`, { method: 'POST', body: invite }),
    onSuccess: () => client.invalidateQueries({ queryKey: crewQuery(siteId).queryKey }),
  });
}

export function useRevokeInvitation(siteId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (invitationId: string) =>
      call(nothing, `/api/sites/${siteId}/invitations/${invitationId}`, { method: 'DELETE' }),
    onSettled: () => client.invalidateQueries({ queryKey: crewQuery(siteId).queryKey }),
  });
}
