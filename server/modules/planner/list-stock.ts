import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { PlannerLot } from '#shared/generated/api-types.ts';

/** More lots with kits left than this are no stock to plan from; the first to expire come first. */
const MOST_LOTS = 500;

/**
 * Lots, of one product or of all, of which kits are left, by size, first to expire first; held and recalled ones too, so that the page can
 * say why they do not count. Used is what lines that were handed in used, as a lot's balance has it.
 */
export async function listStock(
  em: EntityManager,
  { product = null }: { readonly product?: string | null },
): Promise<{ items: PlannerLot[] }> {
  const items = await rows<PlannerLot & Record<string, unknown>>(
    em,
    `with moved as (
       select e.lot_id, e.kit_ft3, e.quantity::float8 as n from lot_events e
       join lot_status s on s.lot_id = e.lot_id and ($1::text is null or s.product = $1)
       where e.type = 'received'
       union all
       select p.lot_id, p.kit_ft3, -p.quantity::float8 from pours p
       join lot_status s on s.lot_id = p.lot_id and ($1::text is null or s.product = $1)
       join records r on r.id = p.record_id join lines l on l.record_id = r.id
       where p.kit_ft3 is not null and p.quantity is not null
     ), sizes as (
       select lot_id, kit_ft3, sum(n) as n from moved group by lot_id, kit_ft3
     )
     select s.lot_id as id, s.number, s.product, s.expires_on as "expiresOn", s.status,
       jsonb_agg(jsonb_build_object('kitFt3', z.kit_ft3::float8, 'left', z.n) order by z.kit_ft3) as sizes
     from lot_status s join sizes z on z.lot_id = s.lot_id
     where z.n > 0
     group by s.lot_id, s.number, s.product, s.expires_on, s.status
     order by s.expires_on nulls last, s.number limit $2`,
    [product, MOST_LOTS],
  );
  return { items };
}
