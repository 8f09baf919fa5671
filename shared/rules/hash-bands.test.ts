import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bandsOf, bitsApart, hashBits } from './hash-bands.ts';

describe('hashBits', () => {
  it('is 64 bits of 16 digits', () => {
    expect(hashBits('f00000000000000A')).toBe(`1111${'0'.repeat(56)}1010`);
  });
  it.each(['', 'f0', 'g000000000000000', null])('is null for %j', (text) => {
    expect(hashBits(text)).toBeNull();
  });
});

describe('bitsApart', () => {
  it('counts', () => {
    expect(bitsApart(hashBits('ffffffffffffffff') ?? '', hashBits('fffffffffffffff0') ?? '')).toBe(4);
  });
});

describe('bandsOf', () => {
  it('covers the hash', () => {
    expect(bandsOf('01'.repeat(32), 6)).toHaveLength(7);
    expect(
      bandsOf('01'.repeat(32), 6)
        .map((band) => band.split('|')[1])
        .join(''),
    ).toBe('01'.repeat(32));
  });
  it('two hashes so near share a piece', () => {
    const bit = fc.constantFrom('0', '1');
    const hash = fc.array(bit, { minLength: 64, maxLength: 64 });
    fc.assert(
      fc.property(hash, fc.uniqueArray(fc.nat(63), { maxLength: 6 }), (bits, flips) => {
        const other = bits.map((one, n) => (flips.includes(n) ? (one === '0' ? '1' : '0') : one));
        const bands = new Set(bandsOf(bits.join(''), 6));
        expect(bandsOf(other.join(''), 6).some((band) => bands.has(band))).toBe(true);
      }),
    );
  });
});
