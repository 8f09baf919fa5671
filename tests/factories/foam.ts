import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import { DEMO_PRODUCT } from '#shared/standard/demo.ts';
import { unique } from './unique.ts';

export type FoamProduct = { id: string; code: string };

/** The demo's product as version 1, in force since 2020. */
export async function createProduct(
  em: EntityManager,
  options: { code?: string; body?: object } = {},
): Promise<FoamProduct> {
  const made = await row<FoamProduct>(
    em,
    'insert into products (code, name) values ($1, $2) returning id, code',
    [options.code ?? DEMO_PRODUCT.code, `Foam ${unique()}`],
  );
  if (made === null) throw new Error('The product was not made.');
  await run(
    em,
    `insert into product_versions (product_id, n, effective_on, body) values ($1, 1, '2020-01-01', $2)`,
    [made.id, JSON.stringify(options.body ?? DEMO_PRODUCT)],
  );
  return made;
}

export type Lot = { id: string; number: string };

/** A lot with receipts of each kit size: 100 of 4 ft³, enough of the others for any batch of a test. */
export async function createLot(
  em: EntityManager,
  options: { productId: string; number?: string; expiresOn?: string },
): Promise<Lot> {
  const made = await row<Lot>(
    em,
    'insert into lots (product_id, number, expires_on) values ($1, $2, $3) returning id, number',
    [options.productId, options.number ?? `L-${unique()}`, options.expiresOn ?? '2035-12-31'],
  );
  if (made === null) throw new Error('The lot was not made.');
  await run(
    em,
    `insert into lot_events (lot_id, type, kit_ft3, quantity)
     select $1, 'received', * from (values (1.5, 1000), (2.5, 1000), (4, 100), (6, 1000), (8, 1000)) as kits (ft3, n)`,
    [made.id],
  );
  return made;
}
