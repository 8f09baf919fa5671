import { afterAll, beforeAll, expect, it } from 'vitest';
import { row, rows, run } from '#server/db/rows.ts';
import { createOrganisation } from '#tests/factories/people.ts';
import { createSubmittedBatch, type SubmittedBatch } from '#tests/factories/submitted-batch.ts';
import { createWorkOrder } from '#tests/factories/work-orders.ts';
import { createDataHarness, type DataHarness } from '#tests/setup/data-harness.ts';

let data: DataHarness;
let batch: SubmittedBatch;
const em = () => data.orm.em.fork();

beforeAll(async () => {
  data = await createDataHarness();
  const contractor = await createOrganisation(em(), { kind: 'contractor' });
  const workOrder = await createWorkOrder(em(), { contractorId: contractor.id, number: '17' });
  batch = await createSubmittedBatch(em(), {
    workOrder,
    lines: [{ structureNumber: 'P-1', findings: ['fill-short', 'water-deep'] }],
  });
});
afterAll(() => data.close());

const finding = (at: number) => batch.lines[0]?.findingIds[at] ?? '';
const decide = (at: number, decision: Record<string, unknown>) =>
  run(
    em(),
    `insert into decisions (finding_id, revision_id, seq, decision, grounds, action, reason)
     values ($1, $2, $3, $4, $5, $6, 'as seen on the photograph')`,
    [
      finding(at),
      batch.revisionId,
      decision.seq,
      decision.decision,
      decision.grounds ?? null,
      decision.action ?? null,
    ],
  );
const stateOf = (at: number) =>
  row(em(), 'select state, grounds, action, version from finding_states where finding_id = $1', [
    finding(at),
  ]);

it('numbers the batch within its order', () => {
  expect(batch.number).toBe('17-01');
});

it('a decision shows in the finding’s state, and undoing it is a further row', async () => {
  expect(await stateOf(0)).toEqual({ state: 'open', grounds: null, action: null, version: 0 });
  await decide(0, { seq: 1, decision: 'approve', grounds: 'evidence' });
  expect(await stateOf(0)).toEqual({ state: 'approved', grounds: 'evidence', action: null, version: 1 });
  await decide(0, { seq: 2, decision: 'undo' });
  expect(await stateOf(0)).toEqual({ state: 'open', grounds: null, action: null, version: 2 });
  await decide(0, { seq: 3, decision: 'reject', action: 'rework' });
  expect(await stateOf(0)).toEqual({ state: 'rejected', grounds: null, action: 'rework', version: 3 });
  expect(
    await rows(em(), 'select decision from decisions where finding_id = $1 order by seq', [finding(0)]),
  ).toEqual([{ decision: 'approve' }, { decision: 'undo' }, { decision: 'reject' }]);
});

it('of two decisions on one version one is refused', async () => {
  const outcomes = await Promise.allSettled([
    decide(1, { seq: 1, decision: 'approve', grounds: 'evidence' }),
    decide(1, { seq: 1, decision: 'reject', action: 'correct' }),
  ]);
  expect(outcomes.map((outcome) => outcome.status).toSorted()).toEqual(['fulfilled', 'rejected']);
  await expect(decide(1, { seq: 3, decision: 'undo' })).rejects.toMatchObject({ code: 'UP004' });
});

it('a decision lacks neither grounds nor what is due', async () => {
  await expect(decide(1, { seq: 2, decision: 'approve' })).rejects.toMatchObject({ code: '23514' });
  await expect(decide(1, { seq: 2, decision: 'reject' })).rejects.toMatchObject({ code: '23514' });
  await expect(decide(1, { seq: 2, decision: 'approve', grounds: 'concession' })).rejects.toMatchObject({
    code: '23514',
  });
});

it('opening the findings of a run again changes nothing', async () => {
  expect(await row(em(), 'select open_findings($1) as added', [batch.runId])).toEqual({ added: 0 });
  expect(await stateOf(0)).toMatchObject({ state: 'rejected', version: 3 });
});

it('a submitted revision takes no more files', async () => {
  await expect(
    run(em(), `insert into inputs (revision_id, n, kind) values ($1, 2, 'photos')`, [batch.revisionId]),
  ).rejects.toMatchObject({ code: 'UP003' });
});

it('a batch has one open revision', async () => {
  await expect(
    run(em(), 'insert into revisions (batch_id, n) values ($1, 1)', [batch.id]),
  ).rejects.toMatchObject({ code: '23505' });
});
