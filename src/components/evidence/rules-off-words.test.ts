import { expect, it } from 'vitest';
import { rulesOffWords } from './rules-off-words.ts';

const rule = (title: string, standards: number[] | null = null) => ({ code: title, title, standards });

it('names the rules that are off, and the versions where only some have them off', () => {
  expect(rulesOffWords([rule('Brand differs')])).toBe('Brand differs');
  expect(rulesOffWords([rule('Brand differs', [1]), rule('Fill short', [1, 2])])).toBe(
    'Brand differs (standard 1 only), Fill short (standard 1 and 2 only)',
  );
});
