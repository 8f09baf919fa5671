import { run } from '#server/db/rows.ts';
import type { ParkedHandler } from '#server/jobs/define-job.ts';
import { setProgress } from '#server/jobs/progress.ts';
import type { MakeSheetsPayload } from './make-sheets.job.ts';

/** No attempt at a file of sheets is left: whoever waits for it is told. */
export const parkSheets: ParkedHandler<MakeSheetsPayload> = async ({ sheetFileId }, { em }) => {
  const problem = {
    code: 'sheets.failed',
    detail:
      'The sheets could not be written after several attempts. Ask for them again; if that fails too, an administrator can look at the parked job.',
  };
  const failed = await run(
    em,
    `update sheet_files set state = 'failed', problem = $2, finished_at = now()
     where id = $1 and state in ('queued', 'running')`,
    [sheetFileId, JSON.stringify(problem)],
  );
  if (failed > 0)
    await setProgress(em, {
      subject: `sheets:${sheetFileId}`,
      state: 'failed',
      done: 0,
      total: null,
      problem,
    });
};
