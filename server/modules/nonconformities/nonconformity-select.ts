import { FINDING_FACTS, type FindingFacts } from '#server/modules/records/finding-facts.ts';
import type { ActionDue, Grounds } from '#shared/review/states.ts';

export type NonconformityDbRow = FindingFacts & {
  id: string;
  record_id: string | null;
  line_id: string | null;
  sort_day: string;
  state: 'open' | 'approved' | 'rejected' | 'held';
  grounds: Grounds | null;
  action: ActionDue | null;
  due_on: string | null;
  decided_by: string | null;
  decision: string | null;
  reason: string | null;
  decided_at: string | null;
  version: number;
  concession: string | null;
  condition: string | null;
  contractor_id: string;
  contractor_name: string;
  work_order_id: string;
  work_order_number: string;
  batch_id: string;
  batch_number: string;
  revision: number;
  work_day: string | null;
  lots: string[];
  record_number: string | null;
};

/** Over a page of finding_states `s`, so that what is joined is joined for the rows shown only. */
export const NONCONFORMITY_COLUMNS = `
select f.id, f.record_id, f.line_id, s.sort_day, ${FINDING_FACTS},
  s.state, s.grounds, s.action, s.due_on, u.name as decided_by, k.number as concession, k.condition,
  k.decision, k.reason, k.at as decided_at, s.version,
  s.contractor_id, o.name as contractor_name, s.work_order_id, w.number as work_order_number,
  b.id as batch_id, b.number as batch_number, v.n as revision, s.work_day,
  array(select distinct p.lot_text from pours p where p.record_id = s.record_id and p.lot_text is not null order by 1) as lots,
  (select rv.record_number from register_versions rv where rv.record_id = s.record_id limit 1) as record_number`;

export const NONCONFORMITY_JOINS = `
join findings f on f.id = s.finding_id
join organisations o on o.id = s.contractor_id
join work_orders w on w.id = s.work_order_id
join batches b on b.id = s.batch_id
join revisions v on v.id = s.revision_id
left join users u on u.id = s.decided_by
left join lateral (
  -- Not the view of all concessions as they stand: it would be made anew for every row.
  select d.decision, d.reason, d.at, c.number,
    (select e.condition from concession_events e where e.concession_id = c.id order by e.seq desc limit 1) as condition
  from decisions d left join concessions c on c.id = d.concession_id
  where s.version > 0 and d.finding_id = s.finding_id and d.seq = s.version
) k on true`;
