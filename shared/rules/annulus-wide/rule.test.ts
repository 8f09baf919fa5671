import { describeRule } from '../describe-rule.ts';
import { annulusWide } from './rule.ts';

/** A 12 in pole as a cylinder. */
const values = {
  boreTopIn: 20,
  boreDepthFt: 6,
  embedmentFt: 6,
  diameterGroundLineIn: 12,
  diameterButtIn: 12,
};

describeRule(annulusWide, {
  valid: [
    { name: 'four inches: (20 − 12)/2', line: { values } },
    { name: 'at the limit: (24 − 12)/2', line: { values: { ...values, boreTopIn: 24 } } },
    { name: 'the bell is left out', line: { values: { ...values, bellIn: 40, bellHeightFt: 2 } } },
    { name: 'sizes not known', line: {} },
    { name: 'a size unreadable', line: { values: { ...values, boreTopIn: 30 }, broken: ['boreBottomIn'] } },
  ],
  invalid: [
    {
      name: 'seven inches: (26 − 12)/2',
      line: { values: { ...values, boreTopIn: 26 } },
      expected: [{ measured: 7, limit: 6, margin: -1, unit: 'in' }],
    },
    {
      name: 'the wider axis and the thinner end count: (25 − 11)/2',
      line: { values: { ...values, boreTopAcrossIn: 25, diameterGroundLineIn: 11 } },
      expected: [{ measured: 7, limit: 6, margin: -1 }],
    },
  ],
});
