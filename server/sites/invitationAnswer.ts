import type { InvitationRow } from '../../db/queries/invitations';
import type { Invitation } from '../../model/contracts/sites';

export function invitationAnswer(row: InvitationRow): Invitation {
  const { id, email, role, invitedBy } = row;
  return { id, email, role, invitedBy, createdAt: row.createdAt.toISOString(), expiresAt: row.expiresAt.toISOString() };
}
