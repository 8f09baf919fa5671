import type { MailContent } from '#server/mail/content.ts';
import { formatDay } from '#shared/dates/format-day.ts';

export type ReturnedFinding = {
  readonly structureNumber: string;
  /** Title of the rule. */
  readonly finding: string;
  /** What was measured against which limit, and in which cell. */
  readonly detail: string;
  /** What is due: correct the record, rework, repair. */
  readonly due: string;
  /** YYYY-MM-DD, or empty. */
  readonly dueOn: string;
  readonly reason: string;
};

export type BatchReturned = {
  readonly batchId: string;
  readonly batchNumber: string;
  readonly workOrder: string;
  readonly inspector: string;
  /** Number of the revision that now waits for the contractor. */
  readonly nextRevision: number;
  readonly dueOn: string | null;
  readonly approved: number;
  readonly returned: number;
  readonly held: number;
  readonly findings: readonly ReturnedFinding[];
};

export function batchReturned(data: BatchReturned): MailContent {
  return {
    subject: `Batch ${data.batchNumber}: ${count(data.returned, 'line')} returned${data.dueOn === null ? '' : `, due ${formatDay(data.dueOn)}`}`,
    heading: `${count(data.returned, 'line')} of batch ${data.batchNumber} came back`,
    blocks: [
      {
        type: 'text',
        text: `The returned lines stand in revision ${data.nextRevision}. Correct or answer each, add photographs where they are asked for, and submit again. Approved lines stand and need nothing more.`,
      },
      {
        type: 'facts',
        facts: [
          ['Work order', data.workOrder],
          ['Inspector', data.inspector],
          ['Due', data.dueOn === null ? 'no day was set' : formatDay(data.dueOn)],
          ['Approved', String(data.approved)],
          ['Returned', String(data.returned)],
          ['Held for a concession', String(data.held)],
        ],
      },
      {
        type: 'table',
        columns: ['Structure', 'Finding', 'Measured', 'What is due', 'By', 'Reason'],
        rows: data.findings.map((row) => [
          row.structureNumber,
          row.finding,
          row.detail,
          row.due,
          formatDay(row.dueOn),
          row.reason,
        ]),
      },
      { type: 'link', label: `Open revision ${data.nextRevision}`, path: `/batches/${data.batchId}` },
    ],
  };
}

function count(n: number, noun: string): string {
  return `${n} ${noun}${n === 1 ? '' : 's'}`;
}
