import { expect, it } from 'vitest';
import type { StandardVersion } from '#shared/generated/api-types.ts';
import { standOf } from './standard-state.tsx';

const version = (n: number, state: StandardVersion['state'], effectiveOn: string): StandardVersion => ({
  id: String(n),
  n,
  title: '',
  state,
  effectiveOn,
  body: {},
  note: null,
  author: '',
  approver: null,
  publishedAt: null,
  version: 1,
  can: [],
});

it('one version is in force on a day', () => {
  const all = [
    version(1, 'published', '2025-01-06'),
    version(2, 'published', '2026-03-02'),
    version(3, 'published', '2026-09-01'),
    version(4, 'draft', '2026-01-01'),
  ];
  const on = (today: string) => all.map((one) => standOf(one, { all, today }));
  expect(on('2026-03-01')).toEqual(['in-force', 'coming', 'coming', 'draft']);
  expect(on('2026-03-02')).toEqual(['past', 'in-force', 'coming', 'draft']);
  expect(on('2026-12-31')).toEqual(['past', 'past', 'in-force', 'draft']);
});
