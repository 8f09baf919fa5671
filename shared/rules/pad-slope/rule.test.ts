import { describeRule } from '../describe-rule.ts';
import { padSlope } from './rule.ts';

const kind = 'relevel' as const;
const slopes = (slopeAfterAlongInPerFt: number, slopeAfterAcrossInPerFt: number) => ({
  slopeAfterAlongInPerFt,
  slopeAfterAcrossInPerFt,
});

describeRule(padSlope, {
  valid: [
    { name: 'level', line: { kind, values: slopes(0, 0) } },
    { name: 'at the limit, either way', line: { kind, values: slopes(0.25, -0.25) } },
    {
      name: 'unreadable',
      line: { kind, broken: ['slopeAfterAlongInPerFt', 'slopeAfterAcrossInPerFt'] },
    },
  ],
  invalid: [
    {
      name: 'higher at the front',
      line: { kind, values: slopes(-0.5, 0) },
      expected: [
        { field: 'slopeAfterAlongInPerFt', measured: 0.5, limit: 0.25, margin: -0.25, unit: 'in-per-ft' },
      ],
    },
    {
      name: 'both ways',
      line: { kind, values: slopes(0.375, 0.3125) },
      expected: [
        { field: 'slopeAfterAlongInPerFt', margin: -0.125 },
        { field: 'slopeAfterAcrossInPerFt', margin: -0.0625, params: { way: 'side to side' } },
      ],
    },
  ],
});
