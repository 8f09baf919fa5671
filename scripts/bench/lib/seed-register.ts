import { randomUUID } from 'node:crypto';
import { copyRows } from './copy-rows.ts';
import { seedBase } from './seed-base.ts';
import { seedFindings } from './seed-findings.ts';
import { DERIVED, RAW, valuesOf } from './seed-record.ts';
import { CODES, dayOf, FIRST_DAY, KINDS, map, mixed, numberOf, STATES } from './seed-spread.ts';
import type { Bench } from './start-bench.ts';

export type SeededRegister = {
  readonly records: number;
  readonly contractors: readonly string[];
  readonly orders: readonly string[];
  readonly lots: readonly string[];
  readonly codes: readonly string[];
};

/**
 * So many records on the register, each with its structure, line, pour and one finding on every second, over four years of
 * twenty contractors: invented, seeded by COPY. One batch an order.
 */
export async function seedRegister(bench: Bench, records: number): Promise<SeededRegister> {
  const url = bench.ownerUrl;
  const base = await seedBase(bench);
  const ids = (): string[] => Array.from({ length: records }, () => randomUUID());
  const [structure, line, record, version] = [ids(), ids(), ids(), ids()];
  const all = Array.from({ length: records }, (_, n) => n);
  const at = (n: number): string => new Date(FIRST_DAY + n * 600_000).toISOString();
  const kind = (n: number): string => KINDS[n % KINDS.length] ?? 'set';
  const batch = (n: number) => base.batches[mixed(n, base.batches.length)]!;
  const lotOf = (n: number) => base.lots[mixed(n, base.lots.length)]!;
  const codeOf = (n: number): string => CODES[mixed(n * 7, CODES.length)]!;
  const hasFinding = (n: number): boolean => n % 2 === 0;
  const stateOf = (n: number): (typeof STATES)[number] => STATES[mixed(n * 3, STATES.length)]!;
  const conceded = (n: number): boolean => hasFinding(n) && stateOf(n) === 'concession';

  await copyRows(
    url,
    { table: 'structures', columns: ['id', 'number'] },
    map(all, (n) => [structure[n]!, numberOf(n)]),
  );
  await copyRows(
    url,
    {
      table: 'lines',
      columns: [
        'id',
        'batch_id',
        'kind',
        'structure_key',
        'structure_number',
        'state',
        'revision_id',
        'record_id',
      ],
    },
    map(all, (n) => [
      line[n]!,
      batch(n).id,
      kind(n),
      numberOf(n),
      numberOf(n),
      'on-record',
      batch(n).revision,
      record[n]!,
    ]),
  );
  await copyRows(
    url,
    {
      table: 'records',
      columns: [
        'id',
        'run_id',
        'revision_id',
        'line_id',
        'ordinal',
        'kind',
        'structure_number',
        'sheet',
        'row',
        'raw',
        'values',
        'derived',
        'schema',
        'standard_id',
        'work_order_id',
        'contractor_id',
        'work_day',
        'worst_severity',
        'nonconformities',
        'fill_ratio',
        'fill_ratio_u',
        'rule_codes',
        'lot_ids',
        'product_codes',
      ],
    },
    map(all, (n) => [
      record[n]!,
      batch(n).run,
      batch(n).revision,
      line[n]!,
      n + 1,
      kind(n),
      numberOf(n),
      'Set',
      n + 4,
      RAW,
      valuesOf(n),
      DERIVED,
      'v1',
      base.standard,
      batch(n).order,
      batch(n).contractor,
      dayOf(n),
      hasFinding(n) ? 'nonconformity' : null,
      hasFinding(n) ? 1 : 0,
      1.1,
      0.08,
      hasFinding(n) ? `{${codeOf(n)}}` : '{}',
      `{${lotOf(n).id}}`,
      `{${base.product}}`,
    ]),
  );
  await copyRows(
    url,
    {
      table: 'pours',
      columns: [
        'record_id',
        'n',
        'pour_number',
        'product_code',
        'lot_id',
        'lot_text',
        'kit_ft3',
        'quantity',
        'poured_wall',
        'component_a_temp_f',
        'component_b_temp_f',
        'sheet',
        'row',
      ],
    },
    map(all, (n) => {
      const lot = lotOf(n);
      return [
        record[n]!,
        1,
        1,
        base.product,
        lot.id,
        lot.number,
        8,
        1,
        `${dayOf(n)}T10:00`,
        72,
        72,
        'Pours',
        n + 4,
      ];
    }),
  );
  await seedFindings(bench, { all: all.filter(hasFinding), record, line, batch, codeOf, stateOf });
  await copyRows(
    url,
    {
      table: 'register_versions',
      columns: [
        'id',
        'structure_id',
        'kind',
        'n',
        'record_number',
        'record_id',
        'structure_number',
        'work_order_id',
        'contractor_id',
        'work_day',
        'fill_ratio',
        'latitude',
        'longitude',
        'nonconforming',
        'rule_codes',
        'entered_by',
        'entered_at',
      ],
    },
    map(all, (n) => [
      version[n]!,
      structure[n]!,
      kind(n),
      1,
      `R-${String(n + 1).padStart(7, '0')}`,
      record[n]!,
      numberOf(n),
      batch(n).order,
      batch(n).contractor,
      dayOf(n),
      1.1,
      41 + mixed(n, 2_000) / 1_000,
      -95 - mixed(n * 5, 2_000) / 1_000,
      conceded(n),
      conceded(n) ? `{${codeOf(n)}}` : '{}',
      base.clerk,
      at(n),
    ]),
  );
  await copyRows(
    url,
    { table: 'register_current', columns: ['structure_id', 'kind', 'version_id', 'record_number'] },
    map(all, (n) => [structure[n]!, kind(n), version[n]!, `R-${String(n + 1).padStart(7, '0')}`]),
  );
  await bench.database.query('vacuum analyze');
  return {
    records,
    contractors: base.contractors,
    orders: [...new Set(base.batches.map(({ order }) => order))],
    lots: base.lots.map(({ number }) => number),
    codes: CODES,
  };
}
