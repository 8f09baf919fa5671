import type { RevisionStatus } from '#shared/review/states.ts';

export type PhotoDbRow = {
  id: string;
  batch_id: string;
  contractor_id: string;
  file_name: string;
  sha256: string;
  line_id: string | null;
  structure_number: string | null;
  view: string | null;
  method: 'sheet' | 'name' | 'hand' | null;
  type: string | null;
  taken_wall: string | null;
  latitude: number | null;
  longitude: number | null;
  width: number | null;
  height: number | null;
  thumb_sha256: string | null;
  display_sha256: string | null;
  problem: { code: string; detail: string } | null;
  prepared: boolean;
  line_latitude: number | null;
  line_longitude: number | null;
  newest_status: RevisionStatus;
};

/** A photograph with where it lies now and what is known of it. `$1` is the pipeline whose facts count. */
export const PHOTO_SELECT = `
select p.id, p.batch_id, b.contractor_id, p.file_name, p.sha256,
  case when not m.removed then m.line_id end as line_id, case when not m.removed then l.structure_number end as structure_number,
  case when not m.removed then m.view end as view, case when not m.removed then m.method end as method,
  f.type, f.taken_wall, f.latitude, f.longitude, f.width, f.height, f.thumb_sha256, f.display_sha256,
  case when f.sha256 is not null then f.problem else waiting.problem end as problem,
  f.sha256 is not null as prepared, r.latitude as line_latitude, r.longitude as line_longitude,
  newest.status as newest_status
from photos p
join batches b on b.id = p.batch_id
join revisions pv on pv.id = p.revision_id
join lateral (select status, run_id from revisions where batch_id = b.id order by n desc limit 1) newest on true
left join photo_facts f on f.sha256 = p.sha256 and f.pipeline = $1
left join job_progress waiting on waiting.subject = 'photos:' || p.batch_id and waiting.state = 'failed'
left join lateral (select * from photo_matches x where x.photo_id = p.id order by x.seq desc limit 1) m on true
left join lines l on l.id = m.line_id
left join lateral (
  select x.latitude, x.longitude from records x where x.line_id = m.line_id order by x.created_at desc limit 1
) r on true`;

/** The owner's people see photographs of what was handed in only. `$2` the wall, `$3` whether drafts are seen. */
export const PHOTO_WALL = `($2::uuid is null or b.contractor_id = $2) and ($3::boolean or pv.submitted_at is not null)`;
