import type { WorkOrder } from '#shared/generated/api-types.ts';
import { may, type Ability } from '#shared/permissions/ability.ts';
import type { WorkOrderDbRow } from './work-order-select.ts';

export function presentWorkOrder(row: WorkOrderDbRow, { ability }: { ability: Ability }): WorkOrder {
  const { structures, in_batch: inBatch, approved, on_record: onRecord } = row;
  const canCreate =
    row.state === 'open' && may(ability, 'create', 'Batch', { contractorId: row.contractor_id });
  return {
    id: row.id,
    number: row.number,
    title: row.title,
    zone: row.zone,
    contractor: { id: row.contractor_id, name: row.contractor_name },
    structures,
    progress: { planned: structures - inBatch - approved - onRecord, inBatch, approved, onRecord },
    openBatch: row.open_batch,
    version: row.version,
    can: canCreate ? ['create-batch'] : [],
  };
}
