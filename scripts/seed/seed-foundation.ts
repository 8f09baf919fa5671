import type { EntityManager } from '@mikro-orm/postgresql';
import { hashPassword } from '#server/auth/hash-password.ts';
import { insertRows, insertRowsReturning } from '#server/db/insert-rows.ts';
import { row } from '#server/db/rows.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import { DEMO_PRODUCT } from '#shared/standard/demo.ts';
import { LOTS } from './story/lots.ts';
import people from './story/people.json' with { type: 'json' };
import { STANDARDS } from './story/standards.ts';
import { type StoryWorkOrder, WORK_ORDERS } from './story/work-orders.ts';

/**
 * What stood before the first batch was handed in: organisations and people with the demo's password, product, lots,
 * the standard's versions and the work orders. In em's transaction.
 */
export async function seedFoundation(em: EntityManager, options: { password: string }): Promise<void> {
  const orgIds = await seedOrganisations(em);
  const userIds = await seedPeople(em, { orgIds, password: options.password });
  await seedStandards(em, userIds);
  await seedProduct(em);
  for (const order of WORK_ORDERS) await seedWorkOrder(em, order, must(orgIds, order.contractor));
  await appendTrail(em, {
    actor: null,
    action: 'installation.seeded',
    subject: { type: 'installation', id: 'demo', label: 'Demo' },
  });
}

type Ids = ReadonlyMap<string, string>;

async function seedOrganisations(em: EntityManager): Promise<Ids> {
  const list = people.organisations.map(({ kind, name }) => ({ kind, name }));
  const made = await insertRowsReturning<{ id: string; name: string }>(em, {
    table: 'organisations',
    list,
    returning: ['id', 'name'],
  });
  return new Map(
    people.organisations.map(({ key, name }) => [key, made.find((org) => org.name === name)!.id]),
  );
}

async function seedPeople(
  em: EntityManager,
  { orgIds, password }: { orgIds: Ids; password: string },
): Promise<Ids> {
  const list = await Promise.all(
    people.people.map(async ({ organisation, role, email, name }) => ({
      org_id: must(orgIds, organisation),
      role,
      email,
      name,
      password_hash: await hashPassword(password),
    })),
  );
  const made = await insertRowsReturning<{ id: string; email: string }>(em, {
    table: 'users',
    list,
    returning: ['id', 'email'],
  });
  return new Map(made.map(({ id, email }) => [email, id]));
}

/** Written as history: the use case refuses, rightly, a version whose first day has passed. */
async function seedStandards(em: EntityManager, userIds: Ids): Promise<void> {
  const list = STANDARDS.map(({ n, effectiveOn, body, author, approver, note }) => ({
    n,
    title: body.name,
    effective_on: effectiveOn,
    body,
    state: 'published',
    author_id: must(userIds, author),
    approver_id: must(userIds, approver),
    published_at: `${effectiveOn}T06:00:00Z`,
    note,
  }));
  await insertRows(em, 'standard_versions', list);
}

async function seedProduct(em: EntityManager): Promise<void> {
  const product = await row<{ id: string }>(
    em,
    'insert into products (code, name) values ($1, $2) returning id',
    [DEMO_PRODUCT.code, DEMO_PRODUCT.name],
  );
  if (!product) throw new Error('The product was not made.');
  await insertRows(em, 'product_versions', [
    { product_id: product.id, n: 1, effective_on: '2025-01-06', body: DEMO_PRODUCT },
  ]);
  const lots = await insertRowsReturning<{ id: string; number: string }>(em, {
    table: 'lots',
    list: LOTS.map((lot) => ({ product_id: product.id, number: lot.number, expires_on: lot.expiresOn })),
    returning: ['id', 'number'],
  });
  const idOf = new Map(lots.map((lot) => [lot.number, lot.id]));
  const receipts = LOTS.flatMap((lot) =>
    lot.received.map(({ kitFt3, quantity }) => ({
      lot_id: must(idOf, lot.number),
      type: 'received',
      kit_ft3: kitFt3,
      quantity,
      effective_on: lot.receivedOn,
    })),
  );
  await insertRows(em, 'lot_events', receipts);
  const holds = LOTS.flatMap((lot) =>
    lot.event
      ? [
          {
            lot_id: must(idOf, lot.number),
            type: lot.event.type,
            reason: lot.event.reason,
            effective_on: lot.event.on,
          },
        ]
      : [],
  );
  await insertRows(em, 'lot_events', holds);
}

async function seedWorkOrder(em: EntityManager, order: StoryWorkOrder, contractorId: string): Promise<void> {
  const made = await row<{ id: string }>(
    em,
    `insert into work_orders (number, title, contractor_id, zone, batch_prefix) values ($1, $2, $3, $4, $1) returning id`,
    [order.number, order.title, contractorId, order.zone],
  );
  if (!made) throw new Error('The work order was not made.');
  const structures = await insertRowsReturning<{ id: string; number: string }>(em, {
    table: 'structures',
    list: order.planned.map((planned) => ({ number: planned.structureNumber })),
    returning: ['id', 'number'],
  });
  const idOf = new Map(structures.map((structure) => [structure.number, structure.id]));
  const planned = order.planned.map(({ structureNumber, kind, design }) => ({
    work_order_id: made.id,
    structure_id: must(idOf, structureNumber),
    kind,
    design,
  }));
  await insertRows(em, 'planned', planned);
}

function must(ids: Ids, key: string): string {
  const id = ids.get(key);
  if (id === undefined) throw new Error(`The story names ${key}, which it did not make.`);
  return id;
}
