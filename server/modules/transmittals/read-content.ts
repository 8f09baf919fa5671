import type { EntityManager } from '@mikro-orm/postgresql';
import { rows, run } from '#server/db/rows.ts';
import { FINDING_FACTS, toFinding, type FindingFacts } from '#server/modules/records/finding-facts.ts';
import { renderFinding } from '#shared/findings/render.ts';
import {
  EVENT_COLUMNS,
  FINDING_COLUMNS,
  kindColumns,
  POUR_COLUMNS,
  type ExportColumn,
} from '#shared/export/as-built-columns.ts';
import type { ExportRow } from '#shared/export/export-row.ts';
import { KINDS, SHEET_OF_KIND, type Derived, type FieldValues, type Kind } from '#shared/records/types.ts';

/** Rows fetched at a time: memory does not grow with the scope. */
const CHUNK = 100;

export type ContentSheet = {
  readonly name: string;
  readonly columns: readonly ExportColumn[];
  readonly chunks: () => AsyncGenerator<readonly ExportRow[]>;
};

type RecordRow = {
  ordinal: number;
  record_number: string;
  n: number;
  values: FieldValues;
  derived: Derived;
  nonconforming: boolean;
  concessions: string[];
  standard: number | null;
  contractor: string;
  work_order: string;
  batch: string;
  revision: number;
  photographs: number;
  entered_on: string;
};

/** The sheets of an as-built with their rows in the fixed order of the transmittal; read in em's own snapshot. */
export function readContent(em: EntityManager, transmittalId: string): readonly ContentSheet[] {
  const kindSheet = (kind: Kind): ContentSheet => ({
    name: SHEET_OF_KIND[kind],
    columns: kindColumns(kind),
    chunks: () =>
      inChunks<RecordRow, ExportRow>(em, { sql: RECORDS, values: [transmittalId, kind], map: recordRow }),
  });
  return [
    ...KINDS.map(kindSheet),
    {
      name: 'Pours',
      columns: POUR_COLUMNS,
      chunks: () => inChunks<PourRow, ExportRow>(em, { sql: POURS, values: [transmittalId], map: pourRow }),
    },
    {
      name: 'Events',
      columns: EVENT_COLUMNS,
      chunks: () =>
        inChunks<EventRow, ExportRow>(em, { sql: EVENTS, values: [transmittalId], map: eventRow }),
    },
    {
      name: 'Findings',
      columns: FINDING_COLUMNS,
      chunks: () =>
        inChunks<FindingRow, ExportRow>(em, { sql: FINDINGS, values: [transmittalId], map: findingRow }),
    },
  ];
}

/** Through a cursor of em's transaction: planned once, and no more rows here than are being written. */
async function* inChunks<Row extends object, Out>(
  em: EntityManager,
  query: { sql: string; values: readonly unknown[]; map: (row: Row) => Out },
): AsyncGenerator<readonly Out[]> {
  await run(em, `declare content no scroll cursor for ${query.sql}`, query.values);
  for (;;) {
    const found = await rows<Row>(em, `fetch ${CHUNK} from content`);
    if (found.length === 0) break;
    const chunk = found.map(query.map);
    yield chunk;
    // Promises of queries gone by hold on to what they gave until the old heap is looked through: give them nothing.
    found.length = 0;
    chunk.length = 0;
  }
  await run(em, 'close content');
}

const ITEMS = `
from transmittal_items i
join register_versions v on v.id = i.version_id
join records r on r.id = v.record_id
where i.transmittal_id = $1`;

const RECORDS = `
select i.ordinal, v.record_number, v.n, r.values, r.derived, v.nonconforming, sv.n as standard, o.name as contractor,
  w.number as work_order, b.number as batch, rev.n as revision,
  to_char(v.entered_at at time zone w.zone, 'YYYY-MM-DD') as entered_on,
  (select count(*)::int from photo_placed p where p.line_id = r.line_id) as photographs,
  array(
    select distinct c.number from finding_states s join decisions d on d.finding_id = s.finding_id and d.seq = s.version
    join concessions c on c.id = d.concession_id where s.record_id = r.id and s.grounds = 'concession' order by 1
  ) as concessions
from transmittal_items i
join register_versions v on v.id = i.version_id
join records r on r.id = v.record_id
join revisions rev on rev.id = r.revision_id
join batches b on b.id = rev.batch_id
join organisations o on o.id = v.contractor_id
join work_orders w on w.id = v.work_order_id
left join standard_versions sv on sv.id = r.standard_id
where i.transmittal_id = $1 and v.kind = $2
order by i.ordinal`;

