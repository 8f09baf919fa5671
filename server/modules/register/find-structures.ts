import type { EntityManager } from '@mikro-orm/postgresql';
import { insertRowsReturning } from '#server/db/insert-rows.ts';
import { rows, run } from '#server/db/rows.ts';
import { structureKey } from '#shared/records/structure-key.ts';
import type { EnteringLine } from './lock-lines.ts';

type LivingStructure = { id: string; number: string };

/**
 * The structure that each line belongs to: the one planned or known by its number, else a new one. A line that says it
 * replaces a structure retires that one and is a structure of its own, since numbers are reused.
 * @returns structure id by record id
 */
export async function findStructures(
  em: EntityManager,
  lines: readonly EnteringLine[],
): Promise<Map<string, string>> {
  const replaced = lines.flatMap((line) => (line.replaces ? [line.replaces] : []));
  await run(
    em,
    'update structures set retired_at = now() where retired_at is null and number = any($1::text[])',
    [replaced],
  );
  const byKey = new Map(
    (
      await rows<LivingStructure>(
        em,
        `select id, number from structures where retired_at is null and (
           number = any($1::text[]) or id in (select structure_id from planned where work_order_id = any($2::uuid[]))
         )`,
        [lines.map((line) => line.structure_number), [...new Set(lines.map((line) => line.work_order_id))]],
      )
    ).map((structure) => [structureKey(structure.number), structure.id]),
  );
  const missing = new Map(
    lines
      .filter((line) => !byKey.has(structureKey(line.structure_number)))
      .map((line) => [structureKey(line.structure_number), line.structure_number.trim()]),
  );
  const made = await insertRowsReturning<LivingStructure>(em, {
    table: 'structures',
    list: [...missing.values()].map((number) => ({ number })),
    returning: ['id', 'number'],
  });
  for (const structure of made) byKey.set(structureKey(structure.number), structure.id);
  return new Map(lines.map((line) => [line.record_id, byKey.get(structureKey(line.structure_number)) ?? '']));
}
