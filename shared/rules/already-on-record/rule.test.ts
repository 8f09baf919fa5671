import { describeRule } from '../describe-rule.ts';
import { alreadyOnRecord } from './rule.ts';

const context = { register: new Map([['S-1', { recordNumber: 'R-000007', own: true }]]) };
const foreign = { register: new Map([['S-1', { recordNumber: 'R-000007', own: false }]]) };

describeRule(alreadyOnRecord, {
  valid: [
    { name: 'not on record', line: { structureNumber: 'S-2' }, context },
    { name: 'replaces it by number', line: { values: { replacesStructure: 's-1' } }, context },
    { name: 'replaces it by record', line: { values: { replacesStructure: 'R-000007' } }, context },
    { name: 'number unreadable', line: { broken: ['structureNumber'] }, context },
    { name: 'the register not known here', line: {} },
  ],
  invalid: [
    {
      name: 'on record',
      line: { structureNumber: 's-1' },
      context,
      expected: [{ measured: 's-1', limit: null, margin: null, params: { recordNumber: 'R-000007' } }],
    },
    {
      name: 'replaces another one',
      line: { values: { replacesStructure: 'S-9' } },
      context,
      expected: [{ measured: 'S-1' }],
    },
    {
      name: 'by another contractor: which record is for the owner alone',
      line: {},
      context: foreign,
      expected: [{ measured: 'S-1', ownerParams: { recordNumber: 'R-000007' } }],
    },
  ],
});
