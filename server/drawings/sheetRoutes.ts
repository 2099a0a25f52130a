import { pipeline } from 'node:stream/promises';
import type { Response } from 'express';
import { z } from 'zod';
import { getDraft } from '../../db/queries/drafts';
import { Failure } from '../http/failure';
import { limitTries } from '../http/limits';
import { route, type Route } from '../http/route';
import { printSheets, type SheetsInput } from '../sheets/printSheets';
import { word } from '../words';
import { needRevision, revisionParams } from './revisionRoutes';
import { needSolvable } from './workLimit';

const sheetQuery = z.strictObject({
  /** Letter or A4, by the drawing's units, unless named. */
  paper: z.enum(['letter', 'a4', 'tabloid', 'a3']).optional(),
});

/** A site's name as part of a file's name: letters and digits of any script, and single dashes. */
function fileName(siteName: string, which: string): string {
  const plain = siteName.replace(/[^\p{L}\p{N}]+/gu, '-').replace(/^-+|-+$/g, '');
  return `${plain || 'site'}-${which}.pdf`;
}

async function sendSheets(res: Response, input: SheetsInput, name: string): Promise<void> {
  needSolvable(input.drawing);
  const sheets = printSheets(input);
  res.type('application/pdf');
  res.setHeader('content-disposition', `inline; filename*=UTF-8''${encodeURIComponent(name)}`);
  await pipeline(sheets, res).catch((error: NodeJS.ErrnoException) => {
    // Whoever asked went away: nothing is wrong here.
    if (error.code !== 'ERR_STREAM_PREMATURE_CLOSE') throw error;
  });
}

export const sheetRoutes: readonly Route[] = [
  route({
    method: 'get',
    path: '/api/sites/:siteId/draft/sheets.pdf',
    summary: 'The draft’s sheets to print: plan, walls and a card for each pole; each says that it is a draft',
    access: 'read',
    query: sheetQuery,
    answer: 'application/pdf',
    refusals: [400, 413, 429],
    before: ({ env }) => limitTries(env, { most: 60, minutes: 5 }),
    handle: async ({ deps, site, query, res }) => {
      const draft = await getDraft(deps.db, site.id);
      if (draft === null) throw new Failure('notFound', word('server.notFound'));
      const { drawing, survey } = draft;
      await sendSheets(
        res,
        { siteName: site.name, revision: null, drawing, survey, ...query },
        fileName(site.name, 'draft'),
      );
    },
  }),
  route({
    method: 'get',
    path: '/api/sites/:siteId/revisions/:number/sheets.pdf',
    summary: 'A revision’s sheets to print',
    access: 'read',
    params: revisionParams,
    query: sheetQuery,
    answer: 'application/pdf',
    refusals: [400, 413, 429],
    before: ({ env }) => limitTries(env, { most: 60, minutes: 5 }),
    handle: async ({ deps, site, params, query, res }) => {
      const { number, note, savedBy, savedAt, drawing, survey } = await needRevision(deps, site, params.number);
      const revision = { number, note, savedBy, savedAt: savedAt.toISOString() };
      const name = fileName(site.name, `revision-${number}`);
      await sendSheets(res, { siteName: site.name, revision, drawing, survey, ...query }, name);
    },
  }),
];
