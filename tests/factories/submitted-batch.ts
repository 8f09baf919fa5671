import type { EntityManager } from '@mikro-orm/postgresql';
import { insertRowsReturning } from '#server/db/insert-rows.ts';
import { nextBatchNumber } from '#server/db/next-number.ts';
import { row, run } from '#server/db/rows.ts';

export type SubmittedBatch = {
  id: string;
  number: string;
  revisionId: string;
  runId: string;
  lines: { lineId: string; recordId: string; structureNumber: string; findingIds: string[] }[];
};

async function insertOne(em: EntityManager, sql: string, values: readonly unknown[]): Promise<string> {
  const made = await row<{ id: string }>(em, `${sql} returning id`, values);
  if (made === null) throw new Error('Nothing was inserted.');
  return made.id;
}

/** A batch as submission leaves it, written straight into the tables: one line a structure, with the named findings, no files. */
export async function createSubmittedBatch(
  em: EntityManager,
  options: {
    workOrder: { id: string; contractorId: string };
    workDay?: string;
    lines: readonly { structureNumber: string; findings: readonly string[] }[];
  },
): Promise<SubmittedBatch> {
  return em.transactional(async (tx) => {
    const { workOrder } = options;
    const number = await nextBatchNumber(tx, workOrder.id);
    if (number === null) throw new Error('There is no such work order.');
    const id = await insertOne(
      tx,
      'insert into batches (number, work_order_id, contractor_id) values ($1, $2, $3)',
      [number, workOrder.id, workOrder.contractorId],
    );
    const revisionId = await insertOne(tx, 'insert into revisions (batch_id, n, input) values ($1, 0, 1)', [
      id,
    ]);
    const runId = await insertOne(
      tx,
      `insert into check_runs (revision_id, input, engine, schema, state, finished_at) values ($1, 1, 'test', '1', 'done', now())`,
      [revisionId],
    );
    const lines: SubmittedBatch['lines'] = [];
    let ordinal = 0;
    for (const [at, line] of options.lines.entries()) {
      const lineId = await insertOne(
        tx,
        `insert into lines (batch_id, kind, structure_key, structure_number, revision_id) values ($1, 'set', $2, $2, $3)`,
        [id, line.structureNumber, revisionId],
      );
      const [record] = await insertRowsReturning<{ id: string }>(tx, {
        table: 'records',
        list: [
          {
            run_id: runId,
            revision_id: revisionId,
            line_id: lineId,
            ordinal: at,
            kind: 'set',
            structure_number: line.structureNumber,
            sheet: 'Set',
            row: at + 4,
            raw: {},
            values: {},
            derived: {},
            schema: 'set/v1',
            work_order_id: workOrder.id,
            contractor_id: workOrder.contractorId,
            work_day: options.workDay ?? '2026-04-14',
            nonconformities: line.findings.length,
            rule_codes: line.findings,
          },
        ],
        returning: ['id'],
      });
      const recordId = record?.id ?? '';
      await run(tx, 'update lines set record_id = $2 where id = $1', [lineId, recordId]);
      const findings = await insertRowsReturning<{ id: string }>(tx, {
        table: 'findings',
        list: line.findings.map((code) => ({
          run_id: runId,
          revision_id: revisionId,
          record_id: recordId,
          line_id: lineId,
          ordinal: ordinal++,
          code,
          severity: 'nonconformity',
          kind: 'set',
          structure_number: line.structureNumber,
          fingerprint: `${code}|${line.structureNumber}`,
        })),
        returning: ['id'],
      });
      const findingIds = findings.map((finding) => finding.id);
      lines.push({ lineId, recordId, structureNumber: line.structureNumber, findingIds });
    }
    await run(
      tx,
      `update revisions set status = 'submitted', run_id = $2, submitted_at = now() where id = $1`,
      [revisionId, runId],
    );
    await run(tx, 'select open_findings($1)', [runId]);
    return { id, number, revisionId, runId, lines };
  });
}
