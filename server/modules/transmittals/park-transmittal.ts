import { row } from '#server/db/rows.ts';
import type { ParkedHandler } from '#server/jobs/define-job.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { IssueTransmittalPayload } from './issue-transmittal.job.ts';

/** No attempt at a transmittal is left: its page says so and what to do. */
export const parkTransmittal: ParkedHandler<IssueTransmittalPayload> = async ({ transmittalId }, { em }) => {
  const problem = {
    code: 'transmittal.failed',
    detail:
      'The workbook could not be written after several attempts. Nothing was issued. An administrator can look at the parked job and try it again.',
  };
  const failed = await row<{ number: string; revision: number }>(
    em,
    `update transmittals set state = 'failed', problem = $2, version = version + 1
     where id = $1 and state in ('queued', 'running') returning number, revision`,
    [transmittalId, JSON.stringify(problem)],
  );
  if (!failed) return;
  const subject = `transmittal:${transmittalId}`;
  await setProgress(em, { subject, state: 'failed', done: 0, total: null, problem });
  await appendTrail(em, {
    actor: null,
    action: 'transmittal.failed',
    subject: { type: 'transmittal', id: transmittalId, label: `${failed.number} rev ${failed.revision}` },
  });
};
