import type { EntityManager } from '@mikro-orm/postgresql';
import type { JobHandler } from '#server/jobs/define-job.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { checkBatch } from '#shared/check/check-batch.ts';
import { readSource } from '#shared/workbook/read-source.ts';
import { refusalText } from '#shared/workbook/refusal-text.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import type { CheckRevisionPayload } from './check-revision.job.ts';
import { failCheck, type CheckProblem } from './fail-check.ts';
import { finishEmpty } from './finish-empty.ts';
import { loadContext } from './load-context.ts';
import { nameOtherOrder } from './name-other-order.ts';
import { newestWorkbook } from './newest-workbook.ts';
import { readStoredWorkbook } from './read-stored-workbook.ts';
import { scopeToReturned } from './scope-to-returned.ts';
import { startRun, type StartedRun } from './start-run.ts';
import { storeResult } from './store-result.ts';

/**
 * Checks what was handed in up to an input: workbook to rows to records to findings, stored in one transaction. Ends
 * at once when a newer input came, or when this one was checked already; a run that a dead process left is done again.
 */
export const checkRevision: JobHandler<CheckRevisionPayload> = async (
  payload,
  { services, em, job, signal },
) => {
  const run = await startRun(em, payload);
  if (!run) return;
  try {
    await check(em, run, { services, signal });
  } catch (error) {
    const problem = problemOf(error, job.last);
    if (problem) await failCheck(services.orm.em.fork(), run, problem);
    if (!(error instanceof WorkbookRefused)) throw error;
  }
};

async function check(
  em: EntityManager,
  run: StartedRun,
  tools: Pick<Parameters<JobHandler<CheckRevisionPayload>>[1], 'services' | 'signal'>,
): Promise<void> {
  const { services, signal } = tools;
  const stored = await newestWorkbook(em, run);
  if (!stored) return finishEmpty(em, run);
  const workbook = await readStoredWorkbook(services.blobs, stored.sha256, signal);
  const whole = readSource(workbook);
  const loaded = await loadContext(em, run, whole);
  const named = nameOtherOrder(whole, loaded.orderNumber);
  const source = run.n === 0 ? named : scopeToReturned(named, loaded.returned);
  const report = services.orm.em.fork();
  const progress = (done: number) =>
    setProgress(report, {
      subject: `check:${run.revisionId}`,
      state: 'running',
      done,
      total: source.lines.length,
    });
  await progress(0);
  const result = checkBatch(source, loaded.context);
  signal.throwIfAborted();
  await storeResult(em, { run, source, result, loaded, progress });
}

/** What the person is told; null while the queue will try again by itself. */
function problemOf(error: unknown, last: boolean): CheckProblem | null {
  if (error instanceof WorkbookRefused)
    return {
      code: `workbook.${error.code}`,
      detail: refusalText(error),
      params: error.params,
    };
  if (!last) return null;
  return {
    code: 'check.failed',
    detail:
      'The check could not be finished, and what you uploaded is kept. Upload the workbook again; if it goes on, tell the administrator.',
  };
}
