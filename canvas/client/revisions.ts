import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  revisionSchema,
  revisionsSchema,
  type newRevisionSchema,
  type restoreSchema,
} from '../../model/contracts/drawings';
import { call } from './api';
import { draftQuery } from './drafts';
import { nothing } from './nothing';
import { siteKey, sitesQuery } from './sites';

export function revisionsQuery(siteId: string) {
  return queryOptions({
    queryKey: [...siteKey(siteId), 'revisions'],
    queryFn: async ({ signal }) =>
      (await call(revisionsSchema, `/api/sites/${siteId}/revisions`, { signal })).revisions,
  });
}

/** A revision never changes once saved, so it is fetched once. */
export function revisionQuery(siteId: string, number: number) {
  return queryOptions({
    queryKey: [...siteKey(siteId), 'revision', number],
    queryFn: ({ signal }) => call(revisionSchema, `/api/sites/${siteId}/revisions/${number}`, { signal }),
    staleTime: Infinity,
  });
}

/** The site's revisions, newest first. */
export function useRevisions(siteId: string) {
  return useQuery(revisionsQuery(siteId));
}

/** One revision with its drawing and survey. */
export function useRevision(siteId: string, number: number) {
  return useQuery(revisionQuery(siteId, number));
}

export function useSaveRevision(siteId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (revision: z.input<typeof newRevisionSchema>) =>
      call(nothing, `/api/sites/${siteId}/revisions`, { method: 'POST', body: revision }),
    onSuccess: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: revisionsQuery(siteId).queryKey }),
        client.invalidateQueries({ queryKey: draftQuery(siteId).queryKey }),
        client.invalidateQueries({ queryKey: sitesQuery.queryKey }),
      ]),
  });
}

/** Makes an older revision the draft again. */
export function useRestoreRevision(siteId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ number, ...body }: z.input<typeof restoreSchema> & { number: number }) =>
      call(nothing, `/api/sites/${siteId}/revisions/${number}/restore`, { method: 'POST', body }),
    onSuccess: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: draftQuery(siteId).queryKey }),
        client.invalidateQueries({ queryKey: sitesQuery.queryKey }),
      ]),
  });
}

/** Address of the sheets as PDF: the draft's, or a revision's. */
export function sheetsAddress(siteId: string, revision: number | null): string {
  return revision === null
    ? `/api/sites/${siteId}/draft/sheets.pdf`
    : `/api/sites/${siteId}/revisions/${revision}/sheets.pdf`;
}
