import type { MailContent } from '#server/mail/content.ts';

export type TransmittalIssued = {
  readonly transmittalId: string;
  readonly number: string;
  readonly revision: number;
  readonly title: string;
  readonly rows: number;
  readonly issuedBy: string;
  readonly sha256: string;
  readonly contentDigest: string;
};

export function transmittalIssued(data: TransmittalIssued): MailContent {
  return {
    subject: `As-built ${data.number}, revision ${data.revision}, issued`,
    heading: `As-built ${data.number}, revision ${data.revision}, was issued`,
    blocks: [
      {
        type: 'text',
        text: 'The workbook stays byte for byte as issued and can be fetched again at any time.',
      },
      {
        type: 'facts',
        facts: [
          ['Scope', data.title],
          ['Structures', String(data.rows)],
          ['Issued by', data.issuedBy],
          ['SHA-256 of the file', data.sha256],
          ['Digest of its content', data.contentDigest],
        ],
      },
      { type: 'link', label: 'Open the transmittal', path: `/transmittals/${data.transmittalId}` },
    ],
  };
}
