import { describeRule } from '../describe-rule.ts';
import { boreShallow } from './rule.ts';

describeRule(boreShallow, {
  valid: [
    { name: 'pole on the bottom', line: { values: { boreDepthFt: 6, embedmentFt: 6 } } },
    { name: 'within 0.1 ft', line: { values: { boreDepthFt: 5.9, embedmentFt: 6 } } },
    { name: 'pole on its bed', line: { values: { boreDepthFt: 6.5, embedmentFt: 6, bedFt: 0.5 } } },
    { name: 'over-dig', line: { values: { boreDepthFt: 7, embedmentFt: 6 } } },
    { name: 'bed unreadable', line: { values: { boreDepthFt: 5, embedmentFt: 6 }, broken: ['bedFt'] } },
  ],
  invalid: [
    {
      name: 'pole deeper than its bore',
      line: { values: { boreDepthFt: 5.5, embedmentFt: 6 } },
      expected: [{ measured: 5.5, limit: 5.9, margin: -0.4, unit: 'ft' }],
    },
    {
      name: 'no room for the bed',
      line: { values: { boreDepthFt: 6, embedmentFt: 6, bedFt: 0.5 } },
      expected: [{ measured: 6, limit: 6.4, margin: -0.4, params: { embedmentFt: 6, bedFt: 0.5 } }],
    },
  ],
});
