import type { MailContent, MailTexts } from '#server/mail/content.ts';
import { batchApproved, type BatchApproved } from '#server/mail/templates/batch-approved.ts';
import { batchReceived, type BatchReceived } from '#server/mail/templates/batch-received.ts';
import { batchReturned, type BatchReturned } from '#server/mail/templates/batch-returned.ts';
import { concessionAnswered, type ConcessionAnswered } from '#server/mail/templates/concession-answered.ts';
import { concessionAsked, type ConcessionAsked } from '#server/mail/templates/concession-asked.ts';
import { invitation, type Invitation } from '#server/mail/templates/invitation.ts';
import { lotBlocked, type LotBlocked } from '#server/mail/templates/lot-blocked.ts';
import { passwordReset, type PasswordReset } from '#server/mail/templates/password-reset.ts';
import { transmittalIssued, type TransmittalIssued } from '#server/mail/templates/transmittal-issued.ts';
import { toHtml } from '#server/mail/to-html.ts';
import { toText } from '#server/mail/to-text.ts';

export type MailData = {
  'batch-received': BatchReceived;
  'batch-returned': BatchReturned;
  'batch-approved': BatchApproved;
  'concession-asked': ConcessionAsked;
  'concession-answered': ConcessionAnswered;
  'transmittal-issued': TransmittalIssued;
  'lot-blocked': LotBlocked;
  invitation: Invitation;
  'password-reset': PasswordReset;
};
export type MailTemplate = keyof MailData;

const TEMPLATES: { readonly [T in MailTemplate]: (data: MailData[T]) => MailContent } = {
  'batch-received': batchReceived,
  'batch-returned': batchReturned,
  'batch-approved': batchApproved,
  'concession-asked': concessionAsked,
  'concession-answered': concessionAnswered,
  'transmittal-issued': transmittalIssued,
  'lot-blocked': lotBlocked,
  invitation,
  'password-reset': passwordReset,
};

/** Subject, plain text and HTML of one message; links begin with `publicUrl`, which has no slash at its end. */
export function renderMail<T extends MailTemplate>(
  template: T,
  data: MailData[T],
  { publicUrl }: { readonly publicUrl: string },
): MailTexts {
  const content = TEMPLATES[template](data);
  return {
    // A line break in a number or a name would end the header.
    subject: content.subject.replaceAll(/[\r\n]+/g, ' '),
    text: toText(content, publicUrl),
    html: toHtml(content, publicUrl),
  };
}
