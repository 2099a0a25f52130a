import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import {
  draftSchema,
  savedSchema,
  setAsideListSchema,
  setAsideWholeSchema,
  staleSchema,
  type Draft,
  type SaveDrawing,
  type SaveSurvey,
  type Stale,
} from '../../model/contracts/drawings';
import { ApiError, call, errorOf, send } from './api';
import { nothing } from './nothing';
import { siteKey } from './sites';

export function draftQuery(siteId: string) {
  return queryOptions({
    queryKey: [...siteKey(siteId), 'draft'],
    queryFn: ({ signal }) => fetchDraft(siteId, signal),
    // The open drawing is the newer one: fetching behind its back would only confuse it.
    refetchOnWindowFocus: false,
  });
}

/** The draft as the server has it. Throws `ApiError`. */
export function fetchDraft(siteId: string, signal?: AbortSignal): Promise<Draft> {
  return call(draftSchema, `/api/sites/${siteId}/draft`, { signal });
}

export function useDraft(siteId: string) {
  return useQuery(draftQuery(siteId));
}

/** Someone saved in between: what the server holds now, and under which id ours was set aside. */
export class StaleError extends ApiError {
  override readonly name = 'StaleError';
  readonly stale: Stale;
  constructor(stale: Stale) {
    super(409, 'stale', stale.error.message);
    this.stale = stale;
  }
}

async function save(path: string, body: SaveDrawing | SaveSurvey): Promise<number> {
  const answer = await send(path, { method: 'PUT', body });
  if (answer.ok) {
    const read = savedSchema.safeParse(answer.body);
    if (!read.success) throw new ApiError(answer.status, 'unreadable', read.error.message);
    return read.data.version;
  }
  const stale = answer.status === 409 ? staleSchema.safeParse(answer.body) : null;
  if (stale?.success) throw new StaleError(stale.data);
  throw errorOf(answer.status, answer.body);
}

/** Saves the drawing over the version it was made from; answers the new version. Throws `StaleError` or `ApiError`. */
export function saveDrawing(siteId: string, body: SaveDrawing): Promise<number> {
  return save(`/api/sites/${siteId}/draft/drawing`, body);
}

/** Saves the survey over the version it was made from; answers the new version. Throws `StaleError` or `ApiError`. */
export function saveSurvey(siteId: string, body: SaveSurvey): Promise<number> {
  return save(`/api/sites/${siteId}/draft/survey`, body);
}

export function setAsideQuery(siteId: string) {
  return queryOptions({
    queryKey: [...siteKey(siteId), 'setAside'],
    queryFn: async ({ signal }) =>
      (await call(setAsideListSchema, `/api/sites/${siteId}/set-aside`, { signal })).setAside,
  });
}

/** What was set aside when two people saved at once, newest first. */
export function useSetAside(siteId: string) {
  return useQuery(setAsideQuery(siteId));
}

/** One that was set aside, whole. Throws `ApiError`. */
export function fetchSetAside(siteId: string, id: string) {
  return call(setAsideWholeSchema, `/api/sites/${siteId}/set-aside/${id}`);
}

export function useDropSetAside(siteId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => call(nothing, `/api/sites/${siteId}/set-aside/${id}`, { method: 'DELETE' }),
    onSettled: () => client.invalidateQueries({ queryKey: setAsideQuery(siteId).queryKey }),
  });
}
