import { randomUUID } from 'node:crypto';
import { createProduct } from '#tests/factories/foam.ts';
import { createStandard } from '#tests/factories/standards.ts';
import { createWorkOrder } from '#tests/factories/work-orders.ts';
import { copyRows } from './copy-rows.ts';
import { map } from './seed-spread.ts';
import type { Bench } from './start-bench.ts';

const CONTRACTORS = 20;
const ORDERS = 200;
const LOTS = 400;

/** One batch an order. */
export type SeededBatch = {
  id: string;
  revision: string;
  run: string;
  order: string;
  contractor: string;
  concession: string;
};

/** What the records stand on: people, a standard, a product with its lots, orders and their batches. */
export async function seedBase(bench: Bench) {
  const em = bench.em();
  const author = await bench.person('engineer');
  const approver = await bench.person('engineer');
  const clerk = await bench.person('clerk');
  const standard = await createStandard(em, { authorId: author.id, approverId: approver.id });
  const product = await createProduct(em);
  const contractors: string[] = [];
  for (let n = 0; n < CONTRACTORS; n += 1) contractors.push((await bench.person('contractor')).orgId);
  const lots = Array.from({ length: LOTS }, (_, n) => ({ id: randomUUID(), number: `LK-${1_000 + n}` }));
  await copyRows(
    bench.ownerUrl,
    { table: 'lots', columns: ['id', 'product_id', 'number', 'expires_on'] },
    map(lots, (lot) => [lot.id, product.id, lot.number, '2035-12-31']),
  );
  const batches: SeededBatch[] = [];
  for (let n = 0; n < ORDERS; n += 1) {
    const contractor = contractors[n % CONTRACTORS]!;
    const order = await createWorkOrder(em, { contractorId: contractor });
    batches.push({
      id: randomUUID(),
      revision: randomUUID(),
      run: randomUUID(),
      order: order.id,
      contractor,
      concession: randomUUID(),
    });
  }
  const at = '2026-01-05T12:00:00Z';
  const fill = (
    table: string,
    columns: readonly string[],
    make: (batch: SeededBatch, n: number) => readonly (string | number | null)[],
  ) => copyRows(bench.ownerUrl, { table, columns }, batches.map(make));
  await fill('batches', ['id', 'number', 'work_order_id', 'contractor_id'], (each, n) => [
    each.id,
    `B-${n + 1}`,
    each.order,
    each.contractor,
  ]);
  await fill(
    'check_runs',
    ['id', 'revision_id', 'input', 'engine', 'schema', 'state', 'finished_at'],
    (each) => [each.run, each.revision, 1, '1', 'v1', 'done', at],
  );
  await fill(
    'revisions',
    ['id', 'batch_id', 'n', 'status', 'input', 'run_id', 'submitted_at', 'decided_at'],
    (each) => [each.revision, each.id, 0, 'on-record', 1, each.run, at, at],
  );
  await fill(
    'concessions',
    ['id', 'number', 'revision_id', 'contractor_id', 'work_order_id', 'reason'],
    (each, n) => [each.concession, `C-${n + 1}`, each.revision, each.contractor, each.order, 'As built.'],
  );
  await fill('concession_events', ['concession_id', 'seq', 'type', 'condition'], (each) => [
    each.concession,
    1,
    'granted',
    'Looked at each year.',
  ]);
  return { standard: standard.id, product: product.code, clerk: clerk.id, contractors, lots, batches };
}
