import { randomUUID } from 'node:crypto';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import { createProduct } from '#tests/factories/foam.ts';
import { createStandard } from '#tests/factories/standards.ts';
import { createWorkOrder } from '#tests/factories/work-orders.ts';
import { copyRows } from './copy-rows.ts';
import type { Bench } from './start-bench.ts';

const CONTRACTORS = 20;
const ORDERS = 200;
const LOTS = 400;
const DAYS = 1_460;
const FIRST_DAY = Date.UTC(2022, 0, 3);
const DAY_MS = 86_400_000;
const CODES = Object.keys(DEMO_STANDARD.rules);
const KINDS = ['set', 'set', 'set', 'set', 'straighten', 'relevel'] as const;
/** Of the findings: a tenth stands by concession, the rest is open, rejected, approved on evidence. */
const STATES = ['open', 'rejected', 'approved', 'approved', 'concession'] as const;

export type SeededRegister = {
  readonly records: number;
  readonly contractors: readonly string[];
  readonly orders: readonly string[];
  readonly lots: readonly string[];
  readonly codes: readonly string[];
};

/** Spread over its range, the same every time. */
const mixed = (n: number, of: number): number => Math.abs(Math.imul(n + 1, 2_654_435_761)) % of;
const dayOf = (n: number): string => new Date(FIRST_DAY + mixed(n, DAYS) * DAY_MS).toISOString().slice(0, 10);
const numberOf = (n: number): string => `S-${String(n + 1).padStart(7, '0')}`;

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
      `{${base.lots[mixed(n, LOTS)]!.id}}`,
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
      const lot = base.lots[mixed(n, LOTS)]!;
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

function* map<T, U>(list: readonly T[], make: (item: T) => U): Generator<U> {
  for (const item of list) yield make(item);
}

type Batch = {
  id: string;
  revision: string;
  run: string;
  order: string;
  contractor: string;
  concession: string;
};

async function seedBase(bench: Bench) {
  const em = bench.em();
  const author = await bench.person('engineer');
  const approver = await bench.person('engineer');
  const clerk = await bench.person('clerk');
  const standard = await createStandard(em, { authorId: author.id, approverId: approver.id });
  const product = await createProduct(em);
  const contractors: string[] = [];
  for (let n = 0; n < CONTRACTORS; n += 1) contractors.push((await bench.person('contractor')).orgId);
  const lots = Array.from({ length: LOTS }, (_, n) => ({ id: randomUUID(), number: `LK-${1_000 + n}` }));
  await copyRows(
    bench.ownerUrl,
    { table: 'lots', columns: ['id', 'product_id', 'number', 'expires_on'] },
    map(lots, (lot) => [lot.id, product.id, lot.number, '2035-12-31']),
  );
  const batches: Batch[] = [];
  for (let n = 0; n < ORDERS; n += 1) {
    const contractor = contractors[n % CONTRACTORS]!;
    const order = await createWorkOrder(em, { contractorId: contractor });
    batches.push({
      id: randomUUID(),
      revision: randomUUID(),
      run: randomUUID(),
      order: order.id,
      contractor,
      concession: randomUUID(),
    });
  }
  const at = '2026-01-05T12:00:00Z';
  const fill = (
    table: string,
    columns: readonly string[],
    make: (batch: Batch, n: number) => readonly (string | number | null)[],
  ) => copyRows(bench.ownerUrl, { table, columns }, batches.map(make));
  await fill('batches', ['id', 'number', 'work_order_id', 'contractor_id'], (each, n) => [
    each.id,
    `B-${n + 1}`,
    each.order,
    each.contractor,
  ]);
  await fill(
    'check_runs',
    ['id', 'revision_id', 'input', 'engine', 'schema', 'state', 'finished_at'],
    (each) => [each.run, each.revision, 1, '1', 'v1', 'done', at],
  );
  await fill(
    'revisions',
    ['id', 'batch_id', 'n', 'status', 'input', 'run_id', 'submitted_at', 'decided_at'],
    (each) => [each.revision, each.id, 0, 'on-record', 1, each.run, at, at],
  );
  await fill(
    'concessions',
    ['id', 'number', 'revision_id', 'contractor_id', 'work_order_id', 'reason'],
    (each, n) => [each.concession, `C-${n + 1}`, each.revision, each.contractor, each.order, 'As built.'],
  );
  await fill('concession_events', ['concession_id', 'seq', 'type', 'condition'], (each) => [
    each.concession,
    1,
    'granted',
    'Looked at each year.',
  ]);
  return { standard: standard.id, product: product.code, clerk: clerk.id, contractors, lots, batches };
}

