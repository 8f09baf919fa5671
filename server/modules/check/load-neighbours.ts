import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { SourceBatch } from '#shared/records/types.ts';
import type { NeighbourFact } from '#shared/rules/types.ts';

/** Squares of a hundredth of a degree, some half a mile: what lies in a line's own or in one beside it may be near. */
const PER_DEGREE = 100;

/**
 * Structures on record, still standing, near the lines of a workbook, and those of its batch that stand from an earlier revision: one
 * query, however many lines.
 */
export function loadNeighbours(
  em: EntityManager,
  options: { batchId: string; contractorId: string; source: SourceBatch },
): Promise<NeighbourFact[]> {
  const { batchId, contractorId, source } = options;
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
    [JSON.stringify(squaresOf(source)), batchId, contractorId, PER_DEGREE],
  );
}

function squaresOf(source: SourceBatch): { i: number; j: number }[] {
  const squares = new Map<string, { i: number; j: number }>();
  for (const { values } of source.lines) {
    const { latitude, longitude } = values;
    if (typeof latitude !== 'number' || typeof longitude !== 'number') continue;
    // What is no place has a finding of its own, and may be no number of the database's either.
    if (!(Math.abs(latitude) <= 90 && Math.abs(longitude) <= 180)) continue;
    for (const north of [-1, 0, 1])
      for (const east of [-1, 0, 1]) {
        const i = Math.floor(latitude * PER_DEGREE) + north;
        const j = Math.floor(longitude * PER_DEGREE) + east;
        squares.set(`${i}|${j}`, { i, j });
      }
  }
  return [...squares.values()];
}
