import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { notFound } from '#server/http/problem.ts';
import type { PlannedStructure } from '#shared/generated/api-types.ts';
import type { Ability, Actor } from '#shared/permissions/ability.ts';
import { PLANNED_STATES } from './work-order-select.ts';

type PlannedRow = {
  id: string;
  structure_number: string;
  kind: PlannedStructure['kind'];
  design: Partial<PlannedStructure['design']>;
  state: PlannedStructure['state'];
  record_number: string | null;
  batch_id: string | null;
};

/**
 * The design list of a work order and where each structure stands.
 * @throws Problem 404 for another contractor's order as for none
 */
export async function listStructures(
  em: EntityManager,
  options: { id: string; actor: Actor; ability: Ability },
): Promise<{ items: PlannedStructure[] }> {
  const wall = contractorWall(options.ability, 'read', 'WorkOrder');
  const order = await row(
    em,
    'select id from work_orders where id = $1 and ($2::uuid is null or contractor_id = $2)',
    [options.id, wall],
  );
  if (!order) throw notFound();
  const planned = await rows<PlannedRow>(
    em,
    `select p.* from work_orders w cross join lateral (${PLANNED_STATES}) p where w.id = $1 order by p.structure_number, p.kind`,
    [options.id, options.actor.orgKind === 'contractor'],
  );
  return { items: planned.map(present) };
}

function present(planned: PlannedRow): PlannedStructure {
  const { design } = planned;
  return {
    id: planned.id,
    structureNumber: planned.structure_number,
    kind: planned.kind,
    design: {
      poleLengthFt: design.poleLengthFt ?? null,
      poleClass: design.poleClass ?? null,
      poleMaterial: design.poleMaterial ?? null,
      ground: design.ground ?? null,
      embedmentFt: design.embedmentFt ?? null,
      latitude: design.latitude ?? null,
      longitude: design.longitude ?? null,
    },
    state: planned.state,
    batchId: planned.batch_id,
    recordNumber: planned.record_number,
  };
}
