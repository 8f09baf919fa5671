import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { conflict, problem } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { CreateLotBody } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';

/** @throws Problem 409 when the product has such a lot; 422 for an unknown product */
export async function createLot(
  em: EntityManager,
  options: { body: CreateLotBody; actor: Actor },
): Promise<string> {
  const { body, actor } = options;
  return em.transactional(async (tx) => {
    const product = await row<{ code: string }>(tx, 'select code from products where id = $1', [
      body.productId,
    ]);
    if (!product)
      throw problem(422, 'lot.product', 'Choose a product.', {
        errors: [{ pointer: '/productId', code: 'productId.unknown', detail: 'This product is not known.' }],
      });
    const lot = await row<{ id: string }>(
      tx,
      `insert into lots (product_id, number, expires_on) values ($1, $2, $3)
       on conflict (product_id, number) do nothing returning id`,
      [body.productId, body.number.trim(), body.expiresOn ?? null],
    );
    if (!lot) throw conflict('lot.number-taken', `${product.code} already has a lot ${body.number.trim()}.`);
    await appendTrail(tx, {
      actor,
      action: 'lot.created',
      subject: { type: 'lot', id: lot.id, label: `${product.code} ${body.number.trim()}` },
      payload: { expiresOn: body.expiresOn ?? null },
    });
    return lot.id;
  });
}
