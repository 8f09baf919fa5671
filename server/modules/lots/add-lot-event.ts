import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import { conflict, notFound, problem } from '#server/http/problem.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { LotEventBody } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { mailLotBlocked } from './mail-lot-blocked.ts';

type LockedLot = { id: string; number: string; product: string; status: 'in-use' | 'held' | 'recalled' };

/**
 * A receipt, or a lot held, released or recalled. Whoever used it hears of a hold and a recall.
 * @throws Problem 404; 409 when the lot does not stand so; 422 when what the event needs is missing
 */
export async function addLotEvent(
  em: EntityManager,
  options: { lotId: string; body: LotEventBody; actor: Actor },
): Promise<void> {
  const { lotId, body, actor } = options;
  const reason = body.reason?.trim() || null;
  ensureComplete(body, reason);
  await em.transactional(async (tx) => {
    await row(tx, 'select id from lots where id = $1 for update', [lotId]);
    const lot = await row<LockedLot>(
      tx,
      'select lot_id as id, number, product, status from lot_status where lot_id = $1',
      [lotId],
    );
    if (!lot) throw notFound();
    ensureMove(lot, body.type);
    const event = await row<{ id: string }>(
      tx,
      `insert into lot_events (lot_id, type, kit_ft3, quantity, reason, actor_id, at)
       values ($1, $2, $3, $4, $5, $6, clock_timestamp()) returning id`,
      [lotId, body.type, body.kitFt3 ?? null, body.quantity ?? null, reason, actor.id],
    );
    await run(tx, 'update lots set version = version + 1 where id = $1', [lotId]);
    await appendTrail(tx, {
      actor,
      action: `lot.${body.type}`,
      subject: { type: 'lot', id: lotId, label: `${lot.product} ${lot.number}` },
      payload: { kitFt3: body.kitFt3 ?? null, quantity: body.quantity ?? null, reason },
    });
    if (event && reason && (body.type === 'held' || body.type === 'recalled'))
      await mailLotBlocked(tx, { lot, eventId: event.id, status: body.type, reason, by: actor.name });
  });
}

function ensureComplete(body: LotEventBody, reason: string | null): void {
  const missing = (pointer: string, detail: string) =>
    problem(422, 'lot.incomplete', detail, {
      errors: [{ pointer, code: `${pointer.slice(1)}.missing`, detail }],
    });
  if (body.type !== 'received') {
    if (!reason) throw missing('/reason', 'Say why.');
    return;
  }
  if (typeof body.kitFt3 !== 'number') throw missing('/kitFt3', 'Say which kit size was received.');
  if (typeof body.quantity !== 'number') throw missing('/quantity', 'Say how many kits were received.');
}

function ensureMove(lot: LockedLot, type: LotEventBody['type']): void {
  if (lot.status === 'recalled')
    throw conflict('lot.recalled', `Lot ${lot.number} is recalled; nothing more happens to it.`);
  if (type === 'held' && lot.status === 'held')
    throw conflict('lot.held', `Lot ${lot.number} is held already.`);
  if (type === 'released' && lot.status !== 'held')
    throw conflict('lot.not-held', `Lot ${lot.number} is not held.`);
}
