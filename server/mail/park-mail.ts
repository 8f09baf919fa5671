import { run } from '#server/db/rows.ts';
import type { ParkedHandler } from '#server/jobs/define-job.ts';

/** No attempt at a message is left: the outbox says so beside the server's last word. */
export const parkMail: ParkedHandler<{ outboxId: string }> = async ({ outboxId }, { em, reason }) => {
  await run(
    em,
    `update outbox set state = 'failed', last_error = coalesce(last_error, $2) where id = $1 and state = 'queued'`,
    [outboxId, reason.slice(0, 1_000)],
  );
};
