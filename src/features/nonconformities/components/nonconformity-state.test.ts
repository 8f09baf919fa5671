import { expect, it } from 'vitest';
import type { Nonconformity } from '#shared/generated/api-types.ts';
import { actionDue } from './nonconformity-state.tsx';

const ROW: Nonconformity = {
  id: 'f1',
  recordId: 'r1',
  code: 'embedment-short',
  title: 'Embedment short',
  severity: 'nonconformity',
  structureNumber: '17-0414',
  kind: 'set',
  measured: 5.75,
  limit: 6.5,
  margin: -0.75,
  unit: 'ft',
  uncertainty: 0.08,
  message: '',
  state: 'undecided',
  grounds: null,
  action: null,
  dueOn: null,
  concession: null,
  condition: null,
  contractor: { id: 'o1', name: 'Brindle' },
  workOrder: { id: 'w1', number: '17' },
  batch: { id: 'b1', number: '17-06', revision: 0 },
  installedOn: '2026-04-14',
  lots: ['LK-2291'],
  decidedBy: null,
  recordNumber: null,
};

it.each<[Partial<Nonconformity>, string]>([
  [{}, 'a decision'],
  [{ state: 'concession-asked', concession: 'C-0002' }, 'an engineer decides'],
  [{ state: 'approved', grounds: 'concession', concession: 'C-0001' }, 'none'],
  [{ state: 'approved', grounds: 'concession', condition: 'monitor lean, 1 Sep' }, 'monitor lean, 1 Sep'],
  [{ state: 'rejected', action: 'rework', dueOn: '2026-12-31' }, 'rework, 31 Dec 2026'],
  [{ state: 'rejected', action: 'correct' }, 'correct the record'],
])('%j -> %s', (change, due) => expect(actionDue({ ...ROW, ...change })).toBe(due));
