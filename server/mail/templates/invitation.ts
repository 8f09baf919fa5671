import type { MailContent } from '#server/mail/content.ts';

export type Invitation = {
  readonly name: string;
  /** The utility whose poles these are. */
  readonly owner: string;
  /** Whole address with its token; taken out of the outbox once the message is sent. */
  readonly link: string;
  /** For people, like `3 days`. */
  readonly validFor: string;
};

export function invitation(data: Invitation): MailContent {
  return {
    subject: `Your account at ${data.owner || 'Upstand'}`,
    heading: `${data.owner || 'The owner'} opened an account for you`,
    blocks: [
      {
        type: 'text',
        text: `${data.name}, here foam-set poles are handed in, reviewed and kept on record. Choose a password to begin. The link works once and for ${data.validFor}; who holds it can open the account, so do not pass it on.`,
      },
      { type: 'link', label: 'Choose a password', path: data.link },
    ],
  };
}
