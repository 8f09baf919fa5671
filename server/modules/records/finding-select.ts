import type { ActionDue, Grounds, LineState, RevisionStatus } from '#shared/review/states.ts';
import { FINDING_FACTS, type FindingFacts } from './finding-facts.ts';

export type FindingDbRow = FindingFacts & {
  id: string;
  record_id: string | null;
  line_id: string | null;
  ordinal: number;
  state: 'open' | 'approved' | 'rejected' | 'held';
  version: number;
  decision: string | null;
  grounds: Grounds | null;
  action: ActionDue | null;
  due_on: string | null;
  reason: string | null;
  decided_by: string | null;
  decided_at: string | null;
  answer_text: string | null;
  answer_by: string | null;
  answer_at: string | null;
  /** Given in a revision that is not handed in: the contractor's own until it is. */
  answer_open: boolean | null;
  concession_id: string | null;
  concession_number: string | null;
  concession_type: 'asked' | 'granted' | 'refused' | 'withdrawn' | null;
  contractor_id: string;
  revision_status: RevisionStatus;
  inspector_id: string | null;
  /** State of its line while the line stands on this finding's record; null for another's. */
  line_state: LineState | null;
  /** The batch's newest revision is still the contractor's to work on. */
  open_revision_id: string | null;
};

/**
 * A finding with where it stands. An answer hangs on revision and fingerprint, so that it outlives a re-check; one
 * given while the next revision is open answers what came back from this one.
 */
export const FINDING_SELECT = `
select f.id, f.record_id, f.line_id, f.ordinal, ${FINDING_FACTS}, coalesce(s.state, 'open') as state, coalesce(s.version, 0) as version,
  d.decision, d.grounds, d.action, d.due_on, d.reason, du.name as decided_by, d.at as decided_at,
  a.text as answer_text, a.by as answer_by, a.at as answer_at, a.open as answer_open,
  c.id as concession_id, c.number as concession_number, c.type as concession_type,
  b.contractor_id, v.status as revision_status, v.inspector_id,
  line.state as line_state, open.id as open_revision_id
from findings f
join revisions v on v.id = f.revision_id
join batches b on b.id = v.batch_id
left join revisions open on open.batch_id = b.id and open.status in ('draft', 'checking', 'checked')
left join finding_states s on s.finding_id = f.id
left join lines line on line.id = f.line_id and line.record_id = f.record_id
left join lateral (
  select * from decisions x where s.version > 0 and x.finding_id = f.id order by x.seq desc limit 1
) d on true
left join users du on du.id = d.actor_id
left join lateral (
  select x.text, x.at, coalesce(ux.name, '') as by, rx.submitted_at is null as open
  from revisions rx join answers x on x.revision_id = rx.id and x.fingerprint = f.fingerprint
  left join users ux on ux.id = x.actor_id
  where rx.batch_id = v.batch_id and rx.n between v.n and v.n + 1 order by rx.n desc, x.seq desc limit 1
) a on true
left join lateral (
  select k.id, k.number, e.type from concession_findings kf join concessions k on k.id = kf.concession_id
  join lateral (select type from concession_events where concession_id = k.id order by seq desc limit 1) e on true
  where kf.finding_id = f.id order by k.at desc, k.id limit 1
) c on true`;
