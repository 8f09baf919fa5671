import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import type { RegisterCandidate } from '#shared/generated/api-types.ts';
import type { Kind } from '#shared/records/types.ts';

export type CandidateQuery = PageQuery & { workOrder?: string; contractor?: string };
type CandidateRow = {
  record_id: string;
  line_id: string;
  structure_number: string;
  kind: Kind;
  batch_id: string;
  batch_number: string;
  work_order_id: string;
  work_order_number: string;
  contractor_id: string;
  contractor_name: string;
  work_day: string | null;
  nonconforming: boolean;
  supersedes: string | null;
};

const FROM = `
from lines l
join records r on r.id = l.record_id
join revisions v on v.id = r.revision_id
join batches b on b.id = l.batch_id
join work_orders w on w.id = b.work_order_id
join organisations o on o.id = b.contractor_id
where l.state = 'approved' and v.status in ('decided', 'on-record')
  and ($1::uuid is null or b.work_order_id = $1) and ($2::uuid is null or b.contractor_id = $2)`;

/** Approved lines of closed reviews that are not on record yet: what waits for the clerk, by batch and structure. */
export async function listCandidates(
  em: EntityManager,
  query: CandidateQuery,
): Promise<Page<RegisterCandidate>> {
  const { limit, after } = parsePage(query, ['string', 'string', 'uuid']);
  const scope = [query.workOrder ?? null, query.contractor ?? null];
  const found = await rows<CandidateRow>(
    em,
    `select r.id as record_id, l.id as line_id, l.structure_number, l.kind, b.id as batch_id, b.number as batch_number,
       w.id as work_order_id, w.number as work_order_number, o.id as contractor_id, o.name as contractor_name, r.work_day,
       exists (select 1 from finding_states s where s.record_id = r.id and s.grounds = 'concession') as nonconforming,
       (select c.record_number from register_current c join structures s on s.id = c.structure_id
        where s.retired_at is null and s.number = l.structure_number and c.kind = l.kind) as supersedes
     ${FROM} and ($3::text is null or (b.number, l.structure_number, l.id) > ($3, $4, $5::uuid))
     order by b.number, l.structure_number, l.id limit $6`,
    [...scope, after?.[0] ?? null, after?.[1] ?? null, after?.[2] ?? null, limit + 1],
  );
  const total = after ? null : await row<{ n: number }>(em, `select count(*)::int as n ${FROM}`, scope);
  return toPage({
    rows: found,
    limit,
    total: total?.n ?? null,
    key: (item) => [item.batch_number, item.structure_number, item.line_id],
    item: present,
  });
}

function present(item: CandidateRow): RegisterCandidate {
  return {
    recordId: item.record_id,
    lineId: item.line_id,
    structureNumber: item.structure_number,
    kind: item.kind,
    batch: { id: item.batch_id, number: item.batch_number },
    workOrder: { id: item.work_order_id, number: item.work_order_number },
    contractor: { id: item.contractor_id, name: item.contractor_name },
    installedOn: item.work_day,
    nonconforming: item.nonconforming,
    supersedes: item.supersedes,
  };
}
