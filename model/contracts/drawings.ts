/** The draft of a site, its survey, its revisions, and what was set aside when two people saved at once. */
import { z } from 'zod';
import { drawingSchema } from '../drawing/schema';
import { surveySchema } from '../drawing/surveySchema';
import { versionSchema, whenSchema, writeIdSchema } from './common';

/** The draft: the drawing and the survey, each with the version that a save must name. */
export const draftSchema = z.strictObject({
  drawing: drawingSchema,
  drawingVersion: versionSchema,
  survey: surveySchema,
  surveyVersion: versionSchema,
  /** The revision it was last saved as or restored from. */
  afterRevision: z.number().int().nullable(),
  changedSince: z.boolean(),
  changedBy: z.string().nullable(),
  changedAt: whenSchema,
});

/** A save names the version it was made from; sending the same `writeId` again changes nothing and answers the same. */
export const saveDrawingSchema = z.strictObject({
  writeId: writeIdSchema,
  baseVersion: versionSchema,
  drawing: drawingSchema,
});
export const saveSurveySchema = z.strictObject({
  writeId: writeIdSchema,
  baseVersion: versionSchema,
  survey: surveySchema,
});
export const savedSchema = z.strictObject({ version: versionSchema });

/** 409: what is on the server now; the refused one was set aside under `setAsideId`, so both are kept. */
export const staleSchema = z.strictObject({
  error: z.strictObject({ code: z.literal('stale'), message: z.string() }),
  current: draftSchema,
  setAsideId: z.uuid(),
});

export const setAsideSchema = z.strictObject({
  id: z.uuid(),
  part: z.enum(['drawing', 'survey']),
  savedBy: z.string(),
  savedAt: whenSchema,
});
export const setAsideListSchema = z.strictObject({ setAside: z.array(setAsideSchema) });
export const setAsideWholeSchema = z.strictObject({
  id: z.uuid(),
  drawing: drawingSchema.nullable(),
  survey: surveySchema.nullable(),
  savedBy: z.string(),
  savedAt: whenSchema,
});

export const newRevisionSchema = z.strictObject({
  writeId: writeIdSchema,
  note: z.string().trim().max(500),
  drawingVersion: versionSchema,
  surveyVersion: versionSchema,
});
export const revisionSummarySchema = z.strictObject({
  number: z.number().int().min(1),
  note: z.string(),
  savedBy: z.string(),
  savedAt: whenSchema,
});
export const revisionsSchema = z.strictObject({ revisions: z.array(revisionSummarySchema) });
export const revisionSchema = z.strictObject({
  ...revisionSummarySchema.shape,
  drawing: drawingSchema,
  survey: surveySchema,
});
export const revisionNumberSchema = z.coerce.number().int().min(1).max(1_000_000);
export const restoreSchema = z.strictObject({
  writeId: writeIdSchema,
  drawingVersion: versionSchema,
  surveyVersion: versionSchema,
});

export type Draft = z.infer<typeof draftSchema>;
export type SaveDrawing = z.infer<typeof saveDrawingSchema>;
export type SaveSurvey = z.infer<typeof saveSurveySchema>;
export type Stale = z.infer<typeof staleSchema>;
export type SetAside = z.infer<typeof setAsideSchema>;
export type NewRevision = z.infer<typeof newRevisionSchema>;
export type RevisionSummary = z.infer<typeof revisionSummarySchema>;
export type Revision = z.infer<typeof revisionSchema>;
