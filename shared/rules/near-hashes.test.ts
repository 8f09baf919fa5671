import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bitsApart, nearHashes, pictureHash, type PictureHash } from './near-hashes.ts';

const hash = (digits: string): PictureHash => pictureHash(digits) ?? { high: 0, low: 0 };

describe('pictureHash', () => {
  it('is two halves of sixteen digits', () => {
    expect(pictureHash('f00000000000000A')).toEqual({ high: 0xf0000000, low: 10 });
  });
  it.each(['', 'f0', 'g000000000000000', '00000000000000000', null])('is null for %j', (text) => {
    expect(pictureHash(text)).toBeNull();
  });
});

describe('bitsApart', () => {
  it.each([
    ['ffffffffffffffff', 'fffffffffffffff0', 4],
    ['ffffffffffffffff', '0000000000000000', 64],
    ['8000000000000001', '0000000000000000', 2],
    ['0123456789abcdef', '0123456789abcdef', 0],
  ])('of %s and %s is %d', (a, b, bits) => {
    expect(bitsApart(hash(a), hash(b))).toBe(bits);
  });
});

describe('two hashes so near', () => {
  const half = fc.integer({ min: 0, max: 0xffffffff });
  const flip = ({ high, low }: PictureHash, at: number): PictureHash =>
    at < 32 ? { high: (high ^ (1 << at)) >>> 0, low } : { high, low: (low ^ (1 << (at - 32))) >>> 0 };

  it('are found, whatever the greatest difference', () => {
    fc.assert(
      fc.property(
        fc.record({ high: half, low: half }),
        fc.uniqueArray(fc.nat(63), { maxLength: 16 }),
        fc.array(fc.record({ high: half, low: half }), { maxLength: 5 }),
        (one, flips, others) => {
          const near = flips.reduce(flip, one);
          const found = new Map<number, number>();
          nearHashes([...others, near], flips.length).eachNear(one, (place, apart) =>
            found.set(place, apart),
          );
          expect(found.get(others.length)).toBe(flips.length);
        },
      ),
      { numRuns: 1000 },
    );
  });

  it('and no others', () => {
    const found: unknown[] = [];
    // Seven bits differ in the second, six in the third.
    const all = ['0000000000000000', '000000000000007f', '000000000000003f', 'ffffffffffffffff'].map(hash);
    nearHashes(all, 6).eachNear(hash('0000000000000000'), (...one) => found.push(one.join(' ')));
    expect(new Set(found)).toEqual(new Set(['0 0', '2 6']));
  });
});
