import { expect, it } from 'vitest';
import { poleText } from './pole-text.ts';

it('names a pole as the trade does', () => {
  expect(poleText({ poleLengthFt: 40, poleClass: '4', poleMaterial: 'southern-pine' })).toBe(
    '40 ft class 4, southern pine',
  );
  expect(poleText({ poleLengthFt: 60, poleClass: 'other', poleMaterial: 'steel' })).toBe('60 ft, steel');
  expect(poleText({ poleMaterial: 'jack-pine' })).toBe('jack pine');
  expect(poleText({})).toBeNull();
});
