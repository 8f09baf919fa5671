import type { RouteContext } from '#server/http/define-route.ts';
import { contractorWall } from '#server/http/contractor-wall.ts';
import { sendCsv } from '#server/http/send-csv.ts';
import type { CsvCell } from '#shared/export/csv.ts';
import type { RegisterRow } from '#shared/generated/api-types.ts';
import { presentRegister } from './present-register.ts';
import { registerConditions, type RegisterFilter } from './register-filter.ts';
import { REGISTER_COLUMNS, REGISTER_FROM, type RegisterDbRow } from './register-select.ts';

const COLUMNS: readonly [title: string, cell: (row: RegisterRow) => CsvCell][] = [
  ['Record', (row) => row.recordNumber],
  ['Version', (row) => row.version],
  ['Current', (row) => row.current],
  ['Structure', (row) => row.structureNumber],
  ['Kind', (row) => row.kind],
  ['Contractor', (row) => row.contractor.name],
  ['Work order', (row) => row.workOrder.number],
  ['Installed on', (row) => row.installedOn],
  ['Pole', (row) => row.pole],
  ['Embedment (ft)', (row) => row.embedmentFt],
  ['Depth due (ft)', (row) => row.dueFt],
  ['Fill ratio', (row) => row.fillRatio],
  ['Fill ratio U (k = 2)', (row) => row.fillRatioU],
  ['Lots', (row) => row.lots.join('; ')],
  ['Conforming', (row) => !row.nonconforming],
  ['Concessions', (row) => row.concessions.join('; ')],
  ['Latitude', (row) => row.latitude],
  ['Longitude', (row) => row.longitude],
  ['Entered at', (row) => row.enteredAt],
  ['Entered by', (row) => row.enteredBy],
];

/** The filtered register as a CSV file. */
export async function exportRegister({
  ability,
  query,
  services,
  res,
}: RouteContext<{ query: RegisterFilter }>): Promise<void> {
  const where = registerConditions(query, {
    contractorId: contractorWall(ability, 'export', 'RegisterEntry'),
  });
  await sendCsv<RegisterDbRow>({
    pool: services.pool,
    res,
    fileName: 'register.csv',
    sql: `select ${REGISTER_COLUMNS} ${REGISTER_FROM} where ${where.sql} order by v.entered_at desc, v.id desc`,
    values: where.values,
    head: COLUMNS.map(([title]) => title),
    line: (found) => {
      const row = presentRegister(found);
      return COLUMNS.map(([, cell]) => cell(row));
    },
  });
}
