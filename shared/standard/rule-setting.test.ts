import { expect, test } from 'vitest';
import { DEMO_STANDARD } from './demo.ts';
import { ruleSetting } from './rule-setting.ts';

test('a rule’s entry by code', () => {
  expect(ruleSetting(DEMO_STANDARD, 'hardware-early')).toEqual({
    on: true,
    severity: 'nonconformity',
    params: { waitMin: 15 },
  });
  expect(ruleSetting(DEMO_STANDARD, 'no-such-rule')).toBeNull();
  expect(ruleSetting(DEMO_STANDARD, 'constructor')).toBeNull();
});
