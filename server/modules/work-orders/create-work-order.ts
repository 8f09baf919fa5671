import type { EntityManager } from '@mikro-orm/postgresql';
import { insertRows } from '#server/db/insert-rows.ts';
import { row, rows, run } from '#server/db/rows.ts';
import { conflict, problem } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { CreateWorkOrderBody } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { structureKey } from '#shared/records/structure-key.ts';

/**
 * A new work order with its design list; structures that are not known yet come to be.
 * @throws Problem 409 when the number is taken; 422 for an unknown contractor or zone, or a structure twice
 */
export async function createWorkOrder(
  em: EntityManager,
  options: { body: CreateWorkOrderBody; actor: Actor },
): Promise<string> {
  const { body, actor } = options;
  ensureZone(body.zone);
  ensureOnce(body);
  return em.transactional(async (tx) => {
    const contractor = await row(tx, `select id from organisations where id = $1 and kind = 'contractor'`, [
      body.contractorId,
    ]);
    if (!contractor)
      throw problem(422, 'work-order.contractor', 'Choose a contractor.', {
        errors: [
          { pointer: '/contractorId', code: 'contractorId.unknown', detail: 'This is no contractor.' },
        ],
      });
    const order = await row<{ id: string }>(
      tx,
      `insert into work_orders (number, title, contractor_id, zone, batch_prefix, created_by)
       values ($1, $2, $3, $4, $5, $6) on conflict do nothing returning id`,
      [body.number.trim(), body.title.trim(), body.contractorId, body.zone, prefixOf(body), actor.id],
    );
    if (!order)
      throw conflict(
        'work-order.number-taken',
        `There is already a work order ${body.number}, or one whose batches are numbered ${prefixOf(body)}.`,
      );
    await plan(tx, { orderId: order.id, body, actor });
    await appendTrail(tx, {
      actor,
      action: 'work-order.created',
      subject: { type: 'work-order', id: order.id, label: body.number },
      payload: { title: body.title, contractor: body.contractorId, structures: body.structures.length },
    });
    return order.id;
  });
}

const prefixOf = (body: CreateWorkOrderBody): string => (body.batchPrefix ?? body.number).trim();

async function plan(
  em: EntityManager,
  options: { orderId: string; body: CreateWorkOrderBody; actor: Actor },
): Promise<void> {
  const { orderId, body, actor } = options;
  const numbers = [...new Set(body.structures.map((one) => one.structureNumber.trim()))];
  await run(
    em,
    `insert into structures (number) select unnest($1::text[]) on conflict (number) where retired_at is null do nothing`,
    [numbers],
  );
  const known = await rows<{ id: string; number: string }>(
    em,
    'select id, number from structures where number = any($1) and retired_at is null',
    [numbers],
  );
  const idOf = new Map(known.map((structure) => [structure.number, structure.id]));
  await insertRows(
    em,
    'planned',
    body.structures.map(({ structureNumber, kind, design }) => ({
      work_order_id: orderId,
      structure_id: idOf.get(structureNumber.trim()),
      kind,
      design,
      actor_id: actor.id,
    })),
  );
}

function ensureZone(zone: string): void {
  try {
    Intl.DateTimeFormat('en-US', { timeZone: zone });
  } catch {
    throw problem(
      422,
      'work-order.zone',
      'The time zone is not known. Give an IANA name such as America/Chicago.',
      {
        errors: [{ pointer: '/zone', code: 'zone.unknown', detail: 'This is no IANA time zone.' }],
      },
    );
  }
}

function ensureOnce(body: CreateWorkOrderBody): void {
  const seen = new Set<string>();
  body.structures.forEach(({ kind, structureNumber }, index) => {
    const key = `${kind}|${structureKey(structureNumber)}`;
    if (seen.has(key))
      throw problem(
        422,
        'work-order.structure-twice',
        `Structure ${structureNumber} is planned twice for the same work.`,
        {
          errors: [
            {
              pointer: `/structures/${index}/structureNumber`,
              code: 'structureNumber.twice',
              detail: 'It stands above already.',
            },
          ],
        },
      );
    seen.add(key);
  });
}
