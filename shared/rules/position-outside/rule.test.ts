import { describeRule } from '../describe-rule.ts';
import { positionOutside } from './rule.ts';

/** A square degree, corners as [longitude, latitude]. */
const area = [
  [
    [
      [-98, 41],
      [-97, 41],
      [-97, 42],
      [-98, 42],
      [-98, 41],
    ],
  ],
] as const;

describeRule(positionOutside, {
  valid: [
    { name: 'inside', line: { values: { latitude: 41.5, longitude: -97.5 } }, context: { area } },
    { name: 'on its boundary', line: { values: { latitude: 41, longitude: -97.5 } }, context: { area } },
    {
      name: 'the order has no area',
      line: { values: { latitude: 0, longitude: 0 } },
      context: { area: 'none' },
    },
    { name: 'the order is not known here', line: { values: { latitude: 0, longitude: 0 } } },
    { name: 'no position', line: {}, context: { area } },
  ],
  invalid: [
    {
      name: 'a sign forgotten',
      line: { values: { latitude: 41.5, longitude: 97.5 } },
      context: { area },
      expected: [{ measured: '41.5, 97.5', limit: null, margin: null }],
    },
  ],
});
