import { randomUUID } from 'node:crypto';
import { copyRows } from './copy-rows.ts';
import type { SeededBatch } from './seed-base.ts';
import { dayOf, map, numberOf, type STATES } from './seed-spread.ts';
import type { Bench } from './start-bench.ts';

/** One finding a record with its decision, its state and, where it was rejected, its action. */
export async function seedFindings(
  bench: Bench,
  rows: {
    all: readonly number[];
    record: readonly string[];
    line: readonly string[];
    batch: (n: number) => SeededBatch;
    codeOf: (n: number) => string;
    stateOf: (n: number) => (typeof STATES)[number];
  },
): Promise<void> {
  const { all, record, line, batch, codeOf, stateOf } = rows;
  const url = bench.ownerUrl;
  const finding = new Map(all.map((n) => [n, randomUUID()]));
  const decided = all.filter((n) => stateOf(n) !== 'open');
  const outcome = (n: number) =>
    stateOf(n) === 'rejected' ? 'rejected' : stateOf(n) === 'open' ? 'open' : 'approved';
  const grounds = (n: number) =>
    stateOf(n) === 'concession' ? 'concession' : stateOf(n) === 'approved' ? 'evidence' : null;
  const severity = (n: number) => (n % 10 === 0 ? 'query' : 'nonconformity');
  await copyRows(
    url,
    {
      table: 'findings',
      columns: [
        'id',
        'run_id',
        'revision_id',
        'record_id',
        'line_id',
        'ordinal',
        'code',
        'severity',
        'kind',
        'structure_number',
        'occurrence',
        'sheet',
        'row',
        'cell',
        'field',
        'measured',
        'limit_value',
        'margin',
        'unit',
        'uncertainty',
        'params',
        'fingerprint',
      ],
    },
    map(all, (n) => [
      finding.get(n)!,
      batch(n).run,
      batch(n).revision,
      record[n]!,
      line[n]!,
      n + 1,
      codeOf(n),
      severity(n),
      'set',
      numberOf(n),
      1,
      'Set',
      n + 4,
      `G${n + 4}`,
      'embedmentFt',
      '5.5',
      '6',
      -0.5,
      'ft',
      0.08,
      '{}',
      `f${n}`,
    ]),
  );
  await copyRows(
    url,
    {
      table: 'decisions',
      columns: [
        'finding_id',
        'revision_id',
        'seq',
        'decision',
        'grounds',
        'action',
        'reason',
        'concession_id',
      ],
    },
    map(decided, (n) => [
      finding.get(n)!,
      batch(n).revision,
      1,
      outcome(n) === 'rejected' ? 'reject' : 'approve',
      grounds(n),
      outcome(n) === 'rejected' ? 'rework' : null,
      'As seen.',
      stateOf(n) === 'concession' ? batch(n).concession : null,
    ]),
  );
  await copyRows(
    url,
    {
      table: 'finding_states',
      columns: [
        'finding_id',
        'revision_id',
        'batch_id',
        'record_id',
        'line_id',
        'contractor_id',
        'work_order_id',
        'code',
        'severity',
        'work_day',
        'sort_day',
        'state',
        'grounds',
        'action',
        'version',
      ],
    },
    map(all, (n) => [
      finding.get(n)!,
      batch(n).revision,
      batch(n).id,
      record[n]!,
      line[n]!,
      batch(n).contractor,
      batch(n).order,
      codeOf(n),
      severity(n),
      dayOf(n),
      dayOf(n),
      outcome(n),
      grounds(n),
      outcome(n) === 'rejected' ? 'rework' : null,
      stateOf(n) === 'open' ? 0 : 1,
    ]),
  );
  const rejected = all.filter((n) => stateOf(n) === 'rejected');
  await copyRows(
    url,
    { table: 'actions', columns: ['finding_id', 'type', 'due_on'] },
    map(rejected, (n) => [finding.get(n)!, 'rework', dayOf(n)]),
  );
}
