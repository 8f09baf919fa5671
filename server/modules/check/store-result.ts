import type { EntityManager } from '@mikro-orm/postgresql';
import { insertRows } from '#server/db/insert-rows.ts';
import { run } from '#server/db/rows.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { CheckResult } from '#shared/check/types.ts';
import { countFindings } from '#shared/findings/count-findings.ts';
import type { SourceBatch } from '#shared/records/types.ts';
import type { LoadedContext } from './load-context.ts';
import { lockForCheck } from './lock-for-check.ts';
import { findingRows } from './finding-rows.ts';
import { recordRows } from './record-rows.ts';
import type { StartedRun } from './start-run.ts';
import { storableJson } from './storable-json.ts';
import { storePlacing } from './store-placing.ts';
import { upsertLines } from './upsert-lines.ts';

/** Lines stored between two words on progress. */
const STEP = 1_000;

type Checked = {
  readonly run: StartedRun;
  readonly source: SourceBatch;
  readonly result: CheckResult;
  readonly loaded: LoadedContext;
  readonly progress: (done: number) => Promise<void>;
};

/** Stores a whole check, or nothing: records, pours, findings, where photographs lie, and that the revision is checked. */
export async function storeResult(em: EntityManager, checked: Checked): Promise<void> {
  const { run: started, result } = checked;
  await em.transactional(async (tx) => {
    const revision = await lockForCheck(tx, started.revisionId);
    if (!revision || revision.input !== started.input || revision.status !== 'checking') {
      await supersede(tx, started);
      return;
    }
    const lineIds = await upsertLines(tx, { batchId: started.batchId, records: result.records });
    const { records, pours, idByKey } = recordRows({ ...checked, lineIds });
    for (let at = 0; at < records.length; at += STEP) {
      await insertRows(tx, 'records', records.slice(at, at + STEP));
      await checked.progress(Math.min(at + STEP, records.length));
    }
    await insertRows(tx, 'pours', pours);
    await insertRows(tx, 'findings', findingRows({ started, findings: result.findings, idByKey, lineIds }));
    await storePlacing(tx, { started, placing: checked.loaded.placing, lineIds });
    await finish(tx, checked);
  });
}

async function finish(em: EntityManager, { run: started, source, result }: Checked): Promise<void> {
  const counts = {
    lines: result.records.length,
    ...countFindings(result.findings),
    incomplete: result.findings.filter(isIncomplete).length,
    standards: [...new Set(result.records.map((record) => record.standardNumber))].toSorted((a, b) => a - b),
  };
  await run(
    em,
    `update check_runs set state = 'done', finished_at = now(), counts = $2, skipped = $3, notices = $4, batch_sheet = $5,
       template = $6 where id = $1`,
    [
      started.id,
      JSON.stringify(counts),
      JSON.stringify(storableJson(result.skipped)),
      JSON.stringify(storableJson(source.notices)),
      JSON.stringify(storableJson({ values: source.batch.values, cells: source.batch.cells })),
      source.templateVersion === null ? null : storableJson(source.templateVersion),
    ],
  );
  await run(em, `update revisions set status = 'checked', run_id = $2, version = version + 1 where id = $1`, [
    started.revisionId,
    started.id,
  ]);
  const total = result.records.length;
  await setProgress(em, { subject: `check:${started.revisionId}`, state: 'done', done: total, total });
  await appendTrail(em, {
    actor: null,
    action: 'batch.checked',
    subject: { type: 'batch', id: started.batchId, label: started.batchNumber },
    payload: { revision: started.n, input: started.input, ...counts },
  });
}

const isIncomplete = (finding: CheckResult['findings'][number]): boolean =>
  finding.severity === 'nonconformity' && finding.code.startsWith('record-');

function supersede(em: EntityManager, started: StartedRun): Promise<number> {
  const problem = {
    code: 'check.superseded',
    detail: 'A newer upload took its place before it was finished.',
  };
  return run(
    em,
    `update check_runs set state = 'failed', problem = $2, finished_at = now() where id = $1 and state = 'running'`,
    [started.id, JSON.stringify(problem)],
  );
}
