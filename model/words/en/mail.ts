/** Words of the mails that the server sends. */
export const mail = {
  reset: {
    subject: 'A new password for Polewright',
    text: `Hello {{name}},

someone, you we hope, asked for a new password for this address. Set it here within an hour:

{{link}}

If it was not you, do nothing: your password stays as it is.

Polewright`,
  },
  invitation: {
    subject: '{{invitedBy}} asks you to join {{siteName}}',
    text: `Hello,

{{invitedBy}} asks you to join the site {{siteName}} on Polewright as {{role}}. Open this to look at it and to join:

{{link}}

The link works for {{days}} days, for this address only.

Polewright`,
  },
  roles: {
    lead: 'lead',
    designer: 'designer',
    mason: 'mason',
    observer: 'observer',
  },
} as const;
