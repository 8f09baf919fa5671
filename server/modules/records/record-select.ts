import type { Severity } from '#shared/findings/types.ts';
import type { Derived, FieldValues, Kind } from '#shared/records/types.ts';
import type { LineState, RevisionStatus } from '#shared/review/states.ts';

export type RecordDbRow = {
  id: string;
  line_id: string;
  ordinal: number;
  kind: Kind;
  structure_number: string;
  occurrence: number;
  sheet: string;
  row: number;
  state: LineState;
  values: FieldValues;
  derived: Derived;
  nonconformities: number;
  queries: number;
  notes: number;
  undecided: number;
  worst_severity: Severity | null;
  standard: number | null;
  work_day: string | null;
  photos: { id: string; view: string }[];
  decision: string | null;
  decision_reason: string | null;
  decision_by: string | null;
  decision_at: string | null;
  version: number;
  contractor_id: string;
  revision_status: RevisionStatus;
  revision_n: number;
  inspector_id: string | null;
};

/** Where a photograph lay when a revision (`n`) was the newest: its last match up to then, unless taken off. */
export const PLACED_ON_LINE = `
  from photo_matches m
  join revisions mv on mv.id = m.revision_id and mv.n <= v.n
  join photos p on p.id = m.photo_id
  where m.line_id = r.line_id and not m.removed and not exists (
    select 1 from photo_matches later join revisions lv on lv.id = later.revision_id
    where later.photo_id = m.photo_id and later.seq > m.seq and lv.n <= v.n
  )`;

/** The record a line's state speaks of has that state; an older one has what became of it. */
const STATE = `case
  when l.record_id = r.id then l.state
  else coalesce((
    select case o.outcome when 'reopened' then 'undecided' when 'referred-back' then 'undecided' else o.outcome end
    from outcomes o where o.line_id = r.line_id and o.record_id = r.id order by o.seq desc limit 1
  ), 'undecided') end`;

/** A line of a check with where it stands. */
export const RECORD_SELECT = `
select r.id, r.line_id, r.ordinal, r.kind, r.structure_number, r.occurrence, r.sheet, r.row, ${STATE} as state,
  r.values, r.derived, r.nonconformities, r.queries, r.notes, r.worst_severity,
  case when v.submitted_at is null then r.nonconformities + r.queries else (
    select count(*)::int from finding_states s where s.record_id = r.id and s.severity <> 'note' and s.state = 'open'
  ) end as undecided,
  sv.n as standard, r.work_day,
  (select coalesce(json_agg(json_build_object('id', p.id, 'view', m.view) order by p.at, p.id), '[]') ${PLACED_ON_LINE}) as photos,
  d.decision, d.reason as decision_reason, du.name as decision_by, d.at as decision_at, coalesce(d.seq, 0) as version,
  r.contractor_id, v.status as revision_status, v.n as revision_n, v.inspector_id
from records r
join revisions v on v.id = r.revision_id
join lines l on l.id = r.line_id
left join standard_versions sv on sv.id = r.standard_id
left join lateral (select * from decisions x where x.record_id = r.id order by x.seq desc limit 1) d on true
left join users du on du.id = d.actor_id`;
