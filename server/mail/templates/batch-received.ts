import type { MailContent } from '#server/mail/content.ts';

export type BatchReceived = {
  readonly batchId: string;
  readonly batchNumber: string;
  readonly revision: number;
  readonly workOrder: string;
  readonly contractor: string;
  readonly submittedBy: string;
  readonly lines: number;
  readonly nonconformities: number;
  readonly queries: number;
  /** The contractor reads of a receipt, the inspector of work that waits. */
  readonly audience: 'contractor' | 'inspector';
};

export function batchReceived(data: BatchReceived): MailContent {
  const toContractor = data.audience === 'contractor';
  return {
    subject: `Batch ${data.batchNumber} received${data.revision > 0 ? `, revision ${data.revision}` : ''}`,
    heading: `Batch ${data.batchNumber} was handed in`,
    blocks: [
      {
        type: 'text',
        text: toContractor
          ? 'It is kept as you handed it in and waits for an inspector. You may withdraw it until one takes it.'
          : 'It waits in the queue. Whoever takes it decides it line by line.',
      },
      {
        type: 'facts',
        facts: [
          ['Work order', data.workOrder],
          ['Contractor', data.contractor],
          ['Handed in by', data.submittedBy],
          ['Revision', String(data.revision)],
          ['Lines', String(data.lines)],
          ['Nonconformities', String(data.nonconformities)],
          ['Queries', String(data.queries)],
        ],
      },
      {
        type: 'link',
        label: toContractor ? 'Open the batch' : 'Open it at the review desk',
        path: `/${toContractor ? 'batches' : 'review'}/${data.batchId}`,
      },
    ],
  };
}
