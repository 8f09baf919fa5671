import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { ABOUT_OF_JOB } from '#server/modules/jobs/job-about.ts';

export type ParkedJob = {
  readonly id: string;
  readonly name: string;
  readonly payload: Readonly<Record<string, unknown>>;
  /** Whose work it is, as people name it; null for a chore, or a subject that is gone. */
  readonly about: string | null;
  readonly attempts: number;
  /** What its last attempt said. */
  readonly problem: string;
  readonly createdAt: string;
  readonly failedAt: string | null;
};

/** SQL over a row of pgboss.job: what its last attempt said. */
export const PROBLEM_OF_JOB = `coalesce(output ->> 'message', output #>> '{value,message}', 'No reason was kept.')`;

/** Jobs whose attempts are used up, newest first; they wait here for an administrator. */
export function listParked(em: EntityManager, limit = 100): Promise<ParkedJob[]> {
  return rows<ParkedJob>(
    em,
    `select id, name, data as payload, ${ABOUT_OF_JOB} as about, retry_count + 1 as attempts,
       ${PROBLEM_OF_JOB} as problem,
       created_on as "createdAt", completed_on as "failedAt"
     from pgboss.job where state = 'failed' order by completed_on desc nulls last, id limit $1`,
    [limit],
  );
}
