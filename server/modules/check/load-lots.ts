import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { LotFact } from '#shared/rules/types.ts';

export type LotRow = LotFact & { readonly id: string };

export function loadLots(em: EntityManager): Promise<LotRow[]> {
  return rows<LotRow>(
    em,
    `select lot_id as id, product, number, expires_on as "expiresOn", status from lot_status order by product, number`,
  );
}
