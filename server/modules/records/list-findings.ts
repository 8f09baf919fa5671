import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { FINDING_SELECT, type FindingDbRow } from './finding-select.ts';
import { presentFinding } from './present-finding.ts';
import type { ShownRevision } from './shown-revision.ts';

export type FindingQuery = PageQuery & {
  code?: string[];
  severity?: FindingRow['severity'][];
  state?: FindingRow['state'][];
  structure?: string;
  recordId?: string;
  withoutLine?: boolean;
};

const STORED = {
  undecided: 'open',
  approved: 'approved',
  rejected: 'rejected',
  'concession-asked': 'held',
} as const;

const WHERE = `
where f.run_id = $1
  and ($2::text[] is null or f.code = any($2))
  and ($3::text[] is null or f.severity = any($3))
  and ($4::text[] is null or coalesce(s.state, 'open') = any($4))
  and ($5::text is null or upper(f.structure_number) = upper($5))
  and ($6::uuid is null or f.record_id = $6)
  and ($7::boolean is not true or f.record_id is null)`;

/** Findings of a shown revision in the check's order: by line, then those that belong to none. */
export async function listFindings(
  em: EntityManager,
  options: { revision: ShownRevision; query: FindingQuery; viewer: { actor: Actor; ability: Ability } },
): Promise<Page<FindingRow>> {
  const { revision, query, viewer } = options;
  const { limit, after } = parsePage(query, ['number']);
  const filter = [
    revision.run_id,
    query.code ?? null,
    query.severity ?? null,
    // What a contractor is not told yet cannot be filtered for either.
    query.state?.map((state) => STORED[state]) ?? null,
    query.structure ?? null,
    query.recordId ?? null,
    query.withoutLine ?? null,
  ];
  const found = await rows<FindingDbRow>(
    em,
    `${FINDING_SELECT} ${WHERE} and ($8::bigint is null or f.ordinal > $8) order by f.ordinal limit $9`,
    [...filter, after?.[0] ?? null, limit + 1],
  );
  const total = after === null ? await countFindings(em, filter) : null;
  return toPage({
    rows: found,
    limit,
    total,
    key: (row) => [row.ordinal],
    item: (row) => presentFinding(row, viewer),
  });
}

async function countFindings(em: EntityManager, filter: readonly unknown[]): Promise<number> {
  const [counted] = await rows<{ n: number }>(
    em,
    `select count(*) as n from findings f left join finding_states s on s.finding_id = f.id ${WHERE}`,
    filter,
  );
  return counted?.n ?? 0;
}
