import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { lotKey } from '#shared/rules/lot-index.ts';
import type { LotFact, LotUse } from '#shared/rules/types.ts';

export type LotRow = LotFact & { readonly id: string };

/** Every lot with what it came to be, day by day. */
export function loadLots(em: EntityManager): Promise<LotRow[]> {
  return rows<LotRow>(
    em,
    `select s.lot_id as id, s.product, s.number, s.expires_on as "expiresOn", s.status,
       coalesce(h.history, '[]') as history
     from lot_status s
     left join (
       select e.lot_id, jsonb_agg(jsonb_build_object('on', e.effective_on, 'status',
           case e.type when 'released' then 'in-use' else e.type end) order by e.effective_on, e.at, e.id) as history
       from lot_events e where e.type <> 'received' group by e.lot_id
     ) h on h.lot_id = s.lot_id
     order by s.product, s.number`,
  );
}

/**
 * Kits of some lots by size: received, and used by lines that were handed in. Lines of the batch are left out that its
 * check will count itself; those that stand from an earlier revision are not.
 */
export function loadLotUse(
  em: EntityManager,
  options: { batchId: string; contractorId: string; lotIds: readonly string[] },
): Promise<LotUse[]> {
  return rows<LotUse>(
    em,
    `with moved as (
       select e.lot_id, e.kit_ft3, e.quantity as received, 0 as used, 0 as own
       from lot_events e where e.type = 'received' and e.lot_id = any($3::uuid[])
       union all
       select p.lot_id, p.kit_ft3, 0, p.quantity, case when r.contractor_id = $2 then p.quantity else 0 end
       from pours p join records r on r.id = p.record_id join lines l on l.record_id = r.id
       where p.lot_id = any($3::uuid[]) and p.kit_ft3 is not null and p.quantity is not null
         and (l.batch_id <> $1 or l.state in ('approved', 'held', 'on-record'))
     ), sizes as (
       select lot_id, kit_ft3, sum(received)::float8 as received, sum(used)::float8 as used, sum(own)::float8 as own
       from moved group by lot_id, kit_ft3
     )
     select s.product, s.number, coalesce(jsonb_agg(jsonb_build_object('kitFt3', z.kit_ft3, 'received', z.received,
         'used', z.used, 'own', z.own) order by z.kit_ft3) filter (where z.lot_id is not null), '[]') as sizes
     from lot_status s left join sizes z on z.lot_id = s.lot_id
     where s.lot_id = any($3::uuid[])
     group by s.product, s.number order by s.product, s.number`,
    [options.batchId, options.contractorId, options.lotIds],
  );
}

/** Ids of the lots that a workbook's pours name. */
export function lotsPoured(lots: readonly LotRow[], lotKeys: readonly string[]): string[] {
  const named = new Set(lotKeys);
  return lots.filter(({ product, number }) => named.has(lotKey(product, number))).map(({ id }) => id);
}
