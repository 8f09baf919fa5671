import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { Kind } from '#shared/records/types.ts';
import type { DesignFact } from '#shared/rules/types.ts';

type PlannedRow = { structure_number: string; kind: Kind; design: Partial<DesignFact> };

/** The design list of a work order as amended. */
export async function loadDesign(em: EntityManager, workOrderId: string): Promise<DesignFact[]> {
  const planned = await rows<PlannedRow>(
    em,
    'select structure_number, kind, design from planned_current where work_order_id = $1 and not removed',
    [workOrderId],
  );
  return planned.map(({ structure_number, kind, design }) => ({
    structureNumber: structure_number,
    kind,
    poleLengthFt: design.poleLengthFt ?? null,
    poleClass: design.poleClass ?? null,
    poleMaterial: design.poleMaterial ?? null,
    embedmentFt: design.embedmentFt ?? null,
    latitude: design.latitude ?? null,
    longitude: design.longitude ?? null,
  }));
}
