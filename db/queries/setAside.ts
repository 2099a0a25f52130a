/** Drawings and surveys kept although they did not become the draft. */
import { and, desc, eq } from 'drizzle-orm';
import type { Drawing } from '../../model/drawing/schema';
import type { Survey } from '../../model/drawing/surveySchema';
import type { Db } from '../connect';
import { user } from '../schema/auth';
import { setAside } from '../schema/drawings';

export interface SetAsideRow {
  readonly id: string;
  readonly part: 'drawing' | 'survey';
  /** Null when that person's account is gone. */
  readonly savedBy: string | null;
  readonly savedById: string | null;
  readonly savedAt: Date;
}

export interface SetAsideWhole extends SetAsideRow {
  readonly drawing: Drawing | null;
  readonly survey: Survey | null;
}

const summary = {
  id: setAside.id,
  part: setAside.part,
  savedBy: user.name,
  savedById: setAside.savedBy,
  savedAt: setAside.savedAt,
};

/** Keeps one part; returns the id to find it by. */
export async function putAside(
  tx: Db,
  aside: { readonly siteId: string; readonly savedBy: string | null } & (
    { readonly drawing: Drawing } | { readonly survey: Survey }
  ),
): Promise<string> {
  const part = 'drawing' in aside ? 'drawing' : 'survey';
  const [row] = await tx
    .insert(setAside)
    .values({ ...aside, part })
    .returning({ id: setAside.id });
  if (row === undefined) throw new Error('nothing was set aside');
  return row.id;
}

/** The newest first. */
export async function listSetAside(db: Db, siteId: string): Promise<SetAsideRow[]> {
  return db
    .select(summary)
    .from(setAside)
    .leftJoin(user, eq(user.id, setAside.savedBy))
    .where(eq(setAside.siteId, siteId))
    .orderBy(desc(setAside.savedAt), desc(setAside.id));
}

export async function getSetAside(db: Db, siteId: string, id: string): Promise<SetAsideWhole | null> {
  const [row] = await db
    .select({ ...summary, drawing: setAside.drawing, survey: setAside.survey })
    .from(setAside)
    .leftJoin(user, eq(user.id, setAside.savedBy))
    .where(and(eq(setAside.siteId, siteId), eq(setAside.id, id)));
  return row ?? null;
}

export async function deleteSetAside(db: Db, siteId: string, id: string): Promise<void> {
  await db.delete(setAside).where(and(eq(setAside.siteId, siteId), eq(setAside.id, id)));
}
