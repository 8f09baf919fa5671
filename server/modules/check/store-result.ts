import type { EntityManager } from '@mikro-orm/postgresql';
import { insertDocument } from '#server/db/insert-rows.ts';
import { run } from '#server/db/rows.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { CheckSummary, RowsDocument } from './check-messages.ts';
import { lockForCheck } from './lock-for-check.ts';
import type { StartedRun } from './start-run.ts';

/** Lines stored between two words on progress. */
const STEP = 1_000;

type Checked = {
  readonly run: StartedRun;
  readonly summary: CheckSummary;
  readonly documents: AsyncIterable<RowsDocument>;
  readonly progress: (done: number) => Promise<void>;
};

/** Stores a whole check, or nothing: records, pours, findings, where photographs lie, and that the revision is checked. */
export async function storeResult(em: EntityManager, checked: Checked): Promise<void> {
  const { run: started, summary, documents, progress } = checked;
  await em.transactional(async (tx) => {
    const revision = await lockForCheck(tx, started.revisionId);
    if (!revision || revision.input !== started.input || revision.status !== 'checking') {
      await supersede(tx, started);
      return;
    }
    await insertLines(tx, started.batchId, summary.lines);
    let stored = 0;
    for await (const document of documents) {
      await insertDocument(tx, document.table, document);
      if (document.table !== 'records') continue;
      const before = stored;
      stored += document.rows;
      if (Math.floor(stored / STEP) > Math.floor(before / STEP)) await progress(stored);
    }
    await finish(tx, checked);
  });
}

/** Lines come with ids. Should another have been given to one meanwhile, its records point nowhere and all of it is done again. */
async function insertLines(em: EntityManager, batchId: string, lines: string): Promise<void> {
  await run(
    em,
    `insert into lines (id, batch_id, kind, structure_key, structure_number, occurrence)
     select n.id, $1, n.kind, n.structure_key, n.structure_number, n.occurrence
     from jsonb_to_recordset($2::jsonb) as n(id uuid, kind text, structure_key text, structure_number text, occurrence int)
     on conflict (batch_id, kind, structure_key, occurrence) do nothing`,
    [batchId, lines],
  );
}

async function finish(em: EntityManager, { run: started, summary }: Checked): Promise<void> {
  const { counts } = summary;
  await run(
    em,
    `update check_runs set state = 'done', finished_at = now(), counts = $2, skipped = $3, notices = $4, batch_sheet = $5,
       template = $6 where id = $1`,
    [
      started.id,
      JSON.stringify(counts),
      summary.skipped,
      summary.notices,
      summary.batchSheet,
      summary.templateVersion,
    ],
  );
  await run(em, `update revisions set status = 'checked', run_id = $2, version = version + 1 where id = $1`, [
    started.revisionId,
    started.id,
  ]);
  const total = counts.lines;
  await setProgress(em, { subject: `check:${started.revisionId}`, state: 'done', done: total, total });
  await appendTrail(em, {
    actor: null,
    action: 'batch.checked',
    subject: { type: 'batch', id: started.batchId, label: started.batchNumber },
    payload: { revision: started.n, input: started.input, ...counts },
  });
}

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
