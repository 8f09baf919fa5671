import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import { conflict, problem, type ProblemError } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import { validateProduct } from '#shared/generated/validators.mjs';
import type { SaveProductBody } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import type { Product } from '#shared/standard/types.ts';

/**
 * A new product, or the next version of one that is known by its code, in force from a work day on. Earlier versions
 * stay: what was judged by them is not judged again.
 * @throws Problem 422 with the place of each fault; 409 when a version is in force from that day already
 */
export async function saveProduct(
  em: EntityManager,
  options: { body: SaveProductBody; actor: Actor },
): Promise<string> {
  const { actor } = options;
  const { effectiveOn, body } = options.body;
  const faults = faultsOf(body);
  if (faults.length > 0)
    throw problem(422, 'product.invalid', 'The product’s data are not complete.', { errors: faults });
  const product = body as unknown as Product;
  return em.transactional(async (tx) => {
    const known = await row<{ id: string }>(
      tx,
      `insert into products (code, name) values ($1, $2) on conflict (code) do update set name = excluded.name returning id`,
      [product.code, product.name],
    );
    if (!known) throw new Error('The product has no id.');
    const added = await run(
      tx,
      `insert into product_versions (product_id, n, effective_on, body, actor_id)
       select $1, coalesce(max(n), 0) + 1, $2, $3, $4 from product_versions where product_id = $1
       on conflict (product_id, effective_on) do nothing`,
      [known.id, effectiveOn, JSON.stringify(product), actor.id],
    );
    if (added === 0)
      throw conflict(
        'product.day-taken',
        `${product.code} already has a version in force from ${effectiveOn}.`,
      );
    await appendTrail(tx, {
      actor,
      action: 'product.version-added',
      subject: { type: 'product', id: known.id, label: product.code },
      payload: { effectiveOn, body: product },
    });
    return known.id;
  });
}

function faultsOf(body: unknown): ProblemError[] {
  return validateProduct(body).map(({ field, keyword }) => ({
    pointer: `/body${field === null ? '' : `/${field.replaceAll('.', '/')}`}`,
    code: keyword,
    detail: keyword === 'required' ? 'This is missing.' : `This does not fit (${keyword}).`,
  }));
}
