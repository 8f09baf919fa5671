import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { Product } from '#shared/generated/api-types.ts';

/** Foam products by code, each with its newest version. */
export async function listProducts(em: EntityManager): Promise<{ items: Product[] }> {
  const items = await rows<Product & Record<string, unknown>>(
    em,
    `select distinct on (p.code) p.id, p.code, v.n, v.body from products p join product_versions v on v.product_id = p.id
     order by p.code, v.n desc`,
  );
  return { items };
}
