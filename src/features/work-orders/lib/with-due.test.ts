import { expect, it } from 'vitest';
import { withDue } from './with-due.ts';
import { inForce } from '../api/standard-in-force.ts';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import type { PlannedStructure, StandardVersion } from '#shared/generated/api-types.ts';

const row = (design: Partial<PlannedStructure['design']>, kind: PlannedStructure['kind'] = 'set') =>
  ({
    structureNumber: 'A-1',
    kind,
    design: { poleLengthFt: 40, poleClass: '4', ground: 'soil', embedmentFt: null, ...design },
  }) as PlannedStructure;
const due = (one: PlannedStructure) => withDue([one], DEMO_STANDARD)[0]?.dueFt;

// The common rule, 10 % of the length and 2 ft: 40 ft in soil is set 6 ft deep.
it('takes the standard where the design says nothing', () => {
  expect(due(row({}))).toBe(6);
});

it('takes the larger of design and standard', () => {
  expect(due(row({ embedmentFt: 7 }))).toBe(7);
  expect(due(row({ embedmentFt: 5 }))).toBe(6);
});

it('knows the design’s alone in rock, for other work, and without a standard', () => {
  expect(due(row({ ground: 'rock' }))).toBeNull();
  expect(due(row({ ground: 'rock', embedmentFt: 4.5 }))).toBe(4.5);
  expect(due(row({}, 'straighten'))).toBeNull();
  expect(withDue([row({ embedmentFt: 5 })], null)[0]?.dueFt).toBe(5);
});

it('finds the version in force on a day', () => {
  const version = (n: number, effectiveOn: string | null, state = 'published') =>
    ({ n, effectiveOn, state }) as StandardVersion;
  const versions = [
    version(3, '2026-06-01'),
    version(1, '2025-01-01'),
    version(2, '2026-03-02'),
    version(4, '2026-04-01', 'draft'),
  ];
  expect(inForce(versions, '2026-05-31')?.n).toBe(2);
  expect(inForce(versions, '2026-06-01')?.n).toBe(3);
  expect(inForce(versions, '2024-12-31')).toBeNull();
});
