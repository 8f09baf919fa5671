export type WorkOrderDbRow = {
  id: string;
  number: string;
  title: string;
  zone: string;
  state: 'open' | 'closed';
  contractor_id: string;
  contractor_name: string;
  version: number;
  created_at: string;
  structures: number;
  in_batch: number;
  approved: number;
  on_record: number;
  open_batch: string | null;
};

/** A structure's number folded as lines keep it (shared/records/structure-key). */
const FOLDED = `upper(btrim(regexp_replace(normalize(planned.structure_number, NFKC), '\\s+', ' ', 'g')))`;

/**
 * Planned structures of `w` with where each stands. Lines of a draft count for its contractor only (`$2`): the owner's
 * people learn of them when they are handed in. What is decided in a review that goes on is told to the contractor when
 * it is closed. The furthest state of a structure's lines counts.
 */
export const PLANNED_STATES = `
select planned.id, planned.structure_id, planned.structure_number, planned.kind, planned.design,
  case when registered.record_number is not null then 'on-record'
    when bool_or(line.state in ('approved', 'on-record') and (line.told or not $2::boolean)) then 'approved'
    when bool_or(line.state <> 'abandoned') then 'in-batch'
    else 'planned' end as state,
  registered.record_number, (array_agg(line.batch_id order by line.created_at desc) filter (where line.state <> 'abandoned'))[1] as batch_id
from planned_current planned
left join lateral (
  select l.state, l.batch_id, l.created_at, review.status is distinct from 'in-review' as told
  from batches b join lines l on l.batch_id = b.id left join revisions review on review.id = l.revision_id
  where b.work_order_id = planned.work_order_id and l.kind = planned.kind and l.structure_key = ${FOLDED}
    and (l.record_id is not null or ($2::boolean and exists (
      select 1 from revisions v join records r on r.run_id = v.run_id where v.batch_id = b.id and r.line_id = l.id
    )))
) line on true
left join lateral (
  select c.record_number from register_current c join register_versions g on g.id = c.version_id
  where c.structure_id = planned.structure_id and c.kind = planned.kind and g.work_order_id = planned.work_order_id
) registered on true
where planned.work_order_id = w.id and not planned.removed
group by planned.id, planned.structure_id, planned.structure_number, planned.kind, planned.design, registered.record_number`;

/** A work order with its counts. `$1` is the wall, `$2` whether drafts are seen. */
export const WORK_ORDER_SELECT = `
select w.id, w.number, w.title, w.zone, w.state, w.contractor_id, o.name as contractor_name, w.version, w.created_at,
  counts.structures, counts.in_batch, counts.approved, counts.on_record, open.id as open_batch
from work_orders w
join organisations o on o.id = w.contractor_id
cross join lateral (
  select count(*) as structures, count(*) filter (where p.state = 'in-batch') as in_batch,
    count(*) filter (where p.state = 'approved') as approved, count(*) filter (where p.state = 'on-record') as on_record
  from (${PLANNED_STATES}) p
) counts
left join lateral (
  select b.id from batches b join revisions v on v.batch_id = b.id
  where b.work_order_id = w.id and v.status in ('draft', 'checking', 'checked') order by b.created_at desc, b.id limit 1
) open on true`;

export const WORK_ORDER_WALL = '($1::uuid is null or w.contractor_id = $1)';
