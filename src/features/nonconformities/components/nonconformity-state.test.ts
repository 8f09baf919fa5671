import { expect, it } from 'vitest';
import { actionDue } from './nonconformity-state.tsx';

type Row = Parameters<typeof actionDue>[0];
const ROW: Row = { state: 'undecided', condition: null, action: null, dueOn: null };

it.each<[Partial<Row>, string]>([
  [{}, 'a decision'],
  [{ state: 'concession-asked' }, 'an engineer decides'],
  [{ state: 'approved' }, 'none'],
  [{ state: 'approved', condition: 'monitor lean, 1 Sep' }, 'monitor lean, 1 Sep'],
  [{ state: 'rejected', action: 'rework', dueOn: '2026-12-31' }, 'rework, 31 Dec 2026'],
  [{ state: 'rejected', action: 'correct' }, 'correct the record'],
])('%j -> %s', (change, due) => expect(actionDue({ ...ROW, ...change })).toBe(due));
