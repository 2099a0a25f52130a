/** Who works on a site, and in which role. A site is never left without a lead. */
import { and, asc, eq } from 'drizzle-orm';
import type { Role } from '../../model/contracts/common';
import type { Db } from '../connect';
import { user } from '../schema/auth';
import { memberships } from '../schema/sites';
import { lockSite } from './sites';

export interface MemberRow {
  readonly userId: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly joinedAt: Date;
}

export type CrewChange = 'done' | 'notThere' | 'lastLead';

export async function listMembers(db: Db, siteId: string): Promise<MemberRow[]> {
  return db
    .select({
      userId: user.id,
      name: user.name,
      email: user.email,
      role: memberships.role,
      joinedAt: memberships.joinedAt,
    })
    .from(memberships)
    .innerJoin(user, eq(user.id, memberships.userId))
    .where(eq(memberships.siteId, siteId))
    .orderBy(asc(memberships.joinedAt), asc(user.id));
}

export async function isMember(db: Db, siteId: string, email: string): Promise<boolean> {
  const rows = await db
    .select({ userId: user.id })
    .from(memberships)
    .innerJoin(user, eq(user.id, memberships.userId))
    .where(and(eq(memberships.siteId, siteId), eq(user.email, email)));
  return rows.length > 0;
}

export async function addMember(db: Db, member: { siteId: string; userId: string; role: Role }): Promise<void> {
  await db.insert(memberships).values(member);
}

async function changeCrew(
  db: Db,
  siteId: string,
  userId: string,
  change: (tx: Db, member: { readonly role: Role; readonly onlyLead: boolean }) => Promise<CrewChange>,
): Promise<CrewChange> {
  return db.transaction(async (tx) => {
    await lockSite(tx, siteId);
    const crew = await tx.select().from(memberships).where(eq(memberships.siteId, siteId));
    const member = crew.find((one) => one.userId === userId);
    if (member === undefined) return 'notThere';
    const leads = crew.filter((one) => one.role === 'lead').length;
    return change(tx, { role: member.role, onlyLead: member.role === 'lead' && leads === 1 });
  });
}

export async function changeRole(db: Db, siteId: string, userId: string, role: Role): Promise<CrewChange> {
  return changeCrew(db, siteId, userId, async (tx, member) => {
    if (member.onlyLead && role !== 'lead') return 'lastLead';
    await tx
      .update(memberships)
      .set({ role })
      .where(and(eq(memberships.siteId, siteId), eq(memberships.userId, userId)));
    return 'done';
  });
}

export async function removeMember(db: Db, siteId: string, userId: string): Promise<CrewChange> {
  return changeCrew(db, siteId, userId, async (tx, member) => {
    if (member.onlyLead) return 'lastLead';
    await tx.delete(memberships).where(and(eq(memberships.siteId, siteId), eq(memberships.userId, userId)));
    return 'done';
  });
}
