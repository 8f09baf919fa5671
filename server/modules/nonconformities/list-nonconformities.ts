import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import type { Nonconformity } from '#shared/generated/api-types.ts';
import { nonconformityConditions, type NonconformityFilter } from './nonconformity-filter.ts';
import {
  NONCONFORMITY_COLUMNS,
  NONCONFORMITY_JOINS,
  type NonconformityDbRow,
} from './nonconformity-select.ts';
import { presentNonconformity } from './present-nonconformity.ts';

/** Counting stops here: beyond it the list says "more than". */
const COUNT_LIMIT = 10_000;

/** Findings of submitted lines that do not conform, latest work day first. */
export async function listNonconformities(
  em: EntityManager,
  query: PageQuery & NonconformityFilter,
): Promise<Page<Nonconformity>> {
  const { limit, after } = parsePage(query, ['day', 'uuid']);
  const where = nonconformityConditions(query);
  const next = where.values.length + 1;
  const found = await rows<NonconformityDbRow>(
    em,
    `${NONCONFORMITY_COLUMNS}
     from (
       select s.* from finding_states s where ${where.sql}
         and ($${next}::date is null or (s.sort_day, s.finding_id) < ($${next}::date, $${next + 1}::uuid))
       order by s.sort_day desc, s.finding_id desc limit $${next + 2}
     ) s ${NONCONFORMITY_JOINS}
     order by s.sort_day desc, s.finding_id desc`,
    [...where.values, after?.[0] ?? null, after?.[1] ?? null, limit + 1],
  );
  return toPage({
    rows: found,
    limit,
    total: after ? null : await count(em, where),
    key: (item) => [item.sort_day, item.id],
    item: presentNonconformity,
  });
}

async function count(em: EntityManager, where: { sql: string; values: unknown[] }): Promise<number | null> {
  const found = await row<{ n: number }>(
    em,
    `select count(*)::int as n from (select 1 from finding_states s where ${where.sql} limit ${COUNT_LIMIT + 1}) counted`,
    where.values,
  );
  return found && found.n <= COUNT_LIMIT ? found.n : null;
}
