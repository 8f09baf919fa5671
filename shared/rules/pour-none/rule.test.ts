import { describeRule } from '../describe-rule.ts';
import { pourOf } from '../testing.ts';
import { pourNone } from './rule.ts';

describeRule(pourNone, {
  valid: [
    { name: 'a pour', line: { pours: [pourOf()] } },
    { name: 'rows that may be its pours', line: { broken: ['pours'] } },
    { name: 'structure number unreadable', line: { broken: ['structureNumber'] } },
  ],
  invalid: [
    { name: 'none', line: {}, expected: [{ measured: 0, limit: 1, margin: -1, unit: 'count' }] },
    { name: 're-level', line: { kind: 'relevel' }, expected: [{ measured: 0, limit: 1, margin: -1 }] },
  ],
});
