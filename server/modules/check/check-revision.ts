import type { EntityManager } from '@mikro-orm/postgresql';
import type { JobHandler } from '#server/jobs/define-job.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { refusalText } from '#shared/workbook/refusal-text.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import type { CheckRevisionPayload } from './check-revision.job.ts';
import { failCheck } from './fail-check.ts';
import { finishEmpty } from './finish-empty.ts';
import { loadContext } from './load-context.ts';
import { newestWorkbook } from './newest-workbook.ts';
import { startRun, type StartedRun } from './start-run.ts';
import { storeResult } from './store-result.ts';
import { withCheckProcess } from './with-check-process.ts';

/**
 * Checks what was handed in up to an input: workbook to rows to records to findings, stored in one transaction. Ends
 * at once when a newer input came, or when this one was checked already; a run that a dead process left is done again.
 */
export const checkRevision: JobHandler<CheckRevisionPayload> = async (payload, { services, em, signal }) => {
  const run = await startRun(em, payload);
  if (!run) return;
  try {
    await check(em, run, { services, signal });
  } catch (error) {
    // Anything else is tried again, and told by parkCheck when no attempt is left.
    if (!(error instanceof WorkbookRefused)) throw error;
    await failCheck(services.orm.em.fork(), run, {
      code: `workbook.${error.code}`,
      detail: refusalText(error),
      params: error.params,
    });
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
  await withCheckProcess({ blobs: services.blobs, sha256: stored.sha256, signal }, async (checking) => {
    const needs = await checking.needs();
    const report = services.orm.em.fork();
    const progress = (done: number, total: number | null) =>
      setProgress(report, { subject: `check:${run.revisionId}`, state: 'running', done, total });
    // Of a returned revision some lines only are checked.
    await progress(0, run.n === 0 ? needs.lines : null);
    const summary = await checking.compute(await loadContext(em, run, needs));
    signal.throwIfAborted();
    await storeResult(em, {
      run,
      summary,
      documents: checking.documents(),
      progress: (done) => progress(done, summary.counts.lines),
    });
  });
}
