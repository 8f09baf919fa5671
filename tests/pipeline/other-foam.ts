import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';
import { DEMO_PRODUCT } from '#shared/standard/demo.ts';
import { createLot, createProduct } from '#tests/factories/foam.ts';
import { EXPIRED_LOT, HELD_LOT, OTHER_LOT, OTHER_PRODUCT, SCARCE_LOT } from './rule-case.ts';

/** A second product, and lots of the first one that are expired, were held for a time, or are scarce. */
export async function createOtherFoam(em: EntityManager, productId: string): Promise<void> {
  const other = await createProduct(em, {
    code: OTHER_PRODUCT,
    body: { ...DEMO_PRODUCT, code: OTHER_PRODUCT },
  });
  await createLot(em, { productId: other.id, number: OTHER_LOT });
  await createLot(em, { productId, number: EXPIRED_LOT, expiresOn: '2026-04-13' });
  const held = await createLot(em, { productId, number: HELD_LOT });
  await run(
    em,
    `insert into lot_events (lot_id, type, reason, effective_on)
     values ($1, 'held', 'Rose slowly.', '2026-04-12'), ($1, 'released', 'Sound after all.', '2026-04-20')`,
    [held.id],
  );
  await run(
    em,
    `with scarce as (insert into lots (product_id, number) values ($1, $2) returning id)
     insert into lot_events (lot_id, type, kit_ft3, quantity)
     select id, 'received', ft3, n from scarce, (values (8, 2), (6, 1)) as kits (ft3, n)`,
    [productId, SCARCE_LOT],
  );
}
