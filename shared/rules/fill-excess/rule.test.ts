import { describeRule } from '../describe-rule.ts';
import { pourOf } from '../testing.ts';
import { fillExcess } from './rule.ts';

const fill = (placedFt3: number, voidFt3: number) => ({ voidFt3, placedFt3, fillRatio: placedFt3 / voidFt3 });
const pours = [pourOf()];

describeRule(fillExcess, {
  valid: [
    { name: 'at the limit', line: { pours, derived: fill(12, 8) } },
    // EP-15's smallest kit holds 1.5 ft³.
    { name: 'one smallest kit over a small void', line: { pours, derived: fill(2, 0.5) } },
  ],
  invalid: [
    {
      name: 'twice the void',
      line: { pours, derived: fill(16, 8) },
      expected: [{ measured: 2, limit: 1.5, margin: -0.5, unit: 'ratio', params: { surplusFt3: 8 } }],
    },
    {
      name: 'just over one smallest kit',
      line: { pours, derived: fill(2.25, 0.5) },
      expected: [{ measured: 4.5, limit: 1.5, margin: -3 }],
    },
    {
      name: 'foam where the readings leave no void',
      line: { pours, derived: { placedFt3: 8, voidFt3: 0, fillRatio: null } },
      expected: [{ measured: null, limit: 1.5, margin: null, params: { surplusFt3: 8 } }],
    },
  ],
});
