import { run } from '#server/db/rows.ts';
import type { JobHandler } from '#server/jobs/define-job.ts';

/** None of these is part of the record: answers kept for a repeated request, counters, links past their time, bars of progress. */
const STATEMENTS = [
  `delete from idempotency where created_at < now() - interval '7 days'`,
  `delete from throttles where window_start < now() - interval '1 day'`,
  `delete from tokens where expires_at < now() - interval '30 days'`,
  `delete from job_progress where state in ('done', 'failed') and updated_at < now() - interval '30 days'`,
  `delete from captured_mail where at < now() - interval '90 days'`,
];

export const tidy: JobHandler<object> = async (_payload, { em }) => {
  for (const statement of STATEMENTS) await run(em, statement);
};
