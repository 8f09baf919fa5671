import { describeRule } from '../describe-rule.ts';
import { annulusNarrow } from './rule.ts';

describeRule(annulusNarrow, {
  valid: [
    { name: 'two inches', line: { derived: { leastAnnulusIn: 2 } } },
    {
      name: 'taped gap wide enough',
      line: { values: { leastGapIn: 2.5 }, derived: { leastAnnulusIn: 2.5 } },
    },
    { name: 'sizes not known', line: {} },
    { name: 'taped gap unreadable', line: { derived: { leastAnnulusIn: 1 }, broken: ['leastGapIn'] } },
  ],
  invalid: [
    {
      name: 'from the sizes',
      line: { derived: { leastAnnulusIn: 1.5 } },
      expected: [
        { field: 'boreTopIn', measured: 1.5, limit: 2, margin: -0.5, unit: 'in', params: { taped: false } },
      ],
    },
    {
      name: 'taped, where the pole stands off centre',
      line: { values: { leastGapIn: 0.75 }, derived: { leastAnnulusIn: 0.75 } },
      expected: [{ field: 'leastGapIn', measured: 0.75, limit: 2, margin: -1.25, params: { taped: true } }],
    },
    {
      name: 'pole wider than its bore',
      line: { derived: { leastAnnulusIn: -1 } },
      expected: [{ measured: -1, limit: 2, margin: -3 }],
    },
  ],
});
