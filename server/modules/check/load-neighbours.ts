import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { NeighbourFact } from '#shared/rules/types.ts';
import { PER_DEGREE } from './source-needs.ts';

/**
 * Structures on record, still standing, near the lines of a workbook, and those of its batch that stand from an earlier revision: one
 * query, however many lines.
 */
export function loadNeighbours(
  em: EntityManager,
  options: { batchId: string; contractorId: string; squares: readonly { i: number; j: number }[] },
): Promise<NeighbourFact[]> {
  const { batchId, contractorId, squares } = options;
  return rows<NeighbourFact>(
    em,
    `with squares as (select s.i, s.j from jsonb_to_recordset($1::jsonb) as s(i int, j int)),
     known as (
       select v.structure_number, v.latitude, v.longitude, v.contractor_id, v.record_id
       from register_current c join register_versions v on v.id = c.version_id
       join structures s on s.id = c.structure_id and s.retired_at is null
       union all
       select r.structure_number, r.latitude, r.longitude, r.contractor_id, r.id
       from lines l join records r on r.id = l.record_id
       where l.batch_id = $2 and l.state in ('approved', 'held')
     )
     select k.structure_number as "structureNumber", k.latitude, k.longitude,
       coalesce((r.values ->> 'accuracyFt')::float8, 0) as "accuracyFt", k.contractor_id = $3 as own
     from known k
     join squares s on s.i = floor(k.latitude * $4::int)::int and s.j = floor(k.longitude * $4::int)::int
     join records r on r.id = k.record_id
     order by k.structure_number, k.record_id`,
    [JSON.stringify(squares), batchId, contractorId, PER_DEGREE],
  );
}
