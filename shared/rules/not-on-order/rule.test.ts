import type { Kind } from '#shared/records/types.ts';
import { describeRule } from '../describe-rule.ts';
import { notOnOrder } from './rule.ts';

const planned = (structureNumber: string, kind: Kind) => ({
  structureNumber,
  kind,
  poleLengthFt: null,
  poleClass: null,
  poleMaterial: null,
  embedmentFt: null,
  latitude: null,
  longitude: null,
});
const context = { design: [planned('S-1', 'set'), planned('P-7', 'relevel')] };

describeRule(notOnOrder, {
  valid: [
    { name: 'planned', line: { structureNumber: 'S-1' }, context },
    { name: 'planned, small letters', line: { structureNumber: 's-1' }, context },
    { name: 'number unreadable', line: { structureNumber: '', broken: ['structureNumber'] }, context },
  ],
  invalid: [
    {
      name: 'not planned',
      line: { structureNumber: 'S-2' },
      context,
      expected: [{ measured: 'S-2', limit: null, margin: null }],
    },
    {
      name: 'planned for another kind',
      line: { structureNumber: 'P-7' },
      context,
      expected: [{ measured: 'P-7' }],
    },
  ],
});
