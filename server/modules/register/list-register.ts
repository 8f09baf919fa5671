import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { parsePage, toPage, type CursorType, type Page, type PageQuery } from '#server/http/page.ts';
import type { RegisterRow } from '#shared/generated/api-types.ts';
import type { Ability } from '#shared/permissions/ability.ts';
import { presentRegister } from './present-register.ts';
import { registerConditions, type RegisterFilter } from './register-filter.ts';
import { REGISTER_COLUMNS, REGISTER_JOINS, REGISTER_SCOPE, type RegisterDbRow } from './register-select.ts';

/** A leading minus sorts the other way: latest first, Z to A. */
export const REGISTER_SORTS = [
  'entered',
  'installed',
  'structure',
  '-entered',
  '-installed',
  '-structure',
] as const;
type RegisterSort = (typeof REGISTER_SORTS)[number];
type SortKey = 'entered' | 'installed' | 'structure';

export type RegisterQuery = PageQuery & RegisterFilter & { sort?: RegisterSort };

type Sort = {
  sql: string;
  cast: string;
  type: CursorType;
  key: (row: RegisterDbRow) => string;
};
const SORTS: Readonly<Record<SortKey, Sort>> = {
  entered: {
    sql: 'v.entered_at',
    cast: 'timestamptz',
    type: 'instant',
    key: (row) => row.entered_at,
  },
  installed: {
    sql: `coalesce(v.work_day, date '0001-01-01')`,
    cast: 'date',
    type: 'day',
    key: (row) => row.work_day ?? '0001-01-01',
  },
  structure: {
    sql: 'v.structure_number',
    cast: 'text',
    type: 'string',
    key: (row) => row.structure_number,
  },
};
/** Counting stops here: beyond it the list says "more than". */
const COUNT_LIMIT = 10_000;

/** The register, newest entries first unless sorted otherwise; a contractor sees their own. */
export async function listRegister(
  em: EntityManager,
  options: { query: RegisterQuery; ability: Ability },
): Promise<Page<RegisterRow>> {
  const { query, ability } = options;
  const asked = query.sort ?? '-entered';
  const sort = SORTS[asked.replace('-', '') as SortKey];
  const direction = asked.startsWith('-') ? 'desc' : 'asc';
  const { limit, after } = parsePage(query, [sort.type, 'uuid']);
  const where = registerConditions(query, { contractorId: contractorWall(ability, 'read', 'RegisterEntry') });
  const next = where.values.length + 1;
  const beyond = direction === 'desc' ? '<' : '>';
  const found = await rows<RegisterDbRow>(
    em,
    // The page first: what is joined is joined for the rows shown only.
    `select ${REGISTER_COLUMNS}
     from (
       select v.* ${REGISTER_SCOPE} where ${where.sql}
         and ($${next}::${sort.cast} is null or (${sort.sql}, v.id) ${beyond} ($${next}::${sort.cast}, $${next + 1}::uuid))
       order by ${sort.sql} ${direction}, v.id ${direction} limit $${next + 2}
     ) v ${REGISTER_JOINS}
     order by ${sort.sql} ${direction}, v.id ${direction}`,
    [...where.values, after?.[0] ?? null, after?.[1] ?? null, limit + 1],
  );
  return toPage({
    rows: found,
    limit,
    total: after ? null : await count(em, where),
    key: (item) => [sort.key(item), item.id],
    item: presentRegister,
  });
}

async function count(em: EntityManager, where: { sql: string; values: unknown[] }): Promise<number | null> {
  const found = await row<{ n: number }>(
    em,
    `select count(*)::int as n from (select 1 ${REGISTER_SCOPE} where ${where.sql} limit ${COUNT_LIMIT + 1}) counted`,
    where.values,
  );
  return found && found.n <= COUNT_LIMIT ? found.n : null;
}
