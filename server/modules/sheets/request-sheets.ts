import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { conflict } from '#server/http/problem.ts';
import { enqueue } from '#server/jobs/enqueue.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { shownRevision } from '#server/modules/records/shown-revision.ts';
import { safeFileName } from '#server/uploads/safe-file-name.ts';
import type { SheetFileBody } from '#shared/generated/api-types.ts';
import { makeSheetsJob } from './make-sheets.job.ts';
import type { Viewer } from './read-sheet-content.ts';

/**
 * Queues the PDF of a batch's record sheets, of the lines as this person sees them now.
 * @returns its id
 * @throws Problem 404 for another contractor's batch as for none; 409 while there is no line to draw
 */
export async function requestSheets(
  em: EntityManager,
  options: { readonly batchId: string; readonly body: SheetFileBody } & Viewer,
): Promise<string> {
  const { batchId, body, actor, ability } = options;
  const revision = await shownRevision(em, {
    batchId,
    contractorId: contractorWall(ability, 'read', 'Batch'),
    actor,
    revision: body.revision,
  });
  const lines = revision
    ? await row<{ n: number; number: string }>(
        em,
        `select count(r.id)::int as n, b.number from batches b left join records r on r.run_id = $2
         where b.id = $1 group by b.number`,
        [batchId, revision.run_id],
      )
    : null;
  if (!revision || !lines || lines.n === 0)
    throw conflict(
      'sheets.none',
      'This batch has no checked line yet, so there is no sheet to print. Hand in a workbook and wait for its check.',
    );
  return em.transactional(async (tx) => {
    const made = await row<{ id: string }>(
      tx,
      `insert into sheet_files (batch_id, run_id, paper, sheets, file_name, requested_by)
       values ($1, $2, $3, $4, $5, $6) returning id`,
      [
        batchId,
        revision.run_id,
        body.paper,
        lines.n,
        safeFileName(`${lines.number}-rev${revision.n}-sheets.pdf`),
        actor.id,
      ],
    );
    if (!made) throw new Error('The new file of sheets has no id.');
    await setProgress(tx, { subject: `sheets:${made.id}`, state: 'queued', done: 0, total: lines.n });
    await enqueue(tx, makeSheetsJob, { sheetFileId: made.id });
    return made.id;
  });
}
