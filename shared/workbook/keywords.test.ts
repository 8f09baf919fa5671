import fc from 'fast-check';
import { expect, it } from 'vitest';
import { formatKeywords, parseKeywords } from './keywords.ts';

it('reads back what it writes, whatever the work order is called', () => {
  expect(formatKeywords('2', 'WO-7')).toBe('template=2; workOrder=WO-7');
  const name = fc.string({ minLength: 1 }).filter((text) => text === text.trim() && text !== '');
  fc.assert(
    fc.property(name, (workOrder) => {
      expect(parseKeywords(formatKeywords('2', workOrder))).toEqual({ template: '2', workOrder });
    }),
  );
});

it('passes over other words', () => {
  expect(parseKeywords('poles, foam; author=me')).toEqual({ template: null, workOrder: null });
  expect(parseKeywords(null)).toEqual({ template: null, workOrder: null });
  expect(parseKeywords('workOrder=%zz; template=')).toEqual({ template: null, workOrder: '%zz' });
});
