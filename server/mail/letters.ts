/** The mails as they go out. */
import type { Role } from '../../model/contracts/common';
import { word } from '../words';

export interface Letter {
  readonly to: string;
  readonly subject: string;
  readonly text: string;
}

/** A name in a subject stays on its line. */
function onOneLine(text: string): string {
  return text.replace(/\s+/g, ' ').trim();
}

export function writeResetMail(about: { to: string; name: string; link: string }): Letter {
  const { to, name, link } = about;
  return { to, subject: word('mail.reset.subject'), text: word('mail.reset.text', { name: onOneLine(name), link }) };
}

export function writeInvitationMail(about: {
  to: string;
  invitedBy: string;
  siteName: string;
  role: Role;
  link: string;
  days: number;
}): Letter {
  const { to, link, days } = about;
  const invitedBy = onOneLine(about.invitedBy);
  const siteName = onOneLine(about.siteName);
  const role = word(`mail.roles.${about.role}`);
  return {
    to,
    subject: word('mail.invitation.subject', { invitedBy, siteName }),
    text: word('mail.invitation.text', { invitedBy, siteName, role, link, days }),
  };
}
