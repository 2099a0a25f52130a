import { z } from 'zod';
import {
  draftSchema,
  newRevisionSchema,
  restoreSchema,
  revisionNumberSchema,
  revisionSchema,
  revisionsSchema,
  revisionSummarySchema,
} from '../../model/contracts/drawings';
import {
  getRevision,
  listRevisions,
  restoreRevision,
  saveRevision,
  type RevisionRow,
  type RevisionSummaryRow,
} from '../../db/queries/revisions';
import type { Deps } from '../http/deps';
import { Failure } from '../http/failure';
import { route, type Route, type Site } from '../http/route';
import { word } from '../words';
import { draftAnswer } from './draftAnswer';
import { outlineOf } from './outline';
import { asWrite, writeIdReused } from './write';

export const revisionParams = z.object({ number: revisionNumberSchema });

export async function needRevision(deps: Deps, site: Site, number: number): Promise<RevisionRow> {
  const revision = await getRevision(deps.db, site.id, number);
  if (revision === null) throw new Failure('notFound', word('server.notFound'));
  return revision;
}

function summaryAnswer({ number, note, savedBy, savedAt }: RevisionSummaryRow) {
  return { number, note, savedBy, savedAt: savedAt.toISOString() };
}

function staleVersions(): Failure {
  return new Failure('stale', word('server.staleVersions'));
}

export const revisionRoutes: readonly Route[] = [
  route({
    method: 'get',
    path: '/api/sites/:siteId/revisions',
    summary: 'What was saved as revisions, the newest first',
    access: 'read',
    answer: revisionsSchema,
    handle: async ({ deps, site }) => ({ revisions: (await listRevisions(deps.db, site.id)).map(summaryAnswer) }),
  }),
  route({
    method: 'post',
    path: '/api/sites/:siteId/revisions',
    summary: 'Save the draft as the next revision, unless it changed since you looked (409)',
    access: 'saveRevision',
    body: newRevisionSchema,
    answer: revisionSummarySchema,
    status: 201,
    refusals: [409],
    handle: async ({ deps, site, person, body }) => {
      const { writeId, ...content } = body;
      const write = asWrite({ siteId: site.id, userId: person.id, kind: 'saveRevision', writeId, content });
      const saved = await saveRevision(deps.db, write, { ...content, savedByName: person.name });
      if (saved === null) throw new Failure('notFound', word('server.notFound'));
      if (saved.state === 'reused') throw writeIdReused();
      if (saved.state === 'stale') throw staleVersions();
      return summaryAnswer(saved.revision);
    },
  }),
  route({
    method: 'get',
    path: '/api/sites/:siteId/revisions/:number',
    summary: 'One revision, with its drawing and its survey',
    access: 'read',
    params: revisionParams,
    answer: revisionSchema,
    handle: async ({ deps, site, params }) => {
      const revision = await needRevision(deps, site, params.number);
      return { ...summaryAnswer(revision), drawing: revision.drawing, survey: revision.survey };
    },
  }),
  route({
    method: 'post',
    path: '/api/sites/:siteId/revisions/:number/restore',
    summary: 'Make the draft what this revision was; unsaved changes of the draft are set aside',
    access: 'saveRevision',
    params: revisionParams,
    body: restoreSchema,
    answer: draftSchema,
    refusals: [409],
    handle: async ({ deps, site, person, params, body }) => {
      const { number } = params;
      const { writeId, ...versions } = body;
      const content = { ...versions, number };
      const write = asWrite({ siteId: site.id, userId: person.id, kind: 'restoreRevision', writeId, content });
      const revision = await needRevision(deps, site, number);
      const restored = await restoreRevision(deps.db, write, { ...content, outline: outlineOf(revision.drawing) });
      if (restored === null) throw new Failure('notFound', word('server.notFound'));
      if (restored.state === 'reused') throw writeIdReused();
      if (restored.state === 'stale') throw staleVersions();
      return draftAnswer(restored.draft);
    },
  }),
];
