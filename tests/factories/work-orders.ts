import type { EntityManager } from '@mikro-orm/postgresql';
import { insertRows, insertRowsReturning } from '#server/db/insert-rows.ts';
import { row } from '#server/db/rows.ts';
import type { Kind } from '#shared/records/types.ts';
import { placeOf } from './place.ts';
import { unique } from './unique.ts';

export type PlannedStructure = {
  structureNumber: string;
  kind?: Kind;
  design?: Readonly<Record<string, unknown>>;
};

/** A 40 ft class 4 pole in soil; each stands where its number has it. */
const DESIGN = {
  poleLengthFt: 40,
  poleClass: '4',
  poleMaterial: 'southern-pine',
  ground: 'soil',
  embedmentFt: null,
};

export type WorkOrder = { id: string; number: string; contractorId: string };

/** A work order with its planned structures (kind `set` unless said). */
export async function createWorkOrder(
  em: EntityManager,
  options: { contractorId: string; number?: string; zone?: string; planned?: readonly PlannedStructure[] },
): Promise<WorkOrder> {
  const number = options.number ?? `WO-${unique()}`;
  const made = await row<WorkOrder>(
    em,
    `insert into work_orders (number, title, contractor_id, zone, batch_prefix) values ($1, $2, $3, $4, $1)
     returning id, number, contractor_id as "contractorId"`,
    [number, `Line work ${number}`, options.contractorId, options.zone ?? 'America/Chicago'],
  );
  if (made === null) throw new Error('The work order was not made.');
  const planned = options.planned ?? [];
  const structures = await insertRowsReturning<{ id: string; number: string }>(em, {
    table: 'structures',
    list: [...new Set(planned.map((each) => each.structureNumber))].map((each) => ({ number: each })),
    returning: ['id', 'number'],
  });
  const idOf = new Map(structures.map((structure) => [structure.number, structure.id]));
  await insertRows(
    em,
    'planned',
    planned.map((each) => ({
      work_order_id: made.id,
      structure_id: idOf.get(each.structureNumber),
      kind: each.kind ?? 'set',
      design: { ...DESIGN, ...placeOf(each.structureNumber), ...each.design },
    })),
  );
  return made;
}
