import type { RegisterRow } from '#shared/generated/api-types.ts';
import { poleText } from '#shared/register/pole-text.ts';
import type { RegisterDbRow } from './register-select.ts';

const numberOrNull = (value: unknown): number | null => (typeof value === 'number' ? value : null);

/** A version on record, on the wire. */
export function presentRegister(row: RegisterDbRow): RegisterRow {
  return {
    id: row.id,
    recordId: row.record_id,
    recordNumber: row.record_number,
    version: row.n,
    current: row.current,
    structureNumber: row.structure_number,
    kind: row.kind,
    contractor: { id: row.contractor_id, name: row.contractor_name },
    workOrder: { id: row.work_order_id, number: row.work_order_number },
    installedOn: row.work_day,
    pole: poleText(row.values),
    embedmentFt: numberOrNull(row.values['embedmentFt']),
    dueFt: row.derived.dueFt,
    fillRatio: row.fill_ratio,
    fillRatioU: row.derived.fillRatioU,
    lots: row.lots,
    nonconforming: row.nonconforming,
    concessions: row.concessions,
    latitude: row.latitude,
    longitude: row.longitude,
    enteredAt: row.entered_at,
    enteredBy: row.entered_by ?? '',
    reason: row.reason,
    supersedes: row.n > 1 ? row.n - 1 : null,
    can: [],
  };
}
