import type { JsonSchema } from '#server/http/define-route.ts';

/** The auditor's filters; each stands in the address. `from` and `to` are work days, both included. */
export type NonconformityFilter = {
  rule?: string;
  severity?: string;
  state?: string;
  grounds?: string;
  contractor?: string;
  workOrder?: string;
  from?: string;
  to?: string;
  lot?: string;
  product?: string;
  q?: string;
};

export const NONCONFORMITY_FILTER_QUERY: Readonly<Record<keyof NonconformityFilter, JsonSchema>> = {
  rule: { type: 'string', maxLength: 80, description: 'Code of the rule.' },
  severity: {
    type: 'string',
    enum: ['nonconformity', 'query', 'note'],
    description: 'Nonconformities and queries, unless given.',
  },
  state: { type: 'string', enum: ['undecided', 'approved', 'rejected', 'concession-asked'] },
  grounds: {
    type: 'string',
    enum: ['concession'],
    description: 'What was approved on evidence or answer does conform and is not listed.',
  },
  contractor: { type: 'string', format: 'uuid' },
  workOrder: { type: 'string', format: 'uuid' },
  from: { type: 'string', format: 'date', description: 'First work day.' },
  to: { type: 'string', format: 'date', description: 'Last work day.' },
  lot: { type: 'string', maxLength: 80, description: 'Lot number.' },
  product: { type: 'string', maxLength: 80, description: 'Product code.' },
  q: { type: 'string', maxLength: 80, description: 'Beginning of a structure number.' },
};

const STATE: Readonly<Record<string, string>> = {
  undecided: 'open',
  approved: 'approved',
  rejected: 'rejected',
  'concession-asked': 'held',
};

/** Conditions over `s` (finding_states) and `f` (findings). */
export function nonconformityConditions(filter: NonconformityFilter): { sql: string; values: unknown[] } {
  const values: unknown[] = [];
  const conditions = [`(s.state <> 'approved' or s.grounds = 'concession')`];
  const add = (value: unknown, condition: (place: string) => string) => {
    if (value === undefined || value === null) return;
    values.push(value);
    conditions.push(condition(`$${values.length}`));
  };
  add(filter.rule, (p) => `s.code = ${p}`);
  if (filter.severity === undefined) conditions.push(`s.severity <> 'note'`);
  add(filter.severity, (p) => `s.severity = ${p}`);
  add(filter.state === undefined ? undefined : STATE[filter.state], (p) => `s.state = ${p}`);
  add(filter.grounds, (p) => `s.grounds = ${p}`);
  add(filter.contractor, (p) => `s.contractor_id = ${p}::uuid`);
  add(filter.workOrder, (p) => `s.work_order_id = ${p}::uuid`);
  add(filter.from, (p) => `s.work_day >= ${p}::date`);
  add(filter.to, (p) => `s.work_day <= ${p}::date`);
  add(
    filter.lot,
    // As a list made first: who poured a lot is few, and how few is not known before it is looked up.
    (p) => `s.record_id = any(array(select x.record_id from pours x where x.lot_text = ${p}))`,
  );
  add(
    filter.product,
    (p) =>
      `exists (select 1 from records x where x.id = s.record_id and x.product_codes @> array[${p}::text])`,
  );
  add(
    filter.q?.replaceAll(/[\\%_]/g, String.raw`\$&`).concat('%'),
    (p) =>
      `exists (select 1 from findings x where x.id = s.finding_id and lower(x.structure_number) like lower(${p}))`,
  );
  return { sql: conditions.join(' and '), values };
}
