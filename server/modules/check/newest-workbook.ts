import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import type { StartedRun } from './start-run.ts';

/** The workbook that counts for a run: the newest of its revision up to its input, else of the revision before. */
export function newestWorkbook(
  em: EntityManager,
  run: Pick<StartedRun, 'batchId' | 'n' | 'input'>,
): Promise<{ sha256: string; fileName: string } | null> {
  return row(
    em,
    `select i.sha256, i.file_name as "fileName" from revisions v join inputs i on i.revision_id = v.id
     where v.batch_id = $1 and i.kind = 'workbook' and (v.n < $2 or (v.n = $2 and i.n <= $3))
     order by v.n desc, i.n desc limit 1`,
    [run.batchId, run.n, run.input],
  );
}
