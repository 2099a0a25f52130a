import { changeSiteSchema, newSiteSchema, siteSchema, sitesSchema } from '../../model/contracts/sites';
import { createSite, deleteSite, listSites, renameSite } from '../../db/queries/sites';
import { newDrawing } from '../../model/drawing/defaults';
import { outlineOf } from '../drawings/outline';
import { route, type Route, type Site } from '../http/route';

function siteAnswer(site: Site) {
  return { id: site.id, name: site.name, role: site.role, createdAt: site.createdAt.toISOString() };
}

export const siteRoutes: readonly Route[] = [
  route({
    method: 'get',
    path: '/api/sites',
    summary: 'The sites you work on, the one changed last first',
    access: 'signedIn',
    answer: sitesSchema,
    handle: async ({ deps, person }) => {
      const rows = await listSites(deps.db, person.id);
      const sites = rows.map(({ createdAt: _, ...site }) => ({
        ...site,
        outline: site.outline.map((outline) => [...outline]),
        changedAt: site.changedAt.toISOString(),
      }));
      return { sites };
    },
  }),
  route({
    method: 'post',
    path: '/api/sites',
    summary: 'Make a site with an empty drawing; you lead it',
    access: 'signedIn',
    body: newSiteSchema,
    answer: siteSchema,
    status: 201,
    handle: async ({ deps, body, person }) => {
      const drawing = newDrawing(body.units);
      const outline = outlineOf(drawing);
      return siteAnswer(await createSite(deps.db, { name: body.name, drawing, outline, userId: person.id }));
    },
  }),
  route({
    method: 'get',
    path: '/api/sites/:siteId',
    summary: 'One site, with your role on it',
    access: 'read',
    answer: siteSchema,
    handle: async ({ site }) => siteAnswer(site),
  }),
  route({
    method: 'patch',
    path: '/api/sites/:siteId',
    summary: 'Rename the site',
    access: 'manageSite',
    body: changeSiteSchema,
    answer: siteSchema,
    handle: async ({ deps, body, site }) => {
      await renameSite(deps.db, site.id, body.name);
      return siteAnswer({ ...site, name: body.name });
    },
  }),
  route({
    method: 'delete',
    path: '/api/sites/:siteId',
    summary: 'Remove the site with its drawings and all its revisions',
    access: 'manageSite',
    answer: null,
    handle: async ({ deps, site }) => deleteSite(deps.db, site.id),
  }),
];
