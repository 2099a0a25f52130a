/** Rows put in as they are, with their own dates: for filling an empty database, never for what people do. */
import { count } from 'drizzle-orm';
import type { Role } from '../../model/contracts/common';
import type { Drawing } from '../../model/drawing/schema';
import type { Survey } from '../../model/drawing/surveySchema';
import type { Db } from '../connect';
import { account, user } from '../schema/auth';
import { drafts, revisions } from '../schema/drawings';
import { memberships, sites } from '../schema/sites';
import type { Outline } from './sites';

export interface FilledRevision {
  readonly note: string;
  readonly drawing: Drawing;
  readonly survey: Survey;
  readonly savedBy: string;
  readonly savedByName: string;
  readonly savedAt: Date;
}

export interface FilledSite {
  readonly name: string;
  readonly createdAt: Date;
  readonly members: readonly { readonly userId: string; readonly role: Role }[];
  /** In order: numbered from 1. */
  readonly revisions: readonly FilledRevision[];
  readonly draft: { readonly drawing: Drawing; readonly survey: Survey; readonly outline: Outline };
  readonly draftChanged: boolean;
  readonly changedBy: string;
  readonly changedAt: Date;
}

/** Whether nobody has an account and there is no site. */
export async function isDatabaseEmpty(db: Db): Promise<boolean> {
  const [people] = await db.select({ many: count() }).from(user);
  const [made] = await db.select({ many: count() }).from(sites);
  return people?.many === 0 && made?.many === 0;
}

/** An account with a password already hashed as better-auth hashes it. */
export async function putPerson(
  db: Db,
  person: { readonly id: string; readonly name: string; readonly email: string; readonly passwordHash: string },
): Promise<void> {
  const { passwordHash, ...row } = person;
  await db.insert(user).values({ ...row, emailVerified: true });
  await db.insert(account).values({
    id: `${row.id}-password`,
    accountId: row.id,
    providerId: 'credential',
    userId: row.id,
    password: passwordHash,
  });
}

export async function putSite(db: Db, site: FilledSite): Promise<string> {
  const { name, createdAt, draft } = site;
  const [made] = await db.insert(sites).values({ name, createdAt }).returning({ id: sites.id });
  if (made === undefined) throw new Error('the site was not written');
  const siteId = made.id;
  const members = site.members.map((member) => ({ ...member, siteId, joinedAt: createdAt }));
  await db.insert(memberships).values(members);
  if (site.revisions.length > 0) {
    await db.insert(revisions).values(site.revisions.map((each, i) => ({ ...each, siteId, number: i + 1 })));
  }
  await db.insert(drafts).values({
    siteId,
    ...draft,
    drawingVersion: site.revisions.length,
    surveyVersion: site.revisions.length,
    afterRevision: site.revisions.length || null,
    changedSince: site.draftChanged,
    changedBy: site.changedBy,
    changedAt: site.changedAt,
  });
  return siteId;
}
