import type { EntityManager } from '@mikro-orm/postgresql';
import type { SeededRegister } from '#scripts/bench/lib/seed-register.ts';
import { listNonconformities } from '#server/modules/nonconformities/list-nonconformities.ts';
import { summarise } from '#server/modules/nonconformities/summarise.ts';
import { listRegister, type RegisterQuery } from '#server/modules/register/list-register.ts';
import { defineAbilityFor, type Role } from '#shared/permissions/ability.ts';

export type Filter = {
  readonly name: string;
  readonly path: string;
  readonly by: 'auditor' | 'contractor';
  /** The use case behind the route, for its SQL. */
  readonly run: (em: EntityManager) => Promise<unknown>;
};

type Query = Readonly<Record<string, string>>;

const abilityOf = (role: Role, orgId: string) =>
  defineAbilityFor({
    id: '00000000-0000-4000-8000-000000000001',
    email: 'bench@people.example',
    name: 'Bench',
    role,
    orgId,
    orgKind: role === 'contractor' ? 'contractor' : 'owner',
    orgName: 'Bench',
  });

/** Every filter of the register, of nonconformities and of their summary, alone and as they are used together. */
export function filtersOf(seeded: SeededRegister): Filter[] {
  const contractor = seeded.contractors[0] ?? '';
  const workOrder = seeded.orders[3] ?? '';
  const lot = seeded.lots[7] ?? '';
  const rule = 'embedment-short';
  const days = { from: '2024-03-01', to: '2024-03-31' };
  const address = (base: string, query: Query) =>
    `${base}?${new URLSearchParams({ limit: '50', ...query }).toString()}`;
  const register = (name: string, query: Query, by: Filter['by'] = 'auditor'): Filter => ({
    name: `register: ${name}`,
    path: address('/api/register', query),
    by,
    run: (em) =>
      listRegister(em, {
        query: { limit: 50, ...query } as RegisterQuery,
        ability: abilityOf(by, contractor),
      }),
  });
  const nonconformities = (name: string, query: Query): Filter => ({
    name: `nonconformities: ${name}`,
    path: address('/api/nonconformities', query),
    by: 'auditor',
    run: (em) => listNonconformities(em, { limit: 50, ...query }),
  });
  const summary = (name: string, query: Query): Filter => ({
    name: `summary: ${name}`,
    path: `/api/nonconformities/summary?${new URLSearchParams(query).toString()}`,
    by: 'auditor',
    run: (em) => summarise(em, query),
  });
  return [
    register('all', {}),
    register('a contractor’s own', {}, 'contractor'),
    register('q, a structure', { q: 'S-0100' }),
    register('q, a record', { q: 'R-01999' }),
    register('q, nothing', { q: 'Z-99' }),
    register('q, a contractor’s own', { q: 'S-01' }, 'contractor'),
    register('workOrder', { workOrder }),
    register('contractor', { contractor }),
    register('kind', { kind: 'relevel' }),
    register('from and to', days),
    register('from', { from: '2025-11-01' }),
    register('lot', { lot }),
    register('lot, none', { lot: 'LK-none' }),
    register('conforming no', { conforming: 'no' }),
    register('conforming yes', { conforming: 'yes' }),
    register('rule', { rule }),
    register('rule, none', { rule: 'no-such-rule' }),
    register('versions all', { versions: 'all' }),
    ...(['entered', 'installed', '-installed', 'structure', '-structure'] as const).map((sort) =>
      register(`sorted ${sort}`, { sort }),
    ),
    register('contractor, from and to, sorted installed', { contractor, ...days, sort: '-installed' }),
    nonconformities('all', {}),
    nonconformities('rule', { rule }),
    nonconformities('severity', { severity: 'query' }),
    nonconformities('severity, none', { severity: 'note' }),
    ...(['undecided', 'approved', 'rejected', 'concession-asked'] as const).map((state) =>
      nonconformities(`state ${state}`, { state }),
    ),
    nonconformities('grounds', { grounds: 'concession' }),
    nonconformities('contractor', { contractor }),
    nonconformities('workOrder', { workOrder }),
    nonconformities('from and to', days),
    nonconformities('lot', { lot }),
    nonconformities('lot, none', { lot: 'LK-none' }),
    nonconformities('product', { product: 'EP-15' }),
    nonconformities('product, none', { product: 'XX' }),
    nonconformities('q, a structure', { q: 'S-0100' }),
    nonconformities('q, nothing', { q: 'Z-99' }),
    nonconformities('rule, contractor, state', { rule, contractor, state: 'rejected' }),
    summary('all', {}),
    summary('contractor', { contractor }),
    summary('from and to', days),
    summary('rule', { rule }),
    summary('lot', { lot }),
  ];
}
