import type { MailContent } from '#server/mail/content.ts';

export type ConcessionAsked = {
  readonly concessionId: string;
  readonly number: string;
  readonly batchNumber: string;
  readonly workOrder: string;
  readonly contractor: string;
  readonly askedBy: string;
  readonly reason: string;
  readonly findings: readonly {
    readonly structureNumber: string;
    readonly finding: string;
    readonly detail: string;
  }[];
};

export function concessionAsked(data: ConcessionAsked): MailContent {
  return {
    subject: `Concession ${data.number} asked for: batch ${data.batchNumber}`,
    heading: `Concession ${data.number} waits for an engineer`,
    blocks: [
      {
        type: 'text',
        text: 'Granted, what does not conform is accepted as built and stays on record as such. Any engineer may answer.',
      },
      {
        type: 'facts',
        facts: [
          ['Batch', data.batchNumber],
          ['Work order', data.workOrder],
          ['Contractor', data.contractor],
        ],
      },
      {
        type: 'table',
        columns: ['Structure', 'Finding', 'Measured'],
        rows: data.findings.map((row) => [row.structureNumber, row.finding, row.detail]),
      },
      { type: 'quote', by: data.askedBy, text: data.reason },
      { type: 'link', label: 'Open the concession', path: `/concessions/${data.concessionId}` },
    ],
  };
}
