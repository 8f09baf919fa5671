import type { MailContent } from '#server/mail/content.ts';

export type Invitation = {
  readonly name: string;
  readonly organisation: string;
  readonly role: string;
  readonly invitedBy: string;
  /** Taken out of the outbox once the message is sent. */
  readonly token: string;
  /** For people, like `3 days`. */
  readonly validFor: string;
};

export function invitation(data: Invitation): MailContent {
  return {
    subject: 'Your account at Upstand',
    heading: `${data.invitedBy} opened an account for you`,
    blocks: [
      {
        type: 'text',
        text: `${data.name}, choose a password within ${data.validFor}. The link works once; who holds it can open the account, so do not pass it on.`,
      },
      {
        type: 'facts',
        facts: [
          ['Organisation', data.organisation],
          ['Role', data.role],
        ],
      },
      {
        type: 'link',
        label: 'Choose a password',
        path: `/password-reset/${encodeURIComponent(data.token)}`,
      },
    ],
  };
}
