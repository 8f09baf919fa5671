import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { amountBySize, amountFault, readPlanTexts, sharedTexts, writePlanTexts } from './plan-texts.ts';

describe('a plan in the address', () => {
  it('leads back to what was typed, blank fields too', () => {
    const keys = fc.constantFrom('poleLengthFt', 'boreIn', 'augersIn', 'price-2.5', 'hand-8');
    fc.assert(
      fc.property(fc.dictionary(keys, fc.string({ maxLength: 20 })), (texts) => {
        const search = writePlanTexts(new URLSearchParams(), texts);
        expect(readPlanTexts(new URLSearchParams(search.toString()))).toEqual({ ...texts });
      }),
    );
  });

  it('leaves alone what is not its own', () => {
    const search = writePlanTexts(new URLSearchParams('view=table&boreIn=18&x=1'), { poleLengthFt: '45' });
    expect(search.toString()).toBe('poleLengthFt=45&view=table&x=1');
    expect(readPlanTexts(new URLSearchParams('__proto__=1&price-=2&price-x=3&boreIn=18'))).toEqual({
      boreIn: '18',
    });
  });

  it('keeps a structure’s own design out of a work order', () => {
    expect(
      sharedTexts({ poleLengthFt: '45', boreIn: '18', augersIn: '20', tempF: '60', 'price-8': '90' }),
    ).toEqual({
      augersIn: '20',
      tempF: '60',
      'price-8': '90',
    });
  });
});

it('reads amounts by size, and none where there is none', () => {
  const texts = { 'price-8': '$1,090.50', 'price-4': 'dear', 'hand-8': '12', 'hand-4': '1.5' };
  expect(amountBySize(texts, 'price', 8)).toBe(1090.5);
  expect(amountBySize(texts, 'price', 4)).toBeNull();
  expect(amountFault(texts, 'price', 4)).toBe('“dear” is no price. Write an amount, such as 85.50.');
  expect(amountBySize(texts, 'hand', 8)).toBe(12);
  expect(amountFault(texts, 'hand', 4)).toBe('“1.5” is no count of kits. Write a whole number.');
  expect(amountFault(texts, 'hand', 2.5)).toBeNull();
});
