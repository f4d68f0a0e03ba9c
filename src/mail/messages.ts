/** What each kind of message is told. */
export type MessageData = {
  verify: { name: string; link: string };
  reset: { name: string; link: string };
  passwordChanged: { name: string };
  invitation: { groupName: string; inviterName: string; role: string; link: string; until: string };
};
export type MessageKind = keyof MessageData;

/** Plain words; a paragraph that is a link stands alone. */
export type Message = { subject: string; paragraphs: string[]; link?: { words: string; href: string } };

export const messages: { [Kind in MessageKind]: (data: MessageData[Kind]) => Message } = {
  verify: ({ name, link }) => ({
    subject: 'Confirm your e-mail address',
    paragraphs: [
      `Hello ${name},`,
      'somebody, we hope you, made an account with this address. Confirm it within 24 hours:',
    ],
    link: { words: 'Confirm the address', href: link },
  }),
  reset: ({ name, link }) => ({
    subject: 'Choose a new password',
    paragraphs: [
      `Hello ${name},`,
      'a new password was asked for. The link works once, for one hour. If it was not you, do nothing: the old password stays.',
    ],
    link: { words: 'Choose a new password', href: link },
  }),
  passwordChanged: ({ name }) => ({
    subject: 'Your password was changed',
    paragraphs: [
      `Hello ${name},`,
      'the password of your account was changed and all other sessions ended. If it was not you, ask for a new password at once and tell the administrator.',
    ],
  }),
  invitation: ({ groupName, inviterName, role, link, until }) => ({
    subject: `${inviterName} invites you to ${groupName}`,
    paragraphs: [
      `${inviterName} invites you to join the group ${groupName} as ${role}.`,
      `The invitation is open until ${until}.`,
    ],
    link: { words: 'Look at the invitation', href: link },
  }),
};
