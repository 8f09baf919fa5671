import { structureKey } from '#shared/records/structure-key.ts';
import { say } from '#shared/findings/say.ts';
import { paramsSchema } from '../params.ts';
import type { LineRule } from '../types.ts';

export const alreadyOnRecord: LineRule = {
  code: 'already-on-record',
  title: 'Already on record',
  kinds: ['set'],
  scope: 'line',
  severity: 'nonconformity',
  field: 'structureNumber',
  needs: ['register'],
  paramsSchema: paramsSchema({}),
  check: (line, _params, { register }) => {
    if (register === null || line.broken.has('structureNumber')) return [];
    const key = structureKey(line.structureNumber);
    const current = register.get(key);
    if (!current) return [];
    // Numbers are reused: the pole that stood there is named by its number or by its record.
    const replaced = structureKey(line.values['replacesStructure']);
    if (replaced !== '' && (replaced === key || replaced === structureKey(current.recordNumber))) return [];
    const record = { recordNumber: current.recordNumber };
    return [
      {
        measured: line.structureNumber,
        limit: null,
        margin: null,
        unit: null,
        ...(current.own ? { params: record } : { ownerParams: record }),
      },
    ];
  },
  message: ({ measured, params, ownerParams }) => {
    const number = params['recordNumber'] ?? ownerParams['recordNumber'];
    const record = number === undefined ? '' : ` (${say(number, null)})`;
    return `Structure ${say(measured, null)} is already on record as set${record}, and this line does not say that it replaces it.`;
  },
  remedy: () =>
    'Correct the structure number; if the pole was replaced, name the structure or record that it replaces.',
};
