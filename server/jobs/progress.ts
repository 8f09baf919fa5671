import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';

export const PROGRESS_CHANNEL = 'upstand_progress';

export type Progress = {
  /** Like `check:<revision id>`. */
  readonly subject: string;
  readonly state: 'queued' | 'running' | 'done' | 'failed';
  readonly done: number;
  /** Null: not known yet. */
  readonly total: number | null;
  /** For people: why it failed and what to do. */
  readonly problem?: Readonly<Record<string, unknown>> | null;
};

/** Writes where a job stands and tells who listens. Inside a transaction both are seen at its commit: a long job reports through a manager of its own. */
export async function setProgress(em: EntityManager, progress: Progress): Promise<void> {
  await run(
    em,
    `with written as (
       insert into job_progress (subject, state, done, total, problem) values ($1, $2, $3, $4, $5)
       on conflict (subject) do update
       set state = excluded.state, done = excluded.done, total = excluded.total, problem = excluded.problem, updated_at = now()
       returning subject
     ) select pg_notify($6, subject) from written`,
    [
      progress.subject,
      progress.state,
      progress.done,
      progress.total,
      progress.problem ? JSON.stringify(progress.problem) : null,
      PROGRESS_CHANNEL,
    ],
  );
}

/** Null: nothing was reported on it yet. */
export async function readProgress(
  em: EntityManager,
  subject: string,
): Promise<(Progress & { updatedAt: string }) | null> {
  return row<Progress & { updatedAt: string }>(
    em,
    `select subject, state, done, total, problem, updated_at as "updatedAt" from job_progress where subject = $1`,
    [subject],
  );
}
