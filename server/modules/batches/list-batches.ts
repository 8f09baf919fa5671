import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import type { RevisionStatus } from '#shared/review/states.ts';
import { BATCH_SELECT, type BatchDbRow } from './batch-select.ts';

export type BatchQuery = PageQuery & {
  status?: RevisionStatus[];
  workOrder?: string;
  contractor?: string;
};

const WHERE = `
where ($1::uuid is null or b.contractor_id = $1)
  and ($2::text[] is null or v.status = any($2))
  and ($3::uuid is null or b.work_order_id = $3)
  and ($4::uuid is null or b.contractor_id = $4)`;

/** Batches behind the wall, newest first. */
export async function listBatches<Item>(
  em: EntityManager,
  options: { query: BatchQuery; contractorId: string | null; item: (row: BatchDbRow) => Item },
): Promise<Page<Item>> {
  const { query, contractorId, item } = options;
  const { limit, after } = parsePage(query, ['instant', 'uuid']);
  const filter = [contractorId, query.status ?? null, query.workOrder ?? null, query.contractor ?? null];
  const found = await rows<BatchDbRow>(
    em,
    `${BATCH_SELECT} ${WHERE}
     and ($5::timestamptz is null or (b.created_at, b.id) < ($5, $6::uuid))
     order by b.created_at desc, b.id desc limit $7`,
    [...filter, after?.[0] ?? null, after?.[1] ?? null, limit + 1],
  );
  const total = after === null ? await countBatches(em, filter) : null;
  return toPage({ rows: found, limit, total, key: (row) => [row.created_at, row.id], item });
}

async function countBatches(em: EntityManager, filter: readonly unknown[]): Promise<number> {
  const [counted] = await rows<{ n: number }>(
    em,
    `select count(*) as n from batches b
     join lateral (select status from revisions where batch_id = b.id order by n desc limit 1) v on true ${WHERE}`,
    filter,
  );
  return counted?.n ?? 0;
}
