import {
  draftSchema,
  savedSchema,
  saveDrawingSchema,
  saveSurveySchema,
  staleSchema,
} from '../../model/contracts/drawings';
import { getDraft, saveDrawing, saveSurvey, type Saved } from '../../db/queries/drafts';
import { Failure } from '../http/failure';
import { OtherAnswer, route, type Route } from '../http/route';
import { word } from '../words';
import { draftAnswer } from './draftAnswer';
import { outlineOf } from './outline';
import { asWrite, writeIdReused } from './write';

/** The new version, or 409 with what the server has and where the refused one was put. */
function savedAnswer(saved: Saved | null) {
  if (saved === null) throw new Failure('notFound', word('server.notFound'));
  switch (saved.state) {
    case 'saved':
      return { version: saved.version };
    case 'reused':
      throw writeIdReused();
    case 'stale':
      return new OtherAnswer(409, {
        error: { code: 'stale', message: word('server.staleDraft') },
        current: draftAnswer(saved.current),
        setAsideId: saved.setAsideId,
      });
  }
}

export const draftRoutes: readonly Route[] = [
  route({
    method: 'get',
    path: '/api/sites/:siteId/draft',
    summary: 'The draft: the drawing and the survey, each with its version',
    access: 'read',
    answer: draftSchema,
    handle: async ({ deps, site }) => {
      const draft = await getDraft(deps.db, site.id);
      if (draft === null) throw new Failure('notFound', word('server.notFound'));
      return draftAnswer(draft);
    },
  }),
  route({
    method: 'put',
    path: '/api/sites/:siteId/draft/drawing',
    summary: 'Save the drawing over the version it was made from; otherwise it is set aside (409)',
    access: 'editDrawing',
    body: saveDrawingSchema,
    answer: savedSchema,
    refusalBodies: { 409: staleSchema },
    handle: async ({ deps, site, person, body }) => {
      const { writeId, ...content } = body;
      const write = asWrite({ siteId: site.id, userId: person.id, kind: 'saveDrawing', writeId, content });
      return savedAnswer(await saveDrawing(deps.db, write, { ...content, outline: outlineOf(content.drawing) }));
    },
  }),
  route({
    method: 'put',
    path: '/api/sites/:siteId/draft/survey',
    summary: 'Save the survey over the version it was made from; otherwise it is set aside (409)',
    access: 'editSurvey',
    body: saveSurveySchema,
    answer: savedSchema,
    refusalBodies: { 409: staleSchema },
    handle: async ({ deps, site, person, body }) => {
      const { writeId, ...content } = body;
      const write = asWrite({ siteId: site.id, userId: person.id, kind: 'saveSurvey', writeId, content });
      return savedAnswer(await saveSurvey(deps.db, write, content));
    },
  }),
];
