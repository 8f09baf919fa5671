import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { lineKey } from '#shared/records/structure-key.ts';
import type { Kind } from '#shared/records/types.ts';
import type { EarlierFailure } from '#shared/rules/types.ts';

type FailureRow = EarlierFailure & { kind: Kind; structureNumber: string; occurrence: number };

/**
 * What rules found at earlier checks of a revision, by line key: of each rule and line the newest, with the values and
 * pours of that check. One query.
 */
export async function loadEarlierFailures(
  em: EntityManager,
  options: { revisionId: string; input: number },
): Promise<ReadonlyMap<string, readonly EarlierFailure[]>> {
  const found = await rows<FailureRow>(
    em,
    `with failed as (
       select distinct on (f.line_id, f.code) f.code, f.field, f.measured, f.limit_value, f.unit, f.record_id
       from findings f join check_runs c on c.id = f.run_id
       where f.revision_id = $1 and c.state = 'done' and c.input < $2 and f.line_id is not null
         and f.severity <> 'note' and f.code not like 'record-%'
       order by f.line_id, f.code, c.input desc, f.ordinal
     ), poured as (
       select p.record_id, jsonb_agg(p.raw -> 'values' order by p.n) as pours
       from pours p where p.record_id in (select record_id from failed) group by p.record_id
     )
     select f.code, f.field, f.measured, f.limit_value as "limit", f.unit, r.kind,
       r.structure_number as "structureNumber", r.occurrence, r.values, coalesce(p.pours, '[]') as pours
     from failed f join records r on r.id = f.record_id left join poured p on p.record_id = f.record_id
     order by r.kind, r.structure_number, r.occurrence, f.code`,
    [options.revisionId, options.input],
  );
  const byLine = new Map<string, EarlierFailure[]>();
  for (const { kind, structureNumber, occurrence, ...failure } of found) {
    const key = lineKey(kind, structureNumber, occurrence);
    const held = byLine.get(key);
    if (held) held.push(failure);
    else byLine.set(key, [failure]);
  }
  return byLine;
}
