import { shownFinding } from '#shared/check/shown-finding.ts';
import type { CheckedRecord, CheckResult } from '#shared/check/types.ts';
import type { Pour } from '#shared/rules/types.ts';

const pourRow = (pour: Pour) => ({
  row: pour.source.row,
  event: pour.event,
  pourNumber: pour.pourNumber,
  pouredAt: pour.pouredAt,
  product: pour.product,
  lot: pour.lot,
  kitFt3: pour.kitFt3,
  quantity: pour.quantity,
  wastedQuantity: pour.wastedQuantity,
  componentATempF: pour.componentATempF,
  componentBTempF: pour.componentBTempF,
});

const recordRow = (record: CheckedRecord) => ({
  kind: record.kind,
  structureNumber: record.structureNumber,
  occurrence: record.occurrence,
  sheet: record.sheet,
  row: record.row,
  values: record.values,
  derived: record.derived,
  workDay: record.workDay,
  standard: { id: record.standardId, number: record.standardNumber },
  product: record.product,
  pours: record.pours.map(pourRow),
  events: record.events.map(({ row, values }) => ({ row, values })),
});

/** The check as one JSON document `{records, findings, skipped}`. What only the owner may see never leaves by this door. */
export const reportJson = (result: CheckResult): string =>
  JSON.stringify({
    records: result.records.map(recordRow),
    findings: result.findings.map(shownFinding),
    skipped: result.skipped,
  });
