import type { EntityManager } from '@mikro-orm/postgresql';
import type { Services } from '#server/container.ts';
import { row, rows, run } from '#server/db/rows.ts';
import type { JobDefinition } from '#server/jobs/define-job.ts';
import { PROBLEM_OF_JOB } from '#server/jobs/list-parked.ts';
import { jobWords } from '#server/modules/jobs/job-words.ts';
import { appendTrail } from '#server/trail/append-trail.ts';

const UNSETTLED = `state = 'failed' and coalesce(output -> 'settled', 'false') <> 'true'`;

type Parked = { payload: object; attempts: number; reason: string };

/**
 * Tells the subject of each newly parked job that nothing more is tried, and the trail. It does not matter who parked
 * it: the attempt itself, a worker that found its process dead, or the queue when its time was up. Any number of workers
 * may; each parking is told once. Returns how many were.
 */
export async function settleParked(
  services: Services,
  jobs: readonly JobDefinition<never>[],
): Promise<number> {
  const byName = new Map(jobs.map((job) => [job.name, job]));
  const found = await rows<{ name: string; id: string }>(
    services.orm.em.fork(),
    `select name, id from pgboss.job where name = any($1) and ${UNSETTLED} order by completed_on, id limit 100`,
    [[...byName.keys()]],
  );
  let settled = 0;
  for (const { name, id } of found) {
    const definition = byName.get(name);
    if (!definition) continue;
    try {
      if (await services.orm.em.fork().transactional((tx) => settle(tx, definition, id))) settled += 1;
    } catch (error) {
      // The others are told all the same; this one is come back to.
      services.log.error({ err: error, job: name, id }, 'a parked job could not be told to its subject');
    }
  }
  return settled;
}

async function settle(em: EntityManager, definition: JobDefinition<never>, id: string): Promise<boolean> {
  const { name } = definition;
  const job = await row<Parked>(
    em,
    `select data as payload, retry_count + 1 as attempts, ${PROBLEM_OF_JOB} as reason
     from pgboss.job where name = $1 and id = $2 and ${UNSETTLED} for update skip locked`,
    [name, id],
  );
  if (!job) return false;
  const loaded = await definition.loadParked?.();
  await loaded?.parked(job.payload as never, { em, reason: job.reason });
  await appendTrail(em, {
    actor: null,
    action: 'job.parked',
    subject: { type: 'job', id, label: jobWords(name).title },
    payload: { name, attempts: job.attempts, reason: job.reason.slice(0, 1_000) },
  });
  // A retry that fails writes its own output, without this mark, and is told anew.
  await run(
    em,
    `update pgboss.job set output = case when jsonb_typeof(output) = 'object' then output else '{}' end || '{"settled": true}'
     where name = $1 and id = $2`,
    [name, id],
  );
  return true;
}
