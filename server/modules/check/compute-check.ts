import { rowsDocument } from '#server/db/insert-rows.ts';
import { checkBatch } from '#shared/check/check-batch.ts';
import { nameOtherOrder } from '#shared/check/name-other-order.ts';
import type { CheckResult } from '#shared/check/types.ts';
import { countFindings } from '#shared/findings/count-findings.ts';
import type { SourceBatch } from '#shared/records/types.ts';
import { assignLines } from './assign-lines.ts';
import type { CheckInputs, CheckSummary, RowsDocument, StoredTable } from './check-messages.ts';
import { findingRows } from './finding-rows.ts';
import { knownLines } from './load-lines.ts';

import { placePhotos } from './place-photos.ts';
import { placingRows } from './placing-rows.ts';
import { recordIds, recordRows } from './record-rows.ts';
import { scopeToReturned } from './scope-to-returned.ts';
import { storableJson } from './storable-json.ts';

/** Rows in one document: a message and a statement each, small enough that neither holds anybody up. */
const RECORDS = 250;
const ROWS = 1_000;

export type ComputedCheck = {
  readonly summary: CheckSummary;
  /** Made one after the other as they are asked for; records before what hangs on them. */
  readonly documents: () => Generator<RowsDocument>;
};

/** A whole check without any store: source rows and what the batch knows in, rows to be written out. Pure but for the new ids. */
export function computeCheck(whole: SourceBatch, { frame, lists }: CheckInputs): ComputedCheck {
  const { run, lots } = frame;
  const known = knownLines(lists.lines);
  const named = nameOtherOrder(whole, frame.orderNumber);
  const source = run.n === 0 ? named : scopeToReturned(named, known.returned);
  const placing = placePhotos({ photos: lists.photos, source, known });
  const result = checkBatch(source, {
    ...frame.context,
    lots: lots.map(({ id: _id, ...lot }) => lot),
    design: lists.design,
    photos: placing.byLine,
    siblings: known.standing,
    previous: new Map(lists.previous),
  });
  const lines = assignLines(result.records, lists.lines);
  const ids = recordIds(result.records);
  return {
    summary: summaryOf(source, result, rowsDocument(lines.rows)),
    documents: function* documents() {
      const tools = { run, lots, findings: result.findings, lineIds: lines.ids, recordIds: ids };
      for (let at = 0; at < result.records.length; at += RECORDS) {
        const slice = recordRows({ ...tools, records: result.records.slice(at, at + RECORDS), from: at });
        yield* inDocuments('records', slice.records);
        yield* inDocuments('pours', slice.pours);
      }
      yield* inDocuments('findings', findingRows({ ...tools, started: run }));
      yield* inDocuments('photo_matches', placingRows({ started: run, placing, lineIds: lines.ids }));
    },
  };
}

function* inDocuments(
  table: StoredTable,
  rows: readonly Readonly<Record<string, unknown>>[],
): Generator<RowsDocument> {
  const columns = Object.keys(rows[0] ?? {});
  for (let at = 0; at < rows.length; at += ROWS) {
    const some = rows.slice(at, at + ROWS);
    yield { table, columns, text: rowsDocument(some), rows: some.length };
  }
}

function summaryOf(source: SourceBatch, result: CheckResult, lines: string): CheckSummary {
  const { records, findings } = result;
  return {
    lines,
    counts: {
      lines: records.length,
      ...countFindings(findings),
      incomplete: findings.filter(isIncomplete).length,
      standards: [...new Set(records.map((record) => record.standardNumber))].toSorted((a, b) => a - b),
    },
    skipped: JSON.stringify(storableJson(result.skipped)),
    notices: JSON.stringify(storableJson(source.notices)),
    batchSheet: JSON.stringify(storableJson({ values: source.batch.values, cells: source.batch.cells })),
    templateVersion: source.templateVersion === null ? null : storableJson(source.templateVersion),
  };
}

const isIncomplete = (finding: CheckResult['findings'][number]): boolean =>
  finding.severity === 'nonconformity' && finding.code.startsWith('record-');
