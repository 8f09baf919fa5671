import type { Failing } from './failing-lines.ts';

/** What is seen only with what the batch knows beside the line. */
export const FAILING_CONTEXT: readonly Failing[] = [
  { code: 'not-on-order', context: { design: [] }, expected: { measured: 'S-1', limit: null } },
  {
    code: 'done-twice',
    context: { siblings: new Set(['set|S-1']) },
    expected: { measured: 2, limit: 1, margin: -1 },
  },
  {
    code: 'unproved',
    values: { hardwareAt: null },
    expected: { measured: null, limit: null, field: 'hardwareAt' },
  },
  { code: 'photo-missing', values: { waterIn: 0.5 }, expected: { limit: 'water', field: 'waterIn' } },
  {
    code: 'design-differs',
    values: { poleClass: '3' },
    expected: { measured: '3', limit: '4', margin: null, field: 'poleClass' },
  },
];
