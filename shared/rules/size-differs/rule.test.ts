import { describeRule } from '../describe-rule.ts';
import { sizeDiffers } from './rule.ts';

// C = π·d: 37.699 in round 12 in.
describeRule(sizeDiffers, {
  valid: [
    { name: 'they agree', line: { values: { girthGroundLineIn: 37.7, diameterGroundLineIn: 12 } } },
    { name: 'a quarter inch apart: 12.2495', line: { values: { girthButtIn: 37.7, diameterButtIn: 12.25 } } },
    {
      // 49/4 = 12.25.
      name: 'exactly a quarter inch apart',
      line: { values: { poleSection: 'square', girthButtIn: 49, diameterButtIn: 12 } },
    },
    { name: 'one of them', line: { values: { girthGroundLineIn: 37.7, diameterButtIn: 20 } } },
    {
      name: 'section unreadable',
      line: { values: { girthGroundLineIn: 37.7, diameterGroundLineIn: 20 }, broken: ['poleSection'] },
    },
    {
      // A square of 12 in across has 48 in round it.
      name: 'a square pole',
      line: { values: { poleSection: 'square', girthGroundLineIn: 48, diameterGroundLineIn: 12 } },
    },
  ],
  invalid: [
    {
      // 40/π = 12.7324.
      name: 'at the ground line',
      line: { values: { girthGroundLineIn: 40, diameterGroundLineIn: 12 } },
      expected: [
        {
          field: 'girthGroundLineIn',
          measured: 0.7323954473516269,
          limit: 0.25,
          margin: -0.48239544735162687,
          unit: 'in',
        },
      ],
    },
    {
      // A square: 52/4 = 13.
      name: 'at the butt, by its own section',
      line: { values: { poleSection: 'square', girthButtIn: 52, diameterButtIn: 12 } },
      expected: [{ field: 'girthButtIn', measured: 1, limit: 0.25, margin: -0.75 }],
    },
  ],
});
