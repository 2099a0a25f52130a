/**
 * The draft of a site. Each save names the version it was made from; under a lock on the draft's row it either becomes
 * the next version or is set aside, so that nothing anyone drew is lost.
 */
import { and, eq, sql } from 'drizzle-orm';
import type { Drawing } from '../../model/drawing/schema';
import type { Survey } from '../../model/drawing/surveySchema';
import type { Db } from '../connect';
import { user } from '../schema/auth';
import { drafts, revisions } from '../schema/drawings';
import { putAside } from './setAside';
import type { Outline } from './sites';
import { findAnswer, keepAnswer, type Write } from './writes';

export interface DraftRow {
  readonly drawing: Drawing;
  readonly drawingVersion: number;
  readonly survey: Survey;
  readonly surveyVersion: number;
  readonly afterRevision: number | null;
  readonly changedSince: boolean;
  readonly changedBy: string | null;
  readonly changedAt: Date;
}

export type Saved =
  | { readonly state: 'saved'; readonly version: number }
  | { readonly state: 'stale'; readonly setAsideId: string; readonly current: DraftRow }
  | { readonly state: 'reused' };

/** What is kept of an answer; the draft that goes with a stale one is read afresh. */
type KeptAnswer = { readonly version: number } | { readonly setAsideId: string };

export async function getDraft(db: Db, siteId: string): Promise<DraftRow | null> {
  const [row] = await db
    .select({
      drawing: drafts.drawing,
      drawingVersion: drafts.drawingVersion,
      survey: drafts.survey,
      surveyVersion: drafts.surveyVersion,
      afterRevision: drafts.afterRevision,
      changedSince: drafts.changedSince,
      changedBy: user.name,
      changedAt: drafts.changedAt,
    })
    .from(drafts)
    .leftJoin(user, eq(user.id, drafts.changedBy))
    .where(eq(drafts.siteId, siteId));
  return row ?? null;
}

export interface LockedDraft {
  readonly drawing: Drawing;
  readonly drawingVersion: number;
  readonly survey: Survey;
  readonly surveyVersion: number;
  readonly afterRevision: number | null;
  readonly changedSince: boolean;
}

/** The draft's row, held until the transaction ends; null when the site is gone. */
export async function lockDraft(tx: Db, siteId: string): Promise<LockedDraft | null> {
  const [row] = await tx.select().from(drafts).where(eq(drafts.siteId, siteId)).for('update');
  return row ?? null;
}

/** Works out anew whether the draft differs from the revision it came from; before the first revision, whether anything was saved. */
export async function noteWhetherChanged(tx: Db, siteId: string): Promise<void> {
  const same = tx
    .select({ one: sql`1` })
    .from(revisions)
    .where(
      and(
        eq(revisions.siteId, drafts.siteId),
        eq(revisions.number, drafts.afterRevision),
        eq(revisions.drawing, drafts.drawing),
        eq(revisions.survey, drafts.survey),
      ),
    );
  await tx
    .update(drafts)
    .set({ changedSince: sql`not exists ${same}` })
    .where(eq(drafts.siteId, siteId));
}

type Change =
  | { readonly part: 'drawing'; readonly drawing: Drawing; readonly outline: Outline }
  | { readonly part: 'survey'; readonly survey: Survey };

async function save(db: Db, write: Write, baseVersion: number, change: Change): Promise<Saved | null> {
  return db.transaction(async (tx) => {
    const draft = await lockDraft(tx, write.siteId);
    if (draft === null) return null;
    const before = await findAnswer<KeptAnswer>(tx, write);
    if (before.state === 'reused') return { state: 'reused' };
    if (before.state === 'answered') return answerAgain(tx, write.siteId, before.answer);

    const version = change.part === 'drawing' ? draft.drawingVersion : draft.surveyVersion;
    if (version !== baseVersion) {
      const content = change.part === 'drawing' ? { drawing: change.drawing } : { survey: change.survey };
      const setAsideId = await putAside(tx, { siteId: write.siteId, savedBy: write.userId, ...content });
      await keepAnswer<KeptAnswer>(tx, write, { setAsideId });
      return answerAgain(tx, write.siteId, { setAsideId });
    }
    const next = version + 1;
    const values =
      change.part === 'drawing'
        ? { drawing: change.drawing, outline: change.outline, drawingVersion: next }
        : { survey: change.survey, surveyVersion: next };
    await tx
      .update(drafts)
      .set({ ...values, changedBy: write.userId, changedAt: sql`now()` })
      .where(eq(drafts.siteId, write.siteId));
    await noteWhetherChanged(tx, write.siteId);
    await keepAnswer<KeptAnswer>(tx, write, { version: next });
    return { state: 'saved', version: next };
  });
}

async function answerAgain(tx: Db, siteId: string, answer: KeptAnswer): Promise<Saved | null> {
  if ('version' in answer) return { state: 'saved', version: answer.version };
  const current = await getDraft(tx, siteId);
  return current && { state: 'stale', setAsideId: answer.setAsideId, current };
}

/** Null when the site is gone. */
export async function saveDrawing(
  db: Db,
  write: Write,
  saving: { readonly baseVersion: number; readonly drawing: Drawing; readonly outline: Outline },
): Promise<Saved | null> {
  const { baseVersion, drawing, outline } = saving;
  return save(db, write, baseVersion, { part: 'drawing', drawing, outline });
}

/** Null when the site is gone. */
export async function saveSurvey(
  db: Db,
  write: Write,
  saving: { readonly baseVersion: number; readonly survey: Survey },
): Promise<Saved | null> {
  return save(db, write, saving.baseVersion, { part: 'survey', survey: saving.survey });
}
