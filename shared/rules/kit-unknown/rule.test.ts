import { describeRule } from '../describe-rule.ts';
import { pourOf } from '../testing.ts';
import { kitUnknown } from './rule.ts';

// EP-15's kits: 1.5, 2.5, 4, 6, 8 ft³ (demo).
describeRule(kitUnknown, {
  valid: [
    { name: 'a kit of the product', line: { pours: [pourOf({ kitFt3: 2.5 })] } },
    { name: 'the product in small letters', line: { pours: [pourOf({ product: 'ep-15' })] } },
    { name: 'product unreadable', line: { pours: [pourOf({ product: null }, ['product'])] } },
    { name: 'kit unreadable', line: { pours: [pourOf({ kitFt3: null }, ['kitFt3'])] } },
  ],
  invalid: [
    {
      name: 'a size the product lacks',
      line: { pours: [pourOf({ kitFt3: 5 })] },
      expected: [{ measured: 5, limit: '1.5, 2.5, 4, 6, 8', margin: null, unit: 'ft3' }],
    },
    {
      name: 'a product the owner lacks',
      line: { pours: [pourOf({ product: 'XX-1' })] },
      expected: [{ field: 'product', measured: 'XX-1', limit: 'EP-15', margin: null }],
    },
  ],
});
