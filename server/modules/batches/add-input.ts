import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import { enqueue } from '#server/jobs/enqueue.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { checkRevisionJob } from '#server/modules/check/check-revision.job.ts';
import type { RevisionStatus } from '#shared/review/states.ts';

export type NewInput = {
  readonly kind: 'workbook' | 'photos' | 'placement' | 'recheck';
  readonly sha256?: string;
  readonly fileName?: string;
  readonly size?: number;
  readonly actorId: string | null;
};

/**
 * Gives a locked, open revision its next input and asks for its check, in em's transaction: the job is never seen
 * before the row, nor lost without it.
 */
export async function addInput(
  em: EntityManager,
  revision: { readonly id: string; readonly input: number; readonly status: RevisionStatus },
  input: NewInput,
): Promise<{ id: string; n: number }> {
  const n = revision.input + 1;
  const added = await row<{ id: string }>(
    em,
    `insert into inputs (revision_id, n, kind, sha256, file_name, size, actor_id) values ($1, $2, $3, $4, $5, $6, $7)
     returning id`,
    [
      revision.id,
      n,
      input.kind,
      input.sha256 ?? null,
      input.fileName ?? null,
      input.size ?? null,
      input.actorId,
    ],
  );
  if (!added) throw new Error('The new input has no id.');
  await run(em, 'update revisions set input = $2, status = $3, version = version + 1 where id = $1', [
    revision.id,
    n,
    revision.status,
  ]);
  await setProgress(em, { subject: `check:${revision.id}`, state: 'queued', done: 0, total: 0 });
  // Not coalesced by a key: a check that already runs would swallow the newer one. A superseded check ends at once.
  await enqueue(em, checkRevisionJob, { revisionId: revision.id, input: n });
  return { id: added.id, n };
}
