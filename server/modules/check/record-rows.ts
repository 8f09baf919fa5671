import { randomUUID } from 'node:crypto';
import type { CheckedRecord, CheckResult } from '#shared/check/types.ts';
import { countFindings } from '#shared/findings/count-findings.ts';
import { worstSeverity } from '#shared/findings/severity-order.ts';
import type { Finding } from '#shared/findings/types.ts';
import { lineKey } from '#shared/records/structure-key.ts';
import type { Pour } from '#shared/rules/types.ts';
import { RECORD_SCHEMA } from './engine.ts';
import type { LoadedContext } from './load-context.ts';
import type { LotRow } from './load-lots.ts';
import type { StartedRun } from './start-run.ts';
import { storableJson } from './storable-json.ts';

type Row = Record<string, unknown>;
type Checked = {
  readonly run: StartedRun;
  readonly result: CheckResult;
  readonly loaded: LoadedContext;
  readonly lineIds: ReadonlyMap<string, string>;
};
export type RecordRows = {
  readonly records: readonly Row[];
  readonly pours: readonly Row[];
  /** Record id by line key. */
  readonly idByKey: ReadonlyMap<string, string>;
};

/** Rows of `records` and `pours` of a check, keys as the columns. */
export function recordRows({ run, result, loaded, lineIds }: Checked): RecordRows {
  const lotIds = lotIndex(loaded.lots);
  const byLine = findingsByLine(result.findings);
  const idByKey = new Map<string, string>();
  const records: Row[] = [];
  const pours: Row[] = [];
  result.records.forEach((record, index) => {
    const key = lineKey(record.kind, record.structureNumber, record.occurrence);
    const id = randomUUID();
    idByKey.set(key, id);
    const own = record.pours.map((pour, n) => pourRow({ pour, recordId: id, n: n + 1, lotIds }));
    pours.push(...own);
    records.push({
      id,
      run_id: run.id,
      revision_id: run.revisionId,
      line_id: lineIds.get(key),
      ordinal: index + 1,
      work_order_id: run.workOrderId,
      contractor_id: run.contractorId,
      lot_ids: [...new Set(own.flatMap(({ lot_id }) => (typeof lot_id === 'string' ? [lot_id] : [])))],
      ...recordRow(record, byLine.get(key) ?? []),
    });
  });
  return { records, pours, idByKey };
}

function recordRow(record: CheckedRecord, findings: readonly Finding[]): Row {
  const counts = countFindings(findings);
  const { values, derived } = record;
  return {
    kind: record.kind,
    structure_number: storableJson(record.structureNumber),
    occurrence: record.occurrence,
    sheet: storableJson(record.sheet),
    row: record.row,
    raw: storableJson(record.source.cells),
    values: storableJson(values),
    derived,
    events: storableJson(
      record.events.map((event) => ({
        event: event.values['event'] ?? null,
        values: event.values,
        cells: event.cells,
      })),
    ),
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
      ...new Set(record.pours.flatMap((pour) => (pour.product === null ? [] : [storableJson(pour.product)]))),
    ],
  };
}

function pourRow(options: {
  pour: Pour;
  recordId: string;
  n: number;
  lotIds: ReadonlyMap<string, string>;
}): Row {
  const { pour, recordId, n, lotIds } = options;
  return {
    record_id: recordId,
    n,
    pour_number: wholeOrNull(pour.pourNumber),
    event: wholeOrNull(pour.event) ?? 1,
    product_code: storableJson(pour.product),
    lot_id: lotIds.get(lotKey(pour.product, pour.lot)) ?? null,
    lot_text: storableJson(pour.lot),
    kit_ft3: pour.kitFt3,
    quantity: pour.quantity,
    wasted_quantity: pour.wastedQuantity,
    poured_wall: pour.pouredAt,
    poured_at: pour.pouredAtMs === null ? null : new Date(pour.pouredAtMs).toISOString(),
    component_a_temp_f: pour.componentATempF,
    component_b_temp_f: pour.componentBTempF,
    sheet: storableJson(pour.source.sheet),
    row: pour.source.row,
    raw: storableJson({ values: pour.source.values, cells: pour.source.cells }),
  };
}

function findingsByLine(findings: readonly Finding[]): ReadonlyMap<string, Finding[]> {
  const byLine = new Map<string, Finding[]>();
  for (const finding of findings) {
    if (finding.kind === null || finding.structureNumber === null) continue;
    const key = lineKey(finding.kind, finding.structureNumber, finding.occurrence ?? 1);
    const same = byLine.get(key);
    if (same) same.push(finding);
    else byLine.set(key, [finding]);
  }
  return byLine;
}

const lotKey = (product: string | null, number: string | null): string =>
  `${product?.trim().toUpperCase() ?? ''}|${number?.trim().toUpperCase() ?? ''}`;
const lotIndex = (lots: readonly LotRow[]): ReadonlyMap<string, string> =>
  new Map(lots.map((lot) => [lotKey(lot.product, lot.number), lot.id]));
const numberOrNull = (value: unknown): number | null => (typeof value === 'number' ? value : null);
const wholeOrNull = (value: number | null): number | null =>
  value !== null && Number.isSafeInteger(value) && Math.abs(value) < 2 ** 31 ? value : null;
