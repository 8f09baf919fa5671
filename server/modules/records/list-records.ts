import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import type { RecordRow } from '#shared/generated/api-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { presentRecord } from './present-record.ts';
import { RECORD_SELECT, type RecordDbRow } from './record-select.ts';
import type { ShownRevision } from './shown-revision.ts';

export type RecordQuery = PageQuery & {
  code?: string[];
  severity?: ('nonconformity' | 'query' | 'note')[];
  state?: RecordRow['state'][];
  kind?: RecordRow['kind'][];
  structure?: string;
};

/** What can be said of the record alone; the state is looked at after, since it is computed. */
const WHERE = `
where r.run_id = $1
  and ($2::text[] is null or r.rule_codes && $2)
  and ($3::text[] is null or r.worst_severity = any($3))
  and ($4::text[] is null or r.kind = any($4))
  and ($5::text is null or upper(r.structure_number) = upper($5))`;

/** Lines of a shown revision in the workbook's order. */
export async function listRecords(
  em: EntityManager,
  options: { revision: ShownRevision; query: RecordQuery; viewer: { actor: Actor; ability: Ability } },
): Promise<Page<RecordRow>> {
  const { revision, query, viewer } = options;
  const { limit, after } = parsePage(query, ['number']);
  const filter = [
    revision.run_id,
    query.code ?? null,
    query.severity ?? null,
    query.kind ?? null,
    query.structure ?? null,
  ];
  const found = query.state
    ? await rows<RecordDbRow>(
        em,
        `select * from (${RECORD_SELECT} ${WHERE}) line
         where state = any($8) and ($6::bigint is null or ordinal > $6) order by ordinal limit $7`,
        [...filter, after?.[0] ?? null, limit + 1, query.state],
      )
    : await rows<RecordDbRow>(
        em,
        `${RECORD_SELECT} ${WHERE} and ($6::bigint is null or r.ordinal > $6) order by r.ordinal limit $7`,
        [...filter, after?.[0] ?? null, limit + 1],
      );
  const total = after === null && !query.state ? await countRecords(em, filter) : null;
  return toPage({
    rows: found,
    limit,
    total,
    key: (row) => [row.ordinal],
    item: (row) => presentRecord(row, viewer),
  });
}

async function countRecords(em: EntityManager, filter: readonly unknown[]): Promise<number> {
  const [counted] = await rows<{ n: number }>(em, `select count(*) as n from records r ${WHERE}`, filter);
  return counted?.n ?? 0;
}
