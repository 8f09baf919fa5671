import type { MailContent } from '#server/mail/content.ts';

export type BatchApproved = {
  readonly batchId: string;
  readonly batchNumber: string;
  readonly revision: number;
  readonly workOrder: string;
  readonly inspector: string;
  readonly approved: number;
  readonly held: number;
};

export function batchApproved(data: BatchApproved): MailContent {
  return {
    subject: `Batch ${data.batchNumber} approved`,
    heading: `Batch ${data.batchNumber} is approved`,
    blocks: [
      {
        type: 'text',
        text:
          data.held > 0
            ? `No line came back. ${data.held === 1 ? 'One line waits' : `${data.held} lines wait`} for a concession; you need do nothing for it now.`
            : 'No line came back. The records clerk enters the approved lines on the register.',
      },
      {
        type: 'facts',
        facts: [
          ['Work order', data.workOrder],
          ['Revision', String(data.revision)],
          ['Inspector', data.inspector],
          ['Approved', String(data.approved)],
          ['Held for a concession', String(data.held)],
        ],
      },
      { type: 'link', label: 'Open the batch', path: `/batches/${data.batchId}` },
    ],
  };
}
