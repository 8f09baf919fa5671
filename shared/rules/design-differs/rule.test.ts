import { describeRule } from '../describe-rule.ts';
import { designDiffers } from './rule.ts';

const design = {
  structureNumber: 'S-1',
  kind: 'set' as const,
  poleLengthFt: 40,
  poleClass: 'H1',
  poleMaterial: 'southern-pine',
  embedmentFt: null,
  latitude: null,
  longitude: null,
};
const context = { design: [design] };
const values = { poleLengthFt: 40, poleClass: 'H1', poleMaterial: 'southern-pine' };

describeRule(designDiffers, {
  valid: [
    { name: 'as designed', line: { values }, context },
    {
      name: 'a length that differs in its last binary digits alone',
      line: { values: { ...values, poleLengthFt: 40.0000000005 } },
      context,
    },
    {
      name: 'class in small letters on the order',
      line: { values },
      context: { design: [{ ...design, poleClass: 'h1' }] },
    },
    {
      name: 'the design leaves it open',
      line: { values: { ...values, poleLengthFt: 45 } },
      context: { design: [{ ...design, poleLengthFt: null }] },
    },
    {
      name: 'not on the order',
      line: { structureNumber: 'S-2', values: { ...values, poleLengthFt: 45 } },
      context,
    },
    { name: 'length unreadable', line: { values: { ...values, poleLengthFt: null } }, context },
  ],
  invalid: [
    {
      name: 'a longer pole',
      line: { values: { ...values, poleLengthFt: 45 } },
      context,
      expected: [{ field: 'poleLengthFt', measured: 45, limit: 40, margin: -5, unit: 'ft' }],
    },
    {
      name: 'another class and material',
      line: { values: { ...values, poleClass: '2', poleMaterial: 'douglas-fir' } },
      context,
      expected: [
        { field: 'poleClass', measured: '2', limit: 'H1', margin: null },
        { field: 'poleMaterial', measured: 'douglas-fir', limit: 'southern-pine', margin: null },
      ],
    },
  ],
});
