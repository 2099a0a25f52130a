/** Revisions: numbered within their site, written once, never changed. */
import { and, desc, eq, max, sql } from 'drizzle-orm';
import type { Drawing } from '../../model/drawing/schema';
import type { Survey } from '../../model/drawing/surveySchema';
import type { Db } from '../connect';
import { user } from '../schema/auth';
import { drafts, revisions } from '../schema/drawings';
import { getDraft, lockDraft, type DraftRow, type LockedDraft } from './drafts';
import { putAside } from './setAside';
import type { Outline } from './sites';
import { findAnswer, keepAnswer, type Write } from './writes';

export interface RevisionSummaryRow {
  readonly number: number;
  readonly note: string;
  readonly savedBy: string;
  readonly savedAt: Date;
}

export interface RevisionRow extends RevisionSummaryRow {
  readonly drawing: Drawing;
  readonly survey: Survey;
}

/** The versions of the draft that a person had before them. */
export interface DraftVersions {
  readonly drawingVersion: number;
  readonly surveyVersion: number;
}

export type RevisionSaved =
  | { readonly state: 'saved'; readonly revision: RevisionSummaryRow }
  | { readonly state: 'stale' }
  | { readonly state: 'reused' };

export type Restored =
  { readonly state: 'restored'; readonly draft: DraftRow } | { readonly state: 'stale' } | { readonly state: 'reused' };

const summary = {
  number: revisions.number,
  note: revisions.note,
  savedBy: revisions.savedByName,
  savedAt: revisions.savedAt,
};

/** The newest first. */
export async function listRevisions(db: Db, siteId: string): Promise<RevisionSummaryRow[]> {
  return db.select(summary).from(revisions).where(eq(revisions.siteId, siteId)).orderBy(desc(revisions.number));
}

export async function getRevision(db: Db, siteId: string, number: number): Promise<RevisionRow | null> {
  const [row] = await db
    .select({ ...summary, drawing: revisions.drawing, survey: revisions.survey })
    .from(revisions)
    .where(and(eq(revisions.siteId, siteId), eq(revisions.number, number)));
  return row ?? null;
}

function sameVersions(draft: LockedDraft, versions: DraftVersions): boolean {
  return draft.drawingVersion === versions.drawingVersion && draft.surveyVersion === versions.surveyVersion;
}

/** Saves the draft as the next revision, under the lock that every save takes; null when the site is gone. */
export async function saveRevision(
  db: Db,
  write: Write,
  saving: DraftVersions & { readonly note: string; readonly savedByName: string },
): Promise<RevisionSaved | null> {
  return db.transaction(async (tx) => {
    const draft = await lockDraft(tx, write.siteId);
    if (draft === null) return null;
    const before = await findAnswer<{ readonly number: number }>(tx, write);
    if (before.state === 'reused') return { state: 'reused' };
    if (before.state === 'answered') {
      const again = await getRevision(tx, write.siteId, before.answer.number);
      return again && { state: 'saved', revision: again };
    }
    if (!sameVersions(draft, saving)) return { state: 'stale' };

    const [last] = await tx
      .select({ number: max(revisions.number) })
      .from(revisions)
      .where(eq(revisions.siteId, write.siteId));
    const number = (last?.number ?? 0) + 1;
    const [revision] = await tx
      .insert(revisions)
      .values({
        siteId: write.siteId,
        number,
        note: saving.note,
        drawing: draft.drawing,
        survey: draft.survey,
        savedBy: write.userId,
        savedByName: saving.savedByName,
      })
      .returning(summary);
    if (revision === undefined) throw new Error('the revision was not written');
    await tx.update(drafts).set({ afterRevision: number, changedSince: false }).where(eq(drafts.siteId, write.siteId));
    await keepAnswer(tx, write, { number });
    return { state: 'saved', revision };
  });
}

/**
 * Makes the draft what a revision was. Unsaved changes of the draft are set aside first, under the name of whoever
 * made them last. Null when the site or the revision is not there.
 */
export async function restoreRevision(
  db: Db,
  write: Write,
  restoring: DraftVersions & { readonly number: number; readonly outline: Outline },
): Promise<Restored | null> {
  return db.transaction(async (tx) => {
    const draft = await lockDraft(tx, write.siteId);
    const revision = draft && (await getRevision(tx, write.siteId, restoring.number));
    if (draft === null || revision === null) return null;
    const before = await findAnswer<{ readonly number: number }>(tx, write);
    if (before.state === 'reused') return { state: 'reused' };
    if (before.state === 'new') {
      if (!sameVersions(draft, restoring)) return { state: 'stale' };
      if (draft.changedSince) await keepUnsaved(tx, write.siteId, draft);
      await tx
        .update(drafts)
        .set({
          drawing: revision.drawing,
          survey: revision.survey,
          outline: restoring.outline,
          drawingVersion: draft.drawingVersion + 1,
          surveyVersion: draft.surveyVersion + 1,
          afterRevision: restoring.number,
          changedSince: false,
          changedBy: write.userId,
          changedAt: sql`now()`,
        })
        .where(eq(drafts.siteId, write.siteId));
      await keepAnswer(tx, write, { number: restoring.number });
    }
    const now = await getDraft(tx, write.siteId);
    return now && { state: 'restored', draft: now };
  });
}

/** Sets aside what of the draft no revision holds: only the parts that differ from the one it came from. */
async function keepUnsaved(tx: Db, siteId: string, draft: LockedDraft): Promise<void> {
  const [same] = await tx
    .select({
      drawing: sql<boolean>`coalesce(${revisions.drawing} = ${drafts.drawing}, false)`,
      survey: sql<boolean>`coalesce(${revisions.survey} = ${drafts.survey}, false)`,
      changedBy: user.id,
    })
    .from(drafts)
    .leftJoin(revisions, and(eq(revisions.siteId, drafts.siteId), eq(revisions.number, drafts.afterRevision)))
    .leftJoin(user, eq(user.id, drafts.changedBy))
    .where(eq(drafts.siteId, siteId));
  const savedBy = same?.changedBy ?? null;
  if (same?.drawing !== true) await putAside(tx, { siteId, savedBy, drawing: draft.drawing });
  if (same?.survey !== true) await putAside(tx, { siteId, savedBy, survey: draft.survey });
}
