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
    (p) => `(v.structure_number ilike ${p} or v.record_number ilike ${p})`,
  );
  add(filter.workOrder, (p) => `v.work_order_id = ${p}::uuid`);
  add(filter.contractor, (p) => `v.contractor_id = ${p}::uuid`);
  add(filter.kind, (p) => `v.kind = ${p}`);
  add(filter.from, (p) => `v.work_day >= ${p}::date`);
  add(filter.to, (p) => `v.work_day <= ${p}::date`);
  add(
    filter.lot,
    (p) => `exists (select 1 from pours p where p.record_id = v.record_id and p.lot_text = ${p})`,
  );
  add(filter.conforming, (p) => `v.nonconforming = (${p} = 'no')`);
  add(filter.rule, (p) => `v.rule_codes @> array[${p}]`);
  if (filter.versions !== 'all') conditions.push('c.version_id is not null');
  return { sql: conditions.length > 0 ? conditions.join(' and ') : 'true', values };
}
