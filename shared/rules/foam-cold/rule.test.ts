import { describeRule } from '../describe-rule.ts';
import { pourOf } from '../testing.ts';
import { foamCold } from './rule.ts';

// EP-15 allows 40 to 100 °F (demo).
describeRule(foamCold, {
  valid: [
    { name: 'in the band', line: { pours: [pourOf()] } },
    {
      name: 'at its ends',
      line: { pours: [pourOf({ componentATempF: 40, componentBTempF: 100 })] },
    },
    { name: 'no pours', line: {} },
    {
      name: 'unreadable',
      line: { pours: [pourOf({ componentATempF: null }, ['componentATempF'])] },
    },
    {
      name: 'of a product that is not known',
      line: { pours: [pourOf({ product: 'XX-1', componentATempF: 38 })] },
    },
  ],
  invalid: [
    {
      name: 'one component colder',
      line: { pours: [pourOf({ componentBTempF: 38 })] },
      expected: [
        {
          field: 'componentBTempF',
          measured: 38,
          limit: 40,
          margin: -2,
          unit: 'degF',
          params: { component: 'B', pourNumber: 1, product: 'EP-15' },
        },
      ],
    },
    {
      name: 'both',
      line: { pours: [pourOf({ componentATempF: 38, componentBTempF: 38 })] },
      expected: [{ field: 'componentATempF' }, { field: 'componentBTempF' }],
    },
    {
      // 22 °C = 71.6 °F and 23 °C = 73.4 °F, inside the full-yield band of 60 to 90 °F (demo).
      name: 'written in °C: a query',
      line: { pours: [pourOf({ componentATempF: 22, componentBTempF: 23 })] },
      expected: [
        { field: 'componentATempF', severity: 'query', measured: 22 },
        { field: 'componentBTempF', severity: 'query', measured: 23, params: { asCelsius: true } },
      ],
    },
    {
      // 38 °C = 100.4 °F is over the full-yield band: the pour is not plainly in °C.
      name: 'one of two that would be usual in °C stays what it is',
      line: { pours: [pourOf({ componentATempF: 22, componentBTempF: 38 })] },
      expected: [
        { field: 'componentATempF', params: { asCelsius: false } },
        { field: 'componentBTempF', params: { asCelsius: false } },
      ],
    },
    {
      name: 'not measured',
      line: { pours: [pourOf({ componentATempF: null })] },
      expected: [{ unproved: 'componentATempF' }],
    },
  ],
});
