import { paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

export const pourNone: LineRule = {
  code: 'pour-none',
  title: 'No pour',
  kinds: ['set', 'straighten', 'relevel'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'structureNumber',
  needs: [],
  paramsSchema: paramsSchema({}),
  check: (line) =>
    line.pours.length > 0 || line.broken.has('pours') || line.broken.has('structureNumber')
      ? []
      : [{ measured: 0, limit: 1, margin: -1, unit: 'count' }],
  message: () => 'No pour is written down for this structure: nothing shows that foam went in.',
  remedy: () => 'Add its pours on the Pours sheet, with the structure number exactly as here.',
};
