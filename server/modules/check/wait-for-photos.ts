import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';
import { readProgress } from '#server/jobs/progress.ts';
import type { CheckRevisionPayload } from './check-revision.job.ts';
import { ENGINE, RECORD_SCHEMA } from './engine.ts';

/**
 * Puts a check off while photographs of its batch are still being prepared: what it finds must not hang on which of two
 * jobs was quicker. Whoever ends with the photographs asks for it again (finish-photos.ts). Call it with the batch locked.
 * @returns whether it was put off
 */
export async function waitForPhotos(
  em: EntityManager,
  { revisionId, input }: CheckRevisionPayload,
  batchId: string,
): Promise<boolean> {
  const superseded = {
    code: 'check.superseded',
    detail: 'A newer upload took its place before it was begun.',
  };
  await run(
    em,
    `update check_runs set state = 'failed', problem = $3, finished_at = now()
     where revision_id = $1 and input < $2 and state = 'queued'`,
    [revisionId, input, JSON.stringify(superseded)],
  );
  const photos = await readProgress(em, `photos:${batchId}`);
  if (photos?.state !== 'queued' && photos?.state !== 'running') return false;
  await run(
    em,
    `insert into check_runs (revision_id, input, engine, schema, state) values ($1, $2, $3, $4, 'queued')
     on conflict (revision_id, input, engine) do update set state = 'queued', problem = null, finished_at = null
     where check_runs.state <> 'done'`,
    [revisionId, input, ENGINE, RECORD_SCHEMA],
  );
  return true;
}
