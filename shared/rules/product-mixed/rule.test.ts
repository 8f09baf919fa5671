import { describeRule } from '../describe-rule.ts';
import { pourOf } from '../testing.ts';
import { productMixed } from './rule.ts';

describeRule(productMixed, {
  valid: [
    { name: 'one product, two lots', line: { pours: [pourOf(), pourOf({ lot: 'L-2' })] } },
    { name: 'one product in small letters', line: { pours: [pourOf(), pourOf({ product: 'ep-15 ' })] } },
    { name: 'a product unreadable', line: { pours: [pourOf(), pourOf({ product: null }, ['product'])] } },
    { name: 'no pours', line: {} },
  ],
  invalid: [
    {
      name: 'two products',
      line: { pours: [pourOf(), pourOf({ product: 'EP-20' })] },
      expected: [
        { measured: 2, limit: 1, margin: -1, unit: 'count', params: { products: ['EP-15', 'EP-20'] } },
      ],
    },
    {
      name: 'another product in a later event',
      line: { pours: [pourOf(), pourOf({ product: 'EP-20', event: 2 })] },
      expected: [{ measured: 2 }],
    },
  ],
});
