/** Invitations to a site: found by the hash of the token in the mail, accepted once, by the person they were sent to. */
import { and, asc, eq, gt, isNull } from 'drizzle-orm';
import type { Role } from '../../model/contracts/common';
import type { Db } from '../connect';
import { user } from '../schema/auth';
import { invitations, memberships, sites } from '../schema/sites';
import { lockSite } from './sites';

export interface InvitationRow {
  readonly id: string;
  readonly email: string;
  readonly role: Role;
  readonly invitedBy: string;
  readonly createdAt: Date;
  readonly expiresAt: Date;
}

export interface InvitationByToken {
  readonly siteId: string;
  readonly siteName: string;
  readonly email: string;
  readonly role: Role;
  readonly invitedBy: string;
  readonly expiresAt: Date;
  readonly acceptedAt: Date | null;
}

/** Invitations neither accepted nor run out at `now`, the oldest first. */
export async function listInvitations(db: Db, siteId: string, now: Date): Promise<InvitationRow[]> {
  return db
    .select({
      id: invitations.id,
      email: invitations.email,
      role: invitations.role,
      invitedBy: user.name,
      createdAt: invitations.createdAt,
      expiresAt: invitations.expiresAt,
    })
    .from(invitations)
    .innerJoin(user, eq(user.id, invitations.invitedBy))
    .where(and(eq(invitations.siteId, siteId), isNull(invitations.acceptedAt), gt(invitations.expiresAt, now)))
    .orderBy(asc(invitations.createdAt), asc(invitations.id));
}

/** Asking the same address again replaces the invitation before: its link stops working and the new one counts. */
export async function putInvitation(
  db: Db,
  invitation: {
    readonly siteId: string;
    readonly email: string;
    readonly role: Role;
    readonly tokenHash: string;
    readonly invitedBy: string;
    readonly createdAt: Date;
    readonly expiresAt: Date;
  },
): Promise<string> {
  const { role, tokenHash, invitedBy, createdAt, expiresAt } = invitation;
  const [row] = await db
    .insert(invitations)
    .values(invitation)
    .onConflictDoUpdate({
      target: [invitations.siteId, invitations.email],
      targetWhere: isNull(invitations.acceptedAt),
      set: { role, tokenHash, invitedBy, createdAt, expiresAt },
    })
    .returning({ id: invitations.id });
  if (row === undefined) throw new Error('the invitation was not written');
  return row.id;
}

/** Whether there was an open invitation to take back. */
export async function revokeInvitation(db: Db, siteId: string, invitationId: string): Promise<boolean> {
  const gone = await db
    .delete(invitations)
    .where(and(eq(invitations.siteId, siteId), eq(invitations.id, invitationId), isNull(invitations.acceptedAt)))
    .returning({ id: invitations.id });
  return gone.length > 0;
}

export async function findInvitation(db: Db, tokenHash: string): Promise<InvitationByToken | null> {
  const [row] = await db
    .select({
      siteId: invitations.siteId,
      siteName: sites.name,
      email: invitations.email,
      role: invitations.role,
      invitedBy: user.name,
      expiresAt: invitations.expiresAt,
      acceptedAt: invitations.acceptedAt,
    })
    .from(invitations)
    .innerJoin(sites, eq(sites.id, invitations.siteId))
    .innerJoin(user, eq(user.id, invitations.invitedBy))
    .where(eq(invitations.tokenHash, tokenHash));
  return row ?? null;
}

export type Acceptance =
  | { readonly state: 'accepted' | 'alreadyAccepted'; readonly siteId: string }
  | { readonly state: 'notThere' | 'expired' | 'otherAddress' };

/** Makes the person a member in the role offered. Someone who is a member already keeps the role they have. */
export async function acceptInvitation(
  db: Db,
  accepting: { readonly tokenHash: string; readonly userId: string; readonly email: string; readonly now: Date },
): Promise<Acceptance> {
  return db.transaction(async (tx) => {
    const [row] = await tx
      .select()
      .from(invitations)
      .where(eq(invitations.tokenHash, accepting.tokenHash))
      .for('update');
    if (row === undefined) return { state: 'notThere' };
    if (row.email !== accepting.email.toLowerCase()) return { state: 'otherAddress' };
    if (row.acceptedAt !== null) return { state: 'alreadyAccepted', siteId: row.siteId };
    if (row.expiresAt <= accepting.now) return { state: 'expired' };
    await lockSite(tx, row.siteId);
    await tx
      .insert(memberships)
      .values({ siteId: row.siteId, userId: accepting.userId, role: row.role })
      .onConflictDoNothing();
    await tx.update(invitations).set({ acceptedAt: accepting.now }).where(eq(invitations.id, row.id));
    return { state: 'accepted', siteId: row.siteId };
  });
}
