import type { EntityManager } from '@mikro-orm/postgresql';
import { rows, run } from '#server/db/rows.ts';
import { storableText } from '#server/db/storable-text.ts';
import type { CheckedRecord } from '#shared/check/types.ts';
import { lineKey, structureKey } from '#shared/records/structure-key.ts';
import type { Kind } from '#shared/records/types.ts';

/** Ids of the batch's lines by line key. A line is the same over all checks and revisions of its batch. */
export async function upsertLines(
  em: EntityManager,
  options: { batchId: string; records: readonly CheckedRecord[] },
): Promise<ReadonlyMap<string, string>> {
  const { batchId, records } = options;
  const list = records.map((record) => ({
    kind: record.kind,
    structure_key: storableText(structureKey(record.structureNumber)),
    structure_number: storableText(record.structureNumber),
    occurrence: record.occurrence,
  }));
  await run(
    em,
    `insert into lines (batch_id, kind, structure_key, structure_number, occurrence)
     select $1, n.kind, n.structure_key, n.structure_number, n.occurrence
     from jsonb_to_recordset($2::jsonb) as n(kind text, structure_key text, structure_number text, occurrence int)
     on conflict (batch_id, kind, structure_key, occurrence) do nothing`,
    [batchId, JSON.stringify(list)],
  );
  const known = await rows<{ id: string; kind: Kind; structure_number: string; occurrence: number }>(
    em,
    'select id, kind, structure_number, occurrence from lines where batch_id = $1',
    [batchId],
  );
  return new Map(known.map((line) => [lineKey(line.kind, line.structure_number, line.occurrence), line.id]));
}
