import { z } from 'zod';
import { may } from '../../model/contracts/common';
import { setAsideListSchema, setAsideWholeSchema } from '../../model/contracts/drawings';
import { deleteSetAside, getSetAside, listSetAside, type SetAsideWhole } from '../../db/queries/setAside';
import { Failure } from '../http/failure';
import { route, type Route, type Site } from '../http/route';
import type { Deps } from '../http/deps';
import { word } from '../words';

const setAsideParams = z.object({ setAsideId: z.uuid() });

async function needSetAside(deps: Deps, site: Site, id: string): Promise<SetAsideWhole> {
  const found = await getSetAside(deps.db, site.id, id);
  if (found === null) throw new Failure('notFound', word('server.notFound'));
  return found;
}

export const setAsideRoutes: readonly Route[] = [
  route({
    method: 'get',
    path: '/api/sites/:siteId/set-aside',
    summary: 'Drawings and surveys that were kept although they did not become the draft, the newest first',
    access: 'editSurvey',
    answer: setAsideListSchema,
    handle: async ({ deps, site }) => {
      const rows = await listSetAside(deps.db, site.id);
      const setAside = rows.map(({ id, part, savedBy, savedAt }) => ({
        id,
        part,
        savedBy: savedBy ?? '',
        savedAt: savedAt.toISOString(),
      }));
      return { setAside };
    },
  }),
  route({
    method: 'get',
    path: '/api/sites/:siteId/set-aside/:setAsideId',
    summary: 'One of them, whole',
    access: 'editSurvey',
    params: setAsideParams,
    answer: setAsideWholeSchema,
    handle: async ({ deps, site, params }) => {
      const { id, drawing, survey, savedBy, savedAt } = await needSetAside(deps, site, params.setAsideId);
      return { id, drawing, survey, savedBy: savedBy ?? '', savedAt: savedAt.toISOString() };
    },
  }),
  route({
    method: 'delete',
    path: '/api/sites/:siteId/set-aside/:setAsideId',
    summary: 'Let one go; someone else’s drawing only by those who may edit the drawing',
    access: 'editSurvey',
    params: setAsideParams,
    answer: null,
    handle: async ({ deps, site, person, params }) => {
      const found = await needSetAside(deps, site, params.setAsideId);
      const permission = found.part === 'drawing' ? 'editDrawing' : 'editSurvey';
      if (found.savedById !== person.id && !may(site.role, permission)) {
        throw new Failure('notAllowed', word('server.notAllowed'));
      }
      await deleteSetAside(deps.db, site.id, found.id);
    },
  }),
];
