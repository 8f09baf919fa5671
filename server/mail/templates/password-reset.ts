import type { MailContent } from '#server/mail/content.ts';

export type PasswordReset = {
  readonly name: string;
  readonly owner: string;
  /** Whole address with its token; taken out of the outbox once the message is sent. */
  readonly link: string;
  /** For people, like `one hour`. */
  readonly validFor: string;
};

export function passwordReset(data: PasswordReset): MailContent {
  return {
    subject: 'A new password for Upstand',
    heading: 'Choose a new password',
    blocks: [
      {
        type: 'text',
        text: `${data.name}, somebody asked for a new password for your account${data.owner ? ` at ${data.owner}` : ''}. The link works once and for ${data.validFor}. If it was not you, do nothing: your password stays as it is.`,
      },
      { type: 'link', label: 'Choose a new password', path: data.link },
    ],
  };
}
