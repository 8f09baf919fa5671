import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { parsePage, toPage, type Page, type PageQuery } from '#server/http/page.ts';
import { notFound } from '#server/http/problem.ts';
import type { WorkOrder } from '#shared/generated/api-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { presentWorkOrder } from './present-work-order.ts';
import { WORK_ORDER_SELECT, WORK_ORDER_WALL, type WorkOrderDbRow } from './work-order-select.ts';

type Viewer = { actor: Actor; ability: Ability };
const wallOf = ({ actor, ability }: Viewer) => [
  contractorWall(ability, 'read', 'WorkOrder'),
  actor.orgKind === 'contractor',
];

/** Work orders behind the wall, newest first. */
export async function listWorkOrders(
  em: EntityManager,
  options: { query: PageQuery; viewer: Viewer },
): Promise<Page<WorkOrder>> {
  const { query, viewer } = options;
  const { limit, after } = parsePage(query, ['instant', 'uuid']);
  const wall = wallOf(viewer);
  const found = await rows<WorkOrderDbRow>(
    em,
    `${WORK_ORDER_SELECT} where ${WORK_ORDER_WALL} and ($3::timestamptz is null or (w.created_at, w.id) < ($3, $4::uuid))
     order by w.created_at desc, w.id desc limit $5`,
    [...wall, after?.[0] ?? null, after?.[1] ?? null, limit + 1],
  );
  const counted = after
    ? null
    : await row<{ n: number }>(em, `select count(*) as n from work_orders w where ${WORK_ORDER_WALL}`, [
        wall[0],
      ]);
  return toPage({
    rows: found,
    limit,
    total: counted?.n ?? null,
    key: (one) => [one.created_at, one.id],
    item: (one) => presentWorkOrder(one, viewer),
  });
}

/** @throws Problem 404 for another contractor's order as for none */
export async function readWorkOrder(em: EntityManager, options: Viewer & { id: string }): Promise<WorkOrder> {
  const found = await row<WorkOrderDbRow>(em, `${WORK_ORDER_SELECT} where ${WORK_ORDER_WALL} and w.id = $3`, [
    ...wallOf(options),
    options.id,
  ]);
  if (!found) throw notFound();
  return presentWorkOrder(found, options);
}
