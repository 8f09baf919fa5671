import { describe, expect, it } from 'vitest';
import { unstorableText } from './unstorable-text.ts';

const pointers = (value: unknown) => unstorableText(value, '').map((one) => one.pointer);

describe('unstorableText', () => {
  it.each(['plain', 'номер 7', '💩', 'a\u0001b', '\uFFFD'])('leaves %j alone', (text) => {
    expect(pointers({ text })).toEqual([]);
  });

  it('finds null characters and halves of characters wherever they stand', () => {
    expect(pointers({ a: 'x\0', b: [1, null, '\ud800'], c: { 'd/e': '\udc00' } })).toEqual([
      '/a',
      '/b/2',
      '/c/d~1e',
    ]);
    expect(pointers({ a: { 'x\0': 1 } })).toEqual(['/a']);
  });
});
