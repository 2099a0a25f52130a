import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { may, type Permission } from '../../model/contracts/common';
import { siteSchema, sitesSchema, type changeSiteSchema, type NewSite } from '../../model/contracts/sites';
import { call } from './api';
import { nothing } from './nothing';

export const sitesKey = ['sites'] as const;
export const siteKey = (siteId: string) => ['sites', siteId] as const;

export const sitesQuery = queryOptions({
  queryKey: [...sitesKey, 'list'],
  queryFn: async ({ signal }) => (await call(sitesSchema, '/api/sites', { signal })).sites,
});

export function siteQuery(siteId: string) {
  return queryOptions({
    queryKey: [...siteKey(siteId), 'site'],
    queryFn: ({ signal }) => call(siteSchema, `/api/sites/${siteId}`, { signal }),
  });
}

/** Every site that the person belongs to. */
export function useSites() {
  return useQuery(sitesQuery);
}

/** One site: its name, and the person's role on it. */
export function useSite(siteId: string) {
  return useQuery(siteQuery(siteId));
}

/** Whether the person may do this on the site; false until the site is known. */
export function useMay(siteId: string, permission: Permission): boolean {
  const { data } = useSite(siteId);
  return data !== undefined && may(data.role, permission);
}

export function useAddSite() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (site: NewSite) => call(siteSchema, '/api/sites', { method: 'POST', body: site }),
    onSuccess: (site) => {
      client.setQueryData(siteQuery(site.id).queryKey, site);
      return client.invalidateQueries({ queryKey: sitesQuery.queryKey });
    },
  });
}

export function useRenameSite(siteId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: z.input<typeof changeSiteSchema>) =>
      call(nothing, `/api/sites/${siteId}`, { method: 'PATCH', body: change }),
    onSuccess: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: siteQuery(siteId).queryKey }),
        client.invalidateQueries({ queryKey: sitesQuery.queryKey }),
      ]),
  });
}

export function useDeleteSite(siteId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => call(nothing, `/api/sites/${siteId}`, { method: 'DELETE' }),
    onSuccess: () => {
      client.removeQueries({ queryKey: siteKey(siteId) });
      return client.invalidateQueries({ queryKey: sitesQuery.queryKey });
    },
  });
}
