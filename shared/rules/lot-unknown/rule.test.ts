import { describeRule } from '../describe-rule.ts';
import { pourOf } from '../testing.ts';
import { lotUnknown } from './rule.ts';

const context = {
  lots: [{ product: 'EP-15', number: 'L-100', expiresOn: null, status: 'in-use' as const }],
};

describeRule(lotUnknown, {
  valid: [
    { name: 'known', line: { pours: [pourOf({ lot: 'L-100' })] }, context },
    { name: 'small letters', line: { pours: [pourOf({ lot: ' l-100' })] }, context },
    { name: 'lot unreadable', line: { pours: [pourOf({ lot: null }, ['lot'])] }, context },
    { name: 'lots not known here', line: { pours: [pourOf({ lot: 'L-999' })] } },
  ],
  invalid: [
    {
      name: 'not one of the lots',
      line: { pours: [pourOf({ lot: 'L-999' })] },
      context,
      expected: [{ measured: 'L-999', limit: null, margin: null, params: { product: 'EP-15' } }],
    },
  ],
});
