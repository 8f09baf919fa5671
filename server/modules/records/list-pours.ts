import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { PourRow } from '#shared/generated/api-types.ts';

/** Pours of a record as the check took them. */
export function listPours(em: EntityManager, recordId: string): Promise<PourRow[]> {
  return rows<PourRow & Record<string, unknown>>(
    em,
    `select pour_number as "pourNumber", event, poured_wall as "pouredAt", product_code as product, lot_text as lot,
       kit_ft3 as "kitFt3", quantity, wasted_quantity as "wastedQuantity", component_a_temp_f as "componentATempF",
       component_b_temp_f as "componentBTempF", coalesce(sheet, '') as sheet, coalesce(row, 0) as row
     from pours where record_id = $1 order by n`,
    [recordId],
  );
}
