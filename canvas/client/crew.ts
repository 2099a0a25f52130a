import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { Role } from '../../model/contracts/common';
import { crewSchema } from '../../model/contracts/sites';
import { call } from './api';
import { nothing } from './nothing';
import { siteKey, siteQuery, sitesQuery } from './sites';

export function crewQuery(siteId: string) {
  return queryOptions({
    queryKey: [...siteKey(siteId), 'crew'],
    queryFn: ({ signal }) => call(crewSchema, `/api/sites/${siteId}/crew`, { signal }),
  });
}

/** Who belongs to the site, and who was invited. */
export function useCrew(siteId: string) {
  return useQuery(crewQuery(siteId));
}

export function useChangeRole(siteId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ userId, role }: { userId: string; role: Role }) =>
      call(nothing, `/api/sites/${siteId}/members/${encodeURIComponent(userId)}`, { method: 'PATCH', body: { role } }),
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: crewQuery(siteId).queryKey }),
        // The person may have changed their own.
        client.invalidateQueries({ queryKey: siteQuery(siteId).queryKey }),
      ]),
  });
}

export function useRemoveMember(siteId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (userId: string) =>
      call(nothing, `/api/sites/${siteId}/members/${encodeURIComponent(userId)}`, { method: 'DELETE' }),
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: crewQuery(siteId).queryKey }),
        client.invalidateQueries({ queryKey: sitesQuery.queryKey }),
      ]),
  });
}
