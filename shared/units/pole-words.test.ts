import { expect, it } from 'vitest';
import { poleWords } from './pole-words.ts';

// 1 ft = 0.3048 m exactly (international foot): 40 ft = 12.192 m, 37.5 ft = 11.43 m.
it('gives the length in metres and leaves the class', () => {
  expect(poleWords('40 ft class 4, southern pine', { metric: true })).toBe('12.2 m class 4, southern pine');
  expect(poleWords('37.5 ft other, steel', { metric: true })).toBe('11.4 m other, steel');
});

it('leaves a pole without a length, and feet, as they are', () => {
  expect(poleWords('class 4', { metric: true })).toBe('class 4');
  expect(poleWords('40 ft class 4', { metric: false })).toBe('40 ft class 4');
});
