import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { SearchReply } from '#shared/generated/api-types.ts';
import type { Ability } from '#shared/permissions/ability.ts';
import { contractorScope } from '#shared/permissions/contractor-scope.ts';

type Found = SearchReply['items'][number];
type Source = { readonly subject: Parameters<typeof contractorScope>[2]; readonly sql: string };

/** Hits of each kind that one search shows. */
const MOST = 8;

/** Each takes `$1` the beginning of a number, `$2` the contractor whose rows may be seen (null: all), `$3` how many. */
const SOURCES: readonly Source[] = [
  {
    subject: 'RegisterEntry',
    sql: `select 'record' as type, v.record_number as id, v.record_number as label,
            v.structure_number || ', version ' || v.n as detail
          from register_current c join register_versions v on v.id = c.version_id
          where (v.record_number ilike $1 or v.structure_number ilike $1) and ($2::uuid is null or v.contractor_id = $2)
          order by v.record_number limit $3`,
  },
  {
    subject: 'Record',
    sql: `select 'structure' as type, r.id::text, r.structure_number as label,
            'batch ' || b.number || ', revision ' || v.n || ', ' ||
              case when $2::uuid is not null and v.status = 'in-review' then 'in review' else replace(l.state, '-', ' ') end as detail
          from lines l join records r on r.id = l.record_id join revisions v on v.id = r.revision_id join batches b on b.id = l.batch_id
          where l.structure_number ilike $1 and ($2::uuid is null or b.contractor_id = $2) and v.submitted_at is not null
          order by l.structure_number, b.number limit $3`,
  },
  {
    subject: 'Batch',
    sql: `select 'batch' as type, b.id::text, b.number as label, o.name || ', ' || v.status as detail
          from batches b join organisations o on o.id = b.contractor_id
          join lateral (select status from revisions where batch_id = b.id order by n desc limit 1) v on true
          where b.number ilike $1 and ($2::uuid is null or b.contractor_id = $2) order by b.number limit $3`,
  },
  {
    subject: 'WorkOrder',
    sql: `select 'work-order' as type, w.id::text, w.number as label, w.title as detail from work_orders w
          where (w.number ilike $1 or w.title ilike '%' || $1) and ($2::uuid is null or w.contractor_id = $2)
          order by w.number limit $3`,
  },
  {
    subject: 'Lot',
    sql: `select 'lot' as type, s.lot_id::text as id, s.number as label, s.product || ', ' || replace(s.status, '-', ' ') as detail
          from lot_status s where s.number ilike $1 and $2::uuid is null order by s.number limit $3`,
  },
  {
    subject: 'Concession',
    sql: `select 'concession' as type, c.id::text, c.number as label, c.state as detail from concession_current c
          where c.number ilike $1 and ($2::uuid is null or c.contractor_id = $2) order by c.number limit $3`,
  },
  {
    subject: 'Transmittal',
    sql: `select 'transmittal' as type, t.id::text, t.number as label, 'revision ' || t.revision || ', ' || t.state as detail
          from transmittals t where t.number ilike $1 and $2::uuid is null order by t.number, t.revision limit $3`,
  },
];

/** Things whose number begins with the words, of the kinds that the person may read; a contractor finds their own only. */
export async function search(em: EntityManager, options: { q: string; ability: Ability }): Promise<Found[]> {
  const like = `${options.q.trim().replaceAll(/[\\%_]/g, String.raw`\$&`)}%`;
  const found: Found[] = [];
  for (const source of SOURCES) {
    const scope = contractorScope(options.ability, 'read', source.subject);
    if (scope) found.push(...(await rows<Found>(em, source.sql, [like, scope.contractorId, MOST])));
  }
  return found;
}
