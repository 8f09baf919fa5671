import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { InputRow } from '#shared/generated/api-types.ts';

/** Every file ever handed in with the batch, newest first: a workbook as itself, an upload of photographs as its files. */
export async function listInputs(em: EntityManager, batchId: string): Promise<{ items: InputRow[] }> {
  const items = await rows<InputRow>(
    em,
    `select coalesce(p.id, i.id) as id, i.n, v.n as revision, case i.kind when 'photos' then 'photo' else i.kind end as kind,
       coalesce(p.file_name, i.file_name) as "fileName", coalesce(p.sha256, i.sha256) as sha256, i.at,
       coalesce(u.name, 'Upstand') as by
     from revisions v
     join inputs i on i.revision_id = v.id and i.kind in ('workbook', 'photos')
     left join photos p on p.input_id = i.id and i.kind = 'photos'
     left join users u on u.id = i.actor_id
     where v.batch_id = $1
     order by v.n desc, i.n desc, p.file_name, p.id
     limit 2000`,
    [batchId],
  );
  return { items };
}