function recordRow(row: RecordRow): ExportRow {
  return {
    written: row.values,
    known: {
      recordNumber: row.record_number,
      version: row.n,
      voidFt3: row.derived.voidFt3,
      placedFt3: row.derived.placedFt3,
      fillRatio: row.derived.fillRatio,
      fillRatioU: row.derived.fillRatioU,
      dueFt: row.derived.dueFt,
      waterWithPoleIn: row.derived.waterWithPoleIn,
      leastAnnulusIn: row.derived.leastAnnulusIn,
      conforms: row.nonconforming ? 'no' : 'yes',
      concessions: row.concessions.join('; '),
      standard: row.standard,
      contractor: row.contractor,
      workOrder: row.work_order,
      batch: row.batch,
      revision: row.revision,
      photographs: row.photographs,
      enteredOn: row.entered_on,
    },
  };
}

type OfStructure = { ordinal: number; record_number: string; structure_number: string; kind: Kind };
type PourRow = OfStructure & { written: FieldValues | null } & Record<string, unknown>;

const POURS = `
select i.ordinal, v.record_number, v.structure_number, v.kind, p.pour_number, p.event, p.poured_wall, p.product_code, p.lot_text,
  p.kit_ft3, p.quantity, p.wasted_quantity, p.component_a_temp_f, p.component_b_temp_f, p.raw->'values' as written
${ITEMS.replace('where', 'join pours p on p.record_id = r.id where')}
order by i.ordinal, p.n`;

function pourRow(row: PourRow): ExportRow {
  return {
    written: row.written,
    known: {
      recordNumber: row.record_number,
      structureNumber: row.structure_number,
      kind: row.kind,
      pourNumber: row['pour_number'] as number | null,
      event: row['event'] as number,
      pouredAt: row['poured_wall'] as string | null,
      product: row['product_code'] as string | null,
      lot: row['lot_text'] as string | null,
      kitFt3: row['kit_ft3'] as number | null,
      quantity: row['quantity'] as number | null,
      wastedQuantity: row['wasted_quantity'] as number | null,
      componentATempF: row['component_a_temp_f'] as number | null,
      componentBTempF: row['component_b_temp_f'] as number | null,
    },
  };
}

type EventRow = OfStructure & { event: number | null; written: FieldValues };

const EVENTS = `
select i.ordinal, v.record_number, v.structure_number, v.kind, e.value->'event' as event, e.value->'values' as written
${ITEMS.replace('where', 'cross join lateral jsonb_array_elements(r.events) with ordinality e(value, n) where')}
order by i.ordinal, e.n`;

function eventRow(row: EventRow): ExportRow {
  return {
    written: row.written,
    known: {
      recordNumber: row.record_number,
      structureNumber: row.structure_number,
      kind: row.kind,
      event: row.event,
    },
  };
}

type FindingRow = FindingFacts & {
  ordinal: number;
  record_number: string;
  state: string;
  grounds: string | null;
  reason: string | null;
  decided_by: string | null;
  concession: string | null;
  condition: string | null;
  ends_on: string | null;
};

const FINDINGS = `
select i.ordinal, v.record_number, s.state, s.grounds, d.reason, u.name as decided_by,
  c.number as concession, c.condition, c.ends_on, ${FINDING_FACTS}
${ITEMS.replace(
  'where',
  `join finding_states s on s.record_id = r.id
join findings f on f.id = s.finding_id
left join decisions d on d.finding_id = s.finding_id and d.seq = s.version
left join users u on u.id = d.actor_id
left join lateral (
  select k.number, e.condition, e.ends_on
  from concessions k join concession_events e on e.concession_id = k.id
  where k.id = d.concession_id order by e.seq desc limit 1
) c on true
where`,
)}
order by i.ordinal, f.ordinal`;

function findingRow(row: FindingRow): ExportRow {
  // What concerns another contractor stays out of a document that goes to many.
  const { title, message } = renderFinding(toFinding(row, false));
  return {
    known: {
      recordNumber: row.record_number,
      structureNumber: row.structure_number,
      code: row.code,
      title,
      severity: row.severity,
      measured: row.measured,
      limit: row.limit_value,
      margin: row.margin,
      unit: row.unit,
      sentence: message,
      decision: row.severity === 'note' ? '' : row.state,
      grounds: row.grounds,
      reason: row.reason,
      decidedBy: row.decided_by,
      concession: row.concession,
      condition: row.condition,
      endsOn: row.ends_on,
    },
  };
}
