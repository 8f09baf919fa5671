import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { findingTitle } from '#shared/findings/render.ts';
import type { HistoryEntry } from '#shared/generated/api-types.ts';

type Event = {
  at: string;
  by: string | null;
  what: string;
  code: string | null;
  grounds: string | null;
  detail: string | null;
  batch_id: string | null;
  n: number | null;
};

/** What became of a line over all its revisions, oldest first. A contractor hears of a review's decisions when it is closed. */
export async function listHistory(
  em: EntityManager,
  line: { lineId: string; owner: boolean },
): Promise<HistoryEntry[]> {
  const events = await rows<Event>(
    em,
    `with handed as (
       select distinct v.id, v.n, v.batch_id, v.status, v.submitted_at, v.submitted_by
       from records r join revisions v on v.id = r.revision_id and v.run_id = r.run_id
       where r.line_id = $1 and v.submitted_at is not null
     ), told as (
       select * from handed where $2::boolean or status <> 'in-review'
     )
     select e.at, u.name as by, e.what, e.code, e.grounds, e.detail, e.batch_id, e.n from (
       select submitted_at as at, submitted_by as actor, 'submitted' as what, null as code, null as grounds, null as detail, batch_id, n, 0 as part
       from handed
       union all
       select a.at, a.actor_id, 'answered', f.code, null, a.text, v.batch_id, v.n, 1
       from findings f join lines l on l.id = f.line_id join revisions v on v.batch_id = l.batch_id
       join answers a on a.revision_id = v.id and a.fingerprint = f.fingerprint and a.finding_id = f.id
       where f.line_id = $1 and ($2::boolean is false or v.submitted_at is not null)
       union all
       select d.at, d.actor_id, 'finding-' || d.decision, f.code, d.grounds, d.reason, t.batch_id, t.n, 2
       from findings f join decisions d on d.finding_id = f.id join told t on t.id = d.revision_id where f.line_id = $1
       union all
       select d.at, d.actor_id, 'line-' || d.decision, null, null, d.reason, t.batch_id, t.n, 3
       from records r join decisions d on d.record_id = r.id join told t on t.id = d.revision_id where r.line_id = $1
       union all
       select o.at, o.actor_id, 'outcome-' || o.outcome, null, null, o.reason, v.batch_id, v.n, 4
       from outcomes o join revisions v on v.id = o.revision_id where o.line_id = $1
       union all
       select g.entered_at, g.entered_by, 'registered', null, g.record_number || ', version ' || g.n, g.reason, null, null, 5
       from register_versions g join records r on r.id = g.record_id where r.line_id = $1
     ) e left join users u on u.id = e.actor order by e.at, e.part`,
    [line.lineId, line.owner],
  );
  return events.map((event) => ({
    at: event.at,
    by: event.by,
    title: titleOf(event),
    detail: event.detail,
    batchId: event.batch_id,
    revision: event.n,
  }));
}

const WORDS: Readonly<Record<string, string>> = {
  submitted: 'Handed in',
  answered: 'Answered',
  'finding-approve': 'Finding approved',
  'finding-reject': 'Finding rejected',
  'finding-hold': 'Concession asked for',
  'finding-undo': 'Decision taken back',
  'line-approve': 'Line approved',
  'line-return': 'Line returned',
  'line-undo': 'Decision on the line taken back',
  'line-reopen': 'Line reopened',
  'line-refer-back': 'Referred back by the clerk',
  'line-abandon': 'Line abandoned',
  'outcome-approved': 'Review closed: approved',
  'outcome-returned': 'Review closed: returned',
  'outcome-held': 'Review closed: held for a concession',
  'outcome-reopened': 'Reopened',
  'outcome-referred-back': 'Referred back',
  'outcome-abandoned': 'Abandoned',
  'outcome-on-record': 'On record',
  registered: 'Entered on the register',
};

function titleOf({ what, code, grounds }: Event): string {
  const words = WORDS[what] ?? what;
  const ground = grounds === null ? '' : what === 'registered' ? ` as ${grounds}` : ` on ${grounds}`;
  return `${words}${ground}${code === null ? '' : `: ${findingTitle(code)}`}`;
}
