import { describeRule } from '../describe-rule.ts';
import { pourOf } from '../testing.ts';
import { fillShort } from './rule.ts';

const fill = (placedFt3: number, voidFt3: number) => ({
  voidFt3,
  placedFt3,
  fillRatio: placedFt3 / voidFt3,
  fillRatioU: 0.1,
});
const pours = [pourOf()];

describeRule(fillShort, {
  valid: [
    { name: 'full', line: { pours, derived: fill(8, 8) } },
    { name: 'more than full', line: { pours, derived: fill(9.5, 8) } },
    { name: 'no void to fill', line: { pours, derived: { placedFt3: 8, voidFt3: 0 } } },
    { name: 'no pours: another rule says so', line: { derived: { voidFt3: 8 } } },
    { name: 'void not known for a reading with a finding', line: { pours, broken: ['boreTopIn'] } },
  ],
  invalid: [
    {
      name: 'a quarter short',
      line: { pours, derived: fill(6, 8) },
      expected: [
        { field: 'boreDepthFt', measured: 0.75, limit: 1, margin: -0.25, unit: 'ratio', uncertainty: 0.1 },
      ],
    },
    {
      name: 'straighten',
      line: { kind: 'straighten', pours, derived: fill(1.5, 2) },
      expected: [{ field: 'gapAtGradeIn', measured: 0.75, limit: 1, margin: -0.25 }],
    },
    {
      name: 're-level',
      line: { kind: 'relevel', pours, derived: fill(1, 2) },
      expected: [{ field: 'gap1In', measured: 0.5, limit: 1, margin: -0.5 }],
    },
    {
      name: 'a component temperature not measured',
      line: { pours: [pourOf({ componentBTempF: null })], derived: { voidFt3: 8 } },
      expected: [{ unproved: 'componentBTempF' }],
    },
  ],
});
