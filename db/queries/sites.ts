/** Sites and the role that a person holds on each. */
import { and, count, desc, eq, max, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Role } from '../../model/contracts/common';
import type { Drawing } from '../../model/drawing/schema';
import { EMPTY_SURVEY } from '../../model/drawing/surveySchema';
import type { PlanPoint } from '../../model/geometry/point';
import type { Db } from '../connect';
import { drafts, revisions } from '../schema/drawings';
import { memberships, sites } from '../schema/sites';

export type Outline = readonly (readonly PlanPoint[])[];

export interface SiteRow {
  readonly id: string;
  readonly name: string;
  readonly role: Role;
  readonly createdAt: Date;
}

export interface SiteInList extends SiteRow {
  readonly people: number;
  readonly lastRevision: number | null;
  readonly draftChanged: boolean;
  readonly outline: Outline;
  readonly changedAt: Date;
}

/** The sites that a person works on, the one changed last first. */
export async function listSites(db: Db, userId: string): Promise<SiteInList[]> {
  const crew = alias(memberships, 'crew');
  const people = db.select({ many: count() }).from(crew).where(eq(crew.siteId, sites.id));
  const last = db
    .select({ number: max(revisions.number) })
    .from(revisions)
    .where(eq(revisions.siteId, sites.id));
  return db
    .select({
      id: sites.id,
      name: sites.name,
      role: memberships.role,
      createdAt: sites.createdAt,
      people: sql<number>`(${people})`.mapWith(Number),
      lastRevision: sql<number | null>`(${last})`,
      draftChanged: drafts.changedSince,
      outline: drafts.outline,
      changedAt: drafts.changedAt,
    })
    .from(memberships)
    .innerJoin(sites, eq(sites.id, memberships.siteId))
    .innerJoin(drafts, eq(drafts.siteId, sites.id))
    .where(eq(memberships.userId, userId))
    .orderBy(desc(drafts.changedAt), sites.id);
}

/** The site as one of its people sees it; null when there is no such site or the person does not work on it. */
export async function findSite(db: Db, siteId: string, userId: string): Promise<SiteRow | null> {
  const [row] = await db
    .select({ id: sites.id, name: sites.name, role: memberships.role, createdAt: sites.createdAt })
    .from(memberships)
    .innerJoin(sites, eq(sites.id, memberships.siteId))
    .where(and(eq(memberships.siteId, siteId), eq(memberships.userId, userId)));
  return row ?? null;
}

/** A new site with its first drawing as the draft; whoever makes it leads it. */
export async function createSite(
  db: Db,
  site: { readonly name: string; readonly drawing: Drawing; readonly outline: Outline; readonly userId: string },
): Promise<SiteRow> {
  return db.transaction(async (tx) => {
    const [made] = await tx.insert(sites).values({ name: site.name }).returning();
    if (made === undefined) throw new Error('the site was not written');
    await tx.insert(memberships).values({ siteId: made.id, userId: site.userId, role: 'lead' });
    await tx.insert(drafts).values({
      siteId: made.id,
      drawing: site.drawing,
      survey: EMPTY_SURVEY,
      outline: site.outline,
      changedBy: site.userId,
    });
    return { ...made, role: 'lead' };
  });
}

export async function renameSite(db: Db, siteId: string, name: string): Promise<void> {
  await db.update(sites).set({ name }).where(eq(sites.id, siteId));
}

/** Removes the site with everything on it, its revisions too. */
export async function deleteSite(db: Db, siteId: string): Promise<void> {
  await db.delete(sites).where(eq(sites.id, siteId));
}

/** Takes the site's row, so that two changes of its crew come one after the other. To be called in a transaction. */
export async function lockSite(tx: Db, siteId: string): Promise<void> {
  await tx.execute(sql`select 1 from ${sites} where ${sites.id} = ${siteId} for update`);
}
