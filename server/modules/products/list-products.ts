import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { notFound } from '#server/http/problem.ts';
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

/** @throws Problem 404 */
export async function readProduct(em: EntityManager, id: string): Promise<Product> {
  const found = await row<Product & Record<string, unknown>>(
    em,
    `select p.id, p.code, v.n, v.body from products p join product_versions v on v.product_id = p.id
     where p.id = $1 order by v.n desc limit 1`,
    [id],
  );
  if (!found) throw notFound();
  return found;
}
