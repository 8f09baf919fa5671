import type { JsonSchema } from '#server/http/define-route.ts';

/** Filters of the register; each stands in the address. `from` and `to` are work days, both included. */
export type RegisterFilter = {
  q?: string;
  workOrder?: string;
  contractor?: string;
  kind?: string;
  from?: string;
  to?: string;
  lot?: string;
  conforming?: 'yes' | 'no';
  rule?: string;
  versions?: 'current' | 'all';
};

export const REGISTER_FILTER_QUERY: Readonly<Record<keyof RegisterFilter, JsonSchema>> = {
  q: { type: 'string', maxLength: 80, description: 'Beginning of a structure or record number.' },
  workOrder: { type: 'string', format: 'uuid' },
  contractor: { type: 'string', format: 'uuid' },
  kind: { type: 'string', enum: ['set', 'straighten', 'relevel'] },
  from: { type: 'string', format: 'date', description: 'First work day.' },
  to: { type: 'string', format: 'date', description: 'Last work day.' },
  lot: { type: 'string', maxLength: 80, description: 'Lot number.' },
  conforming: { type: 'string', enum: ['yes', 'no'] },
  rule: { type: 'string', maxLength: 80, description: 'Rule accepted by concession.' },
  versions: { type: 'string', enum: ['current', 'all'], description: 'Current versions only, unless all.' },
};

/** Conditions over `v` (register_versions) and `c` (register_current, joined left), with their values from `$first` on. */
export function registerConditions(
  filter: RegisterFilter,
  options: { contractorId: string | null; first?: number },
): { sql: string; values: unknown[] } {
  const values: unknown[] = [];
  const conditions: string[] = [];
  const add = (value: unknown, condition: (place: string) => string) => {
    if (value === undefined || value === null) return;
    values.push(value);
    conditions.push(condition(`$${(options.first ?? 1) + values.length - 1}`));
  };
  add(options.contractorId, (p) => `v.contractor_id = ${p}::uuid`);
  add(
    filter.q?.replaceAll(/[\\%_]/g, String.raw`\$&`).concat('%'),
    (p) => `(lower(v.structure_number) like lower(${p}) or lower(v.record_number) like lower(${p}))`,
  );
  add(filter.workOrder, (p) => `v.work_order_id = ${p}::uuid`);
  add(filter.contractor, (p) => `v.contractor_id = ${p}::uuid`);
  add(filter.kind, (p) => `v.kind = ${p}`);
  add(filter.from, (p) => `v.work_day >= ${p}::date`);
  add(filter.to, (p) => `v.work_day <= ${p}::date`);
  add(
    filter.lot,
    // As a list made first: who poured a lot is few, and how few is not known before it is looked up.
    (p) => `v.record_id = any(array(select p.record_id from pours p where p.lot_text = ${p}))`,
  );
  if (filter.conforming)
    conditions.push(filter.conforming === 'no' ? 'v.nonconforming' : 'not v.nonconforming');
  add(filter.rule, (p) => `v.rule_codes @> array[${p}]`);
  if (filter.versions !== 'all') conditions.push('c.version_id is not null');
  return { sql: conditions.length > 0 ? conditions.join(' and ') : 'true', values };
}
