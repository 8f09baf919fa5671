import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { ProductInForce, StandardInForce } from '#shared/rules/types.ts';

/** Published standards by their day; `asOf` an instant: those published by then. */
export function loadStandards(em: EntityManager, asOf: string | null): Promise<StandardInForce[]> {
  return rows<StandardInForce>(
    em,
    `select id, n, effective_on as "effectiveOn", body from standard_versions
     where state = 'published' and ($1::timestamptz is null or published_at <= $1) order by effective_on`,
    [asOf],
  );
}

/** Product versions by their day; `asOf` an instant: those known by then. */
export function loadProducts(em: EntityManager, asOf: string | null): Promise<ProductInForce[]> {
  return rows<ProductInForce>(
    em,
    `select p.code, v.n, v.effective_on as "effectiveOn", v.body
     from product_versions v join products p on p.id = v.product_id
     where $1::timestamptz is null or v.created_at <= $1 order by p.code, v.effective_on`,
    [asOf],
  );
}
