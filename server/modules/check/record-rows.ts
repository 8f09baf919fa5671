import { randomUUID } from 'node:crypto';
import type { CheckedRecord, CheckResult } from '#shared/check/types.ts';
import { countFindings } from '#shared/findings/count-findings.ts';
import { worstSeverity } from '#shared/findings/severity-order.ts';
import type { Finding } from '#shared/findings/types.ts';
import { lineKey } from '#shared/records/structure-key.ts';
import type { Pour } from '#shared/rules/types.ts';
import { RECORD_SCHEMA } from './engine.ts';
import type { LotRow } from './load-lots.ts';
import type { StartedRun } from './start-run.ts';

type Row = Record<string, unknown>;
type Checked = {
  readonly run: StartedRun;
  readonly lots: readonly LotRow[];
  /** Some of the check's records, and how many came before them. */
  readonly records: readonly CheckedRecord[];
  readonly from: number;
  /** Findings of the whole check. */
  readonly findings: CheckResult['findings'];
  readonly lineIds: ReadonlyMap<string, string>;
  readonly recordIds: ReadonlyMap<string, string>;
};
export type RecordRows = { readonly records: readonly Row[]; readonly pours: readonly Row[] };

const keyOf = (record: CheckedRecord): string =>
  lineKey(record.kind, record.structureNumber, record.occurrence);

/** New ids of a check's records by line key. */
export const recordIds = (records: readonly CheckedRecord[]): ReadonlyMap<string, string> =>
  new Map(records.map((record) => [keyOf(record), randomUUID()]));

/** Rows of `records` and `pours` of a part of a check, keys as the columns. Texts are made storable where they are written out. */
export function recordRows(checked: Checked): RecordRows {
  const { run, lineIds } = checked;
  const lotIds = lotIndex(checked.lots);
  const byLine = findingsByLine(checked.findings);
  const records: Row[] = [];
  const pours: Row[] = [];
  checked.records.forEach((record, index) => {
    const key = keyOf(record);
    const id = checked.recordIds.get(key);
    const own = record.pours.map((pour, n) => pourRow({ pour, recordId: id, n: n + 1, lotIds }));
    pours.push(...own);
    records.push({
      id,
      run_id: run.id,
      revision_id: run.revisionId,
      line_id: lineIds.get(key),
      ordinal: checked.from + index + 1,
      work_order_id: run.workOrderId,
      contractor_id: run.contractorId,
      lot_ids: [...new Set(own.flatMap(({ lot_id }) => (typeof lot_id === 'string' ? [lot_id] : [])))],
      ...recordRow(record, byLine.get(key) ?? []),
    });
  });
  return { records, pours };
}

function recordRow(record: CheckedRecord, findings: readonly Finding[]): Row {
  const counts = countFindings(findings);
  const { values, derived } = record;
  return {
    kind: record.kind,
    structure_number: record.structureNumber,
    occurrence: record.occurrence,
    sheet: record.sheet,
    row: record.row,
    raw: record.source.cells,
    values: values,
    derived,
    events: record.events.map((event) => ({
      event: event.values['event'] ?? null,
      values: event.values,
      cells: event.cells,
    })),
    schema: RECORD_SCHEMA,
    standard_id: record.standardId,
    work_day: record.workDay,
    worst_severity: worstSeverity(findings),
    nonconformities: counts.nonconformity,
    queries: counts.query,
    notes: counts.note,
    fill_ratio: derived.fillRatio,
    fill_ratio_u: derived.fillRatioU,
    latitude: numberOrNull(values['latitude']),
    longitude: numberOrNull(values['longitude']),
    rule_codes: record.ruleCodes,
    product_codes: [
      ...new Set(record.pours.flatMap((pour) => (pour.product === null ? [] : [pour.product]))),
    ],
  };
}

function pourRow(options: {
  pour: Pour;
  recordId: string | undefined;
  n: number;
  lotIds: ReadonlyMap<string, string>;
}): Row {
  const { pour, recordId, n, lotIds } = options;
  return {
    record_id: recordId,
    n,
    pour_number: wholeOrNull(pour.pourNumber),
    event: wholeOrNull(pour.event) ?? 1,
    product_code: pour.product,
    lot_id: lotIds.get(lotKey(pour.product, pour.lot)) ?? null,
    lot_text: pour.lot,
    kit_ft3: pour.kitFt3,
    quantity: pour.quantity,
    wasted_quantity: pour.wastedQuantity,
    poured_wall: pour.pouredAt,
    poured_at: pour.pouredAtMs === null ? null : new Date(pour.pouredAtMs).toISOString(),
    component_a_temp_f: pour.componentATempF,
    component_b_temp_f: pour.componentBTempF,
    sheet: pour.source.sheet,
    row: pour.source.row,
    raw: { values: pour.source.values, cells: pour.source.cells },
  };
}

const grouped = new WeakMap<readonly Finding[], ReadonlyMap<string, Finding[]>>();

/** Grouped once for all parts of a check. */
function findingsByLine(findings: readonly Finding[]): ReadonlyMap<string, Finding[]> {
  const before = grouped.get(findings);
  if (before) return before;
  const byLine = new Map<string, Finding[]>();
  for (const finding of findings) {
    if (finding.kind === null || finding.structureNumber === null) continue;
    const key = lineKey(finding.kind, finding.structureNumber, finding.occurrence ?? 1);
    const same = byLine.get(key);
    if (same) same.push(finding);
    else byLine.set(key, [finding]);
  }
  grouped.set(findings, byLine);
  return byLine;
}

const lotKey = (product: string | null, number: string | null): string =>
  `${product?.trim().toUpperCase() ?? ''}|${number?.trim().toUpperCase() ?? ''}`;
const lotIndex = (lots: readonly LotRow[]): ReadonlyMap<string, string> =>
  new Map(lots.map((lot) => [lotKey(lot.product, lot.number), lot.id]));
const numberOrNull = (value: unknown): number | null => (typeof value === 'number' ? value : null);
const wholeOrNull = (value: number | null): number | null =>
  value !== null && Number.isSafeInteger(value) && Math.abs(value) < 2 ** 31 ? value : null;
