import { describeRule } from '../describe-rule.ts';
import { brandDiffers } from './rule.ts';

const values = { poleLengthFt: 40, embedmentFt: 6, brandHeightFt: 4 };

describeRule(brandDiffers, {
  valid: [
    { name: 'as embedded: 10 ft less 4 ft', line: { values } },
    { name: 'half a foot off', line: { values: { ...values, brandHeightFt: 3.5 } } },
    {
      name: 'a 50 ft pole is still branded at 10 ft',
      line: { values: { poleLengthFt: 50, embedmentFt: 7, brandHeightFt: 3 } },
    },
    {
      name: 'a 55 ft pole is branded at 14 ft',
      line: { values: { poleLengthFt: 55, embedmentFt: 7.5, brandHeightFt: 6.5 } },
    },
    {
      name: 'a brand below grade: 10 + 1 = 11 ft deep',
      line: { values: { ...values, embedmentFt: 11, brandHeightFt: -1 } },
    },
    {
      name: 'embedment unreadable',
      line: { values: { ...values, embedmentFt: null }, broken: ['embedmentFt'] },
    },
  ],
  invalid: [
    {
      name: 'the brand says 5 ft',
      line: { values: { ...values, brandHeightFt: 5 } },
      expected: [
        { measured: 1, limit: 0.5, margin: -0.5, unit: 'ft', params: { impliedFt: 5, embedmentFt: 6 } },
      ],
    },
    {
      name: 'the brand says 7.25 ft',
      line: { values: { ...values, brandHeightFt: 2.75 } },
      expected: [{ measured: 1.25, limit: 0.5, margin: -0.75 }],
    },
    {
      name: 'brand not measured',
      line: { values: { ...values, brandHeightFt: null } },
      expected: [{ unproved: 'brandHeightFt' }],
    },
  ],
});
