import type { EntityManager } from '@mikro-orm/postgresql';
import { storableText } from '#server/db/storable-text.ts';
import { rows } from '#server/db/rows.ts';
import type { RegisterFact } from '#shared/rules/types.ts';

/** Current *set* records of the workbook's structures that still stand, those of the batch itself apart; by structure key, one query. */
export async function loadRegister(
  em: EntityManager,
  options: { batchId: string; contractorId: string; structureKeys: readonly string[] },
): Promise<ReadonlyMap<string, RegisterFact>> {
  const current = await rows<RegisterFact & { key: string }>(
    em,
    `select l.structure_key as key, v.record_number as "recordNumber", v.contractor_id = $3 as own
     from register_current c
     join structures s on s.id = c.structure_id and s.retired_at is null
     join register_versions v on v.id = c.version_id
     join records r on r.id = v.record_id
     join lines l on l.id = r.line_id
     where c.kind = 'set' and l.batch_id <> $2
       and l.structure_key in (select jsonb_array_elements_text($1::jsonb))`,
    [JSON.stringify(options.structureKeys.map(storableText)), options.batchId, options.contractorId],
  );
  return new Map(current.map(({ key, ...fact }) => [key, fact]));
}
