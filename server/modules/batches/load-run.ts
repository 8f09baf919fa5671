import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { CheckResult } from '#shared/check/types.ts';
import type { Finding } from '#shared/findings/types.ts';
import type { CellSource, Derived, FieldValues, Kind, SourceRow } from '#shared/records/types.ts';
import type { Pour } from '#shared/rules/types.ts';

type StoredRow = { values: FieldValues; cells: Record<string, CellSource> };
type RecordRow = {
  kind: Kind;
  structure_number: string;
  occurrence: number;
  sheet: string;
  row: number;
  raw: Record<string, CellSource>;
  values: FieldValues;
  derived: Derived;
  work_day: string | null;
  standard_id: string;
  standard_number: number;
  rule_codes: string[];
  pours: (Omit<Pour, 'source' | 'broken'> & { sheet: string; row: number; raw: StoredRow })[] | null;
  events: (StoredRow & { event: number | null })[];
};

/** A stored check as the check itself gave it, as far as two checks are compared by it. */
export async function loadRun(em: EntityManager, runId: string): Promise<CheckResult> {
  const records = await rows<RecordRow>(
    em,
    `select r.kind, r.structure_number, r.occurrence, r.sheet, r.row, r.raw, r.values, r.derived, r.work_day, r.standard_id,
       s.n as standard_number, r.rule_codes, r.events, (
         select json_agg(json_build_object(
           'pourNumber', p.pour_number, 'event', p.event, 'pouredAt', p.poured_wall, 'pouredAtMs', null,
           'product', p.product_code, 'lot', p.lot_text, 'kitFt3', p.kit_ft3, 'quantity', p.quantity,
           'wastedQuantity', p.wasted_quantity, 'componentATempF', p.component_a_temp_f,
           'componentBTempF', p.component_b_temp_f, 'sheet', p.sheet, 'row', p.row, 'raw', p.raw) order by p.n)
         from pours p where p.record_id = r.id
       ) as pours
     from records r left join standard_versions s on s.id = r.standard_id where r.run_id = $1 order by r.ordinal`,
    [runId],
  );
  const findings = await rows<Finding>(
    em,
    `select code, severity, kind, structure_number as "structureNumber", occurrence, sheet, row, cell, field, measured,
       limit_value as "limit", margin, unit, uncertainty, params, '{}'::jsonb as "ownerParams", fingerprint
     from findings where run_id = $1 and origin = 'check' order by ordinal`,
    [runId],
  );
  return { records: records.map(toRecord), findings, skipped: [] };
}

function toRecord(record: RecordRow): CheckResult['records'][number] {
  const { sheet, row, values } = record;
  return {
    kind: record.kind,
    structureNumber: record.structure_number,
    occurrence: record.occurrence,
    sheet,
    row,
    source: { sheet, row, values, cells: record.raw, problems: [] },
    values,
    derived: record.derived,
    workDay: record.work_day,
    standardId: record.standard_id,
    standardNumber: record.standard_number,
    product: null,
    pours: (record.pours ?? []).map(({ sheet, row, raw, ...pour }) => ({
      ...pour,
      source: sourceRow(sheet, row, raw),
      broken: new Set<string>(),
    })),
    events: record.events.map((event) => sourceRow('Events', 0, event)),
    ruleCodes: record.rule_codes,
  };
}

const sourceRow = (sheet: string, row: number, stored: StoredRow): SourceRow => ({
  sheet,
  row,
  values: stored.values ?? {},
  cells: stored.cells ?? {},
  problems: [],
});
