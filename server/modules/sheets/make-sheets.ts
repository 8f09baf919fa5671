import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { EntityManager } from '@mikro-orm/postgresql';
import { findActiveActor } from '#server/auth/find-actor.ts';
import { row, rows, run } from '#server/db/rows.ts';
import type { JobContext, JobHandler } from '#server/jobs/define-job.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { rememberBlob } from '#server/storage/remember-blob.ts';
import { defineAbilityFor, type Actor } from '#shared/permissions/ability.ts';
import { layOutSheet } from './lay-out-sheet.ts';
import type { MakeSheetsPayload } from './make-sheets.job.ts';
import type { Paper } from './paper.ts';
import { readLimits, readSheetContent } from './read-sheet-content.ts';
import { SheetSpool } from './sheet-spool.ts';
import { storeSheets } from './store-sheets.ts';

type Head = {
  id: string;
  run_id: string;
  paper: Paper;
  sheets: number;
  requested_by: string;
  created_at: string;
  number: string;
};

/**
 * Writes a batch's sheets into the blob store. Repeatable: a file that is ready is left alone. Each sheet is read once and
 * waits in a file of its own, since the number of all pages stands on the first.
 */
export const makeSheets: JobHandler<MakeSheetsPayload> = async ({ sheetFileId }, context) => {
  const { services, em } = context;
  const head = await row<Head>(
    em,
    `update sheet_files f set state = 'running', problem = null from batches b
     where f.id = $1 and f.state <> 'ready' and b.id = f.batch_id
     returning f.id, f.run_id, f.paper, f.sheets, f.requested_by, f.created_at, b.number`,
    [sheetFileId],
  );
  if (!head) return;
  const actor = await findActiveActor(services.pool, head.requested_by);
  // An account closed since has nobody to read the file.
  if (!actor) return end(em, { head, detail: 'The account that asked for these sheets has been closed.' });
  const folder = await mkdtemp(join(tmpdir(), 'upstand-sheets-'));
  try {
    const spool = new SheetSpool(join(folder, 'sheets.jsonl'));
    const pages = await readAll(spool, { head, actor, context });
    const stored = await storeSheets(services.blobs, {
      spool,
      paper: head.paper,
      pages,
      title: `Record sheets of batch ${head.number}`,
      author: actor.orgName,
      madeAt: new Date(head.created_at),
      signal: context.signal,
    });
    await em.transactional((tx) => finish(tx, { head, pages, stored }));
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
};

/** Reads every sheet as the person who asked sees it, and counts pages. */
async function readAll(
  spool: SheetSpool,
  { head, actor, context }: { head: Head; actor: Actor; context: JobContext },
): Promise<number> {
  const { services, em, signal } = context;
  const ability = defineAbilityFor(actor);
  const limitsOf = readLimits();
  const records = await rows<{ id: string }>(
    em,
    'select id from records where run_id = $1 order by ordinal',
    [head.run_id],
  );
  let pages = 0;
  for (const [index, { id }] of records.entries()) {
    signal.throwIfAborted();
    const content = await readSheetContent(services.orm.em.fork(), { id, actor, ability, limitsOf });
    pages += layOutSheet(content, head.paper).length;
    await spool.add(content);
    const done = index + 1;
    if (done % 5 === 0 || done === records.length)
      await setProgress(services.orm.em.fork(), {
        subject: `sheets:${head.id}`,
        state: 'running',
        done,
        total: head.sheets,
      });
  }
  await spool.close();
  return pages;
}

async function finish(
  em: EntityManager,
  { head, pages, stored }: { head: Head; pages: number; stored: { sha256: string; size: number } },
): Promise<void> {
  await rememberBlob(em, { ...stored, type: 'application/pdf' });
  await run(
    em,
    `update sheet_files set state = 'ready', pages = $2, sha256 = $3, size = $4, finished_at = now()
     where id = $1 and state = 'running'`,
    [head.id, pages, stored.sha256, stored.size],
  );
  await setProgress(em, {
    subject: `sheets:${head.id}`,
    state: 'done',
    done: head.sheets,
    total: head.sheets,
  });
}

async function end(em: EntityManager, { head, detail }: { head: Head; detail: string }): Promise<void> {
  const problem = { code: 'sheets.refused', detail };
  await run(em, `update sheet_files set state = 'failed', problem = $2, finished_at = now() where id = $1`, [
    head.id,
    JSON.stringify(problem),
  ]);
  await setProgress(em, { subject: `sheets:${head.id}`, state: 'failed', done: 0, total: null, problem });
}
