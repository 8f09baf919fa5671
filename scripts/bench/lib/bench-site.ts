import { rmSync } from 'node:fs';
import { mkdtemp } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { numberOf, VIEWS, writeBenchWorkbook } from '#scripts/bench/check/bench-workbook.ts';
import { row, run } from '#server/db/rows.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { createProduct } from '#tests/factories/foam.ts';
import { createStandard } from '#tests/factories/standards.ts';
import { createWorkOrder, type WorkOrder } from '#tests/factories/work-orders.ts';
import type { Bench } from './start-bench.ts';

export type BenchSite = { readonly contractor: Actor; readonly order: WorkOrder; readonly folder: string };

/** The demo's standard and product, the lot that the bench's workbooks name, and a work order with its design list. */
export async function benchSite(bench: Bench, options: { lines: number }): Promise<BenchSite> {
  const em = bench.em();
  const author = await bench.person('engineer');
  const approver = await bench.person('engineer');
  await createStandard(em, { authorId: author.id, approverId: approver.id });
  const product = await createProduct(em);
  const lot = await row<{ id: string }>(
    em,
    `insert into lots (product_id, number, expires_on) values ($1, 'LK-2291', '2035-12-31') returning id`,
    [product.id],
  );
  await run(
    em,
    `insert into lot_events (lot_id, type, kit_ft3, quantity)
     select $1, 'received', * from (values (1.5, 1000000), (4, 1000000), (8, 1000000)) as kits (ft3, n)`,
    [lot?.id],
  );
  const contractor = await bench.person('contractor');
  const order = await createWorkOrder(em, {
    contractorId: contractor.orgId,
    planned: Array.from({ length: options.lines }, (_, index) => ({ structureNumber: numberOf(index) })),
  });
  const folder = await mkdtemp(join(tmpdir(), 'upstand-bench-files-'));
  process.once('exit', () => rmSync(folder, { recursive: true, force: true }));
  return { contractor, order, folder };
}

/** The path of a workbook of so many lines for the site's order. */
export async function benchWorkbookFile(site: BenchSite, lines: number): Promise<string> {
  const file = join(site.folder, `${lines}.xlsx`);
  await writeBenchWorkbook(file, lines, site.order.number);
  return file;
}

/** Rows of four photographs a line as if uploaded and not yet measured, named so that the check places them. No files. */
export async function seedPhotographs(
  bench: Bench,
  options: { batchId: string; lines: number },
): Promise<void> {
  const { batchId, lines } = options;
  const names = Array.from({ length: lines }, (_, index) =>
    VIEWS.map((view) => `${numberOf(index)} ${view}.jpg`),
  ).flat();
  await bench.database.query(
    `with named as (
       select name, encode(sha256(convert_to($1::text || name, 'UTF8')), 'hex') as sha256 from unnest($2::text[]) name
     ), stored as (
       insert into blobs (sha256, size) select sha256, 1 from named
     )
     insert into photos (batch_id, revision_id, sha256, file_name)
     select $1::uuid, (select id from revisions where batch_id = $1::uuid), sha256, name from named`,
    [batchId, names],
  );
}
