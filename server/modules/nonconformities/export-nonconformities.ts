import type { RouteContext } from '#server/http/define-route.ts';
import { sendCsv } from '#server/http/send-csv.ts';
import type { CsvCell } from '#shared/export/csv.ts';
import type { Nonconformity } from '#shared/generated/api-types.ts';
import { nonconformityConditions, type NonconformityFilter } from './nonconformity-filter.ts';
import {
  NONCONFORMITY_COLUMNS,
  NONCONFORMITY_JOINS,
  type NonconformityDbRow,
} from './nonconformity-select.ts';
import { presentNonconformity } from './present-nonconformity.ts';

const COLUMNS: readonly [title: string, cell: (row: Nonconformity) => CsvCell][] = [
  ['Structure', (row) => row.structureNumber],
  ['Kind', (row) => row.kind],
  ['Rule', (row) => row.code],
  ['Finding', (row) => row.title],
  ['Severity', (row) => row.severity],
  ['Measured', (row) => row.measured],
  ['Limit', (row) => row.limit],
  ['Margin', (row) => row.margin],
  ['Unit', (row) => row.unit],
  ['Uncertainty U (k = 2)', (row) => row.uncertainty],
  ['Sentence', (row) => row.message],
  ['State', (row) => row.state],
  ['Grounds', (row) => row.grounds],
  ['Action due', (row) => row.action],
  ['Due on', (row) => row.dueOn],
  ['Concession', (row) => row.concession],
  ['Condition', (row) => row.condition],
  ['Contractor', (row) => row.contractor.name],
  ['Work order', (row) => row.workOrder.number],
  ['Batch', (row) => row.batch.number],
  ['Revision', (row) => row.batch.revision],
  ['Installed on', (row) => row.installedOn],
  ['Lots', (row) => row.lots.join('; ')],
  ['Decided by', (row) => row.decidedBy],
  ['Record', (row) => row.recordNumber],
];

/** The filtered nonconformities as a CSV file. */
export async function exportNonconformities({
  query,
  services,
  res,
}: RouteContext<{ query: NonconformityFilter }>): Promise<void> {
  const where = nonconformityConditions(query);
  await sendCsv<NonconformityDbRow>({
    pool: services.pool,
    res,
    fileName: 'nonconformities.csv',
    sql: `${NONCONFORMITY_COLUMNS} from finding_states s ${NONCONFORMITY_JOINS} where ${where.sql} order by s.sort_day desc, s.finding_id desc`,
    values: where.values,
    head: COLUMNS.map(([title]) => title),
    line: (found) => {
      const row = presentNonconformity(found);
      return COLUMNS.map(([, cell]) => cell(row));
    },
  });
}
