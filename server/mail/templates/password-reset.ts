import type { MailContent } from '#server/mail/content.ts';

export type PasswordReset = {
  readonly name: string;
  /** Taken out of the outbox once the message is sent. */
  readonly token: string;
  /** For people, like `30 minutes`. */
  readonly validFor: string;
};

export function passwordReset(data: PasswordReset): MailContent {
  return {
    subject: 'A new password for Upstand',
    heading: 'Choose a new password',
    blocks: [
      {
        type: 'text',
        text: `${data.name}, somebody asked for a new password for your account. The link works once and for ${data.validFor}. If it was not you, do nothing: your password stays as it is.`,
      },
      {
        type: 'link',
        label: 'Choose a new password',
        path: `/password-reset/${encodeURIComponent(data.token)}`,
      },
    ],
  };
}