async function seedFindings(
  bench: Bench,
  rows: {
    all: readonly number[];
    record: readonly string[];
    line: readonly string[];
    batch: (n: number) => Batch;
    codeOf: (n: number) => string;
    stateOf: (n: number) => (typeof STATES)[number];
  },
): Promise<void> {
  const { all, record, line, batch, codeOf, stateOf } = rows;
  const url = bench.ownerUrl;
  const finding = new Map(all.map((n) => [n, randomUUID()]));
  const decided = all.filter((n) => stateOf(n) !== 'open');
  const outcome = (n: number) =>
    stateOf(n) === 'rejected' ? 'rejected' : stateOf(n) === 'open' ? 'open' : 'approved';
  const grounds = (n: number) =>
    stateOf(n) === 'concession' ? 'concession' : stateOf(n) === 'approved' ? 'evidence' : null;
  const severity = (n: number) => (n % 10 === 0 ? 'query' : 'nonconformity');
  await copyRows(
    url,
    {
      table: 'findings',
      columns: [
        'id',
        'run_id',
        'revision_id',
        'record_id',
        'line_id',
        'ordinal',
        'code',
        'severity',
        'kind',
        'structure_number',
        'occurrence',
        'sheet',
        'row',
        'cell',
        'field',
        'measured',
        'limit_value',
        'margin',
        'unit',
        'uncertainty',
        'params',
        'fingerprint',
      ],
    },
    map(all, (n) => [
      finding.get(n)!,
      batch(n).run,
      batch(n).revision,
      record[n]!,
      line[n]!,
      n + 1,
      codeOf(n),
      severity(n),
      'set',
      numberOf(n),
      1,
      'Set',
      n + 4,
      `G${n + 4}`,
      'embedmentFt',
      '5.5',
      '6',
      -0.5,
      'ft',
      0.08,
      '{}',
      `f${n}`,
    ]),
  );
  await copyRows(
    url,
    {
      table: 'decisions',
      columns: [
        'finding_id',
        'revision_id',
        'seq',
        'decision',
        'grounds',
        'action',
        'reason',
        'concession_id',
      ],
    },
    map(decided, (n) => [
      finding.get(n)!,
      batch(n).revision,
      1,
      outcome(n) === 'rejected' ? 'reject' : 'approve',
      grounds(n),
      outcome(n) === 'rejected' ? 'rework' : null,
      'As seen.',
      stateOf(n) === 'concession' ? batch(n).concession : null,
    ]),
  );
  await copyRows(
    url,
    {
      table: 'finding_states',
      columns: [
        'finding_id',
        'revision_id',
        'batch_id',
        'record_id',
        'line_id',
        'contractor_id',
        'work_order_id',
        'code',
        'severity',
        'work_day',
        'sort_day',
        'state',
        'grounds',
        'action',
        'version',
      ],
    },
    map(all, (n) => [
      finding.get(n)!,
      batch(n).revision,
      batch(n).id,
      record[n]!,
      line[n]!,
      batch(n).contractor,
      batch(n).order,
      codeOf(n),
      severity(n),
      dayOf(n),
      dayOf(n),
      outcome(n),
      grounds(n),
      outcome(n) === 'rejected' ? 'rework' : null,
      stateOf(n) === 'open' ? 0 : 1,
    ]),
  );
  const rejected = all.filter((n) => stateOf(n) === 'rejected');
  await copyRows(
    url,
    { table: 'actions', columns: ['finding_id', 'type', 'due_on'] },
    map(rejected, (n) => [finding.get(n)!, 'rework', dayOf(n)]),
  );
}

const VALUES = {
  poleLengthFt: 40,
  poleClass: '4',
  poleMaterial: 'southern-pine',
  girthGroundLineIn: 35.25,
  girthButtIn: 38.25,
  boreTopIn: 20,
  boreBottomIn: 19.5,
  boreDepthFt: 6,
  ground: 'soil',
  embedmentFt: 6,
  foamTopBelowGradeIn: 0,
  waterIn: 0.5,
  leanInPer10Ft: 0.25,
  boredAt: '2026-04-14T09:00',
  setAt: '2026-04-14T09:40',
  letGoAt: '2026-04-14T10:05',
  hardwareAt: '2026-04-14T11:00',
  loadAt: 'not-yet',
  accuracyFt: 5,
  locateTicket: 'LT-1',
  locateFrom: '2026-04-10',
  locateTo: '2026-04-24',
};
const valuesOf = (n: number): string => JSON.stringify({ structureNumber: numberOf(n), ...VALUES });
const RAW = JSON.stringify(
  Object.fromEntries(
    Object.entries(VALUES).map(([key, value]) => [key, { address: 'AA100', raw: String(value) }]),
  ),
);
const DERIVED = JSON.stringify({
  voidFt3: 8.4,
  placedFt3: 9.5,
  fillRatio: 1.13,
  fillRatioU: 0.08,
  worstReading: 'boreTopIn',
  dueFt: 6,
  waterWithPoleIn: 0.7,
  leastAnnulusIn: 3.9,
  poleTaped: true,
});
