import type { RevisionStatus } from '#shared/review/states.ts';

/** What a check leaves to be counted without reading its rows again; `check_runs.counts`. */
export type RunCounts = {
  readonly lines: number;
  readonly nonconformity: number;
  readonly query: number;
  readonly note: number;
  /** Standing `record-…` nonconformities: while there is one, the revision cannot be submitted. */
  readonly incomplete: number;
  /** Numbers of the standards that the lines were checked on. */
  readonly standards: readonly number[];
};

export type BatchDbRow = {
  id: string;
  number: string;
  created_at: string;
  contractor_id: string;
  contractor_name: string;
  work_order_id: string;
  work_order_number: string;
  work_order_title: string;
  revision_id: string;
  n: number;
  status: RevisionStatus;
  due_on: string | null;
  submitted_at: string | null;
  taken_at: string | null;
  decided_at: string | null;
  inspector_id: string | null;
  inspector_name: string | null;
  input: number;
  run_input: number | null;
  counts: RunCounts | null;
  file_name: string | null;
  sha256: string | null;
  decided: number;
  /** Lines that came back and wait for this revision. */
  returned: number;
  photos: number;
  unplaced: number;
  version: number;
};

/**
 * A batch with its newest revision. The version on the wire is the sum over its revisions: whatever changes one of
 * them raises it, and a new revision never brings an old number back.
 */
export const BATCH_SELECT = `
select b.id, b.number, b.created_at, b.contractor_id, o.name as contractor_name,
  w.id as work_order_id, w.number as work_order_number, w.title as work_order_title,
  v.id as revision_id, v.n, v.status, v.due_on, v.submitted_at, v.taken_at, v.decided_at, v.inspector_id,
  u.name as inspector_name, v.input, run.input as run_input, run.counts,
  workbook.file_name, workbook.sha256, decided.n as decided, returned.n as returned, photo.n as photos, photo.unplaced, versions.n as version
from batches b
join organisations o on o.id = b.contractor_id
join work_orders w on w.id = b.work_order_id
join lateral (select * from revisions where batch_id = b.id order by n desc limit 1) v on true
left join users u on u.id = v.inspector_id
left join check_runs run on run.id = v.run_id
left join lateral (
  select i.file_name, i.sha256 from revisions r join inputs i on i.revision_id = r.id
  where r.batch_id = b.id and i.kind = 'workbook' order by r.n desc, i.n desc limit 1
) workbook on true
cross join lateral (
  select count(*) filter (where l.state <> 'undecided') as n from lines l where l.revision_id = v.id
) decided
cross join lateral (
  select count(*) as n from lines l where l.batch_id = b.id and l.state = 'returned'
) returned
cross join lateral (
  select count(*) as n, count(*) filter (where placed.removed is not false) as unplaced
  from photos p
  left join lateral (
    select m.removed from photo_matches m where m.photo_id = p.id order by m.seq desc limit 1
  ) placed on true
  where p.batch_id = b.id
) photo
cross join lateral (select sum(r.version)::int as n from revisions r where r.batch_id = b.id) versions`;
