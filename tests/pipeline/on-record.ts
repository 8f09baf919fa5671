import { run } from '#server/db/rows.ts';
import { createSubmittedBatch } from '#tests/factories/submitted-batch.ts';
import { createWorkOrder } from '#tests/factories/work-orders.ts';
import type { Stage } from '#tests/setup/api-harness.ts';

/** A structure set by another contractor (or the one named) and on record, written straight into the tables. */
export async function createOnRecord(
  harness: Stage,
  options: { structureNumber: string; latitude: number; longitude: number; contractorId?: string },
): Promise<void> {
  const em = harness.em();
  const { structureNumber, latitude, longitude } = options;
  const contractorId = options.contractorId ?? (await harness.person('contractor')).orgId;
  const workOrder = await createWorkOrder(em, { contractorId, planned: [{ structureNumber }] });
  const { lines } = await createSubmittedBatch(em, { workOrder, lines: [{ structureNumber, findings: [] }] });
  await run(
    em,
    `with structure as (select id from structures where number = $1), version as (
       insert into register_versions (structure_id, kind, n, record_number, record_id, structure_number, work_order_id,
         contractor_id, latitude, longitude)
       select id, 'set', 1, $2, $3, $1, $4, $5, $6, $7 from structure returning id, structure_id, kind, record_number
     )
     insert into register_current (structure_id, kind, version_id, record_number)
     select structure_id, kind, id, record_number from version`,
    [
      structureNumber,
      `R-${structureNumber}`,
      lines[0]?.recordId,
      workOrder.id,
      workOrder.contractorId,
      latitude,
      longitude,
    ],
  );
}
