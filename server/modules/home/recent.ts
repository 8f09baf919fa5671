import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import type { Home } from '#shared/generated/api-types.ts';

const SHOWN = 8;

type RecentRow = {
  at: string;
  title: string;
  detail: string | null;
  kind: 'batch' | 'transmittal';
  id: string;
};

/** What happened last, newest first; a contractor sees what happened to their own. */
export async function recentFor(em: EntityManager, actor: Actor): Promise<Home['recent']> {
  const found = await rows<RecentRow>(
    em,
    `with mine as (
       select r.*, b.number, b.contractor_id from revisions r join batches b on b.id = r.batch_id
       where $1::uuid is null or b.contractor_id = $1
     ), events as (
       (select submitted_at as at, 'Batch ' || number || ' submitted' as title, batch_id as id, n, contractor_id,
          'batch' as kind from mine where submitted_at is not null order by submitted_at desc limit $2)
       union all
       (select taken_at, 'Batch ' || number || ' taken for review', batch_id, n, contractor_id, 'batch'
        from mine where taken_at is not null order by taken_at desc limit $2)
       union all
       (select decided_at, 'Batch ' || number || ' reviewed', batch_id, n, contractor_id, 'batch'
        from mine where decided_at is not null order by decided_at desc limit $2)
       union all
       (select issued_at, 'Transmittal ' || number || ' issued', id, revision, null, 'transmittal'
        from transmittals where issued_at is not null and $1::uuid is null order by issued_at desc limit $2)
     )
     select e.at, e.title, e.kind, e.id,
       concat_ws(', ', o.name, case when e.n > 0 then 'revision ' || e.n end) as detail
     from events e left join organisations o on o.id = e.contractor_id order by e.at desc, e.title limit $2`,
    [actor.orgKind === 'contractor' ? actor.orgId : null, SHOWN],
  );
  const batchPage = actor.role === 'inspector' ? '/review/' : '/batches/';
  return found.map(({ at, title, detail, kind, id }) => ({
    at,
    title,
    detail: detail || null,
    to: `${kind === 'batch' ? batchPage : '/transmittals/'}${id}`,
  }));
}
