import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  field,
  FEET,
  INCHES,
  LEAN,
  KIT,
  COUNT,
  TEMPERATURE,
  textCell,
  SYSTEM,
  read,
} from './cells-for-tests.ts';
import { readCell } from './read-cell.ts';

describe('properties', () => {
  const halfInches = fc.integer({ min: 0, max: 480 });
  it('reads back feet and inches however they are written', () => {
    fc.assert(
      fc.property(
        halfInches,
        fc.constantFrom(`'`, ' ft', ' feet', '’'),
        fc.constantFrom('"', ' in', '”', ''),
        (halves, ft, inch) => {
          const feet = Math.floor(halves / 24);
          const inches = (halves % 24) / 2;
          const written = `${feet}${ft} ${Math.floor(inches)}${inches % 1 === 0 ? '' : ' 1/2'}${inch}`;
          expect(read(written, FEET)).toBeCloseTo(halves / 24, 12);
        },
      ),
    );
  });

  it('reads back numbers with thousands commas, units and blanks', () => {
    const parts = fc.tuple(fc.integer({ min: -999_999, max: 999_999 }), fc.integer({ min: 0, max: 99 }));
    fc.assert(
      fc.property(parts, fc.constantFrom('', ' in', '"', '\u00a0'), ([whole, cents], unit) => {
        const number = Number(`${whole}.${String(cents).padStart(2, '0')}`);
        const written = number.toLocaleString('en-US', { minimumFractionDigits: 2 }) + unit;
        expect(read(written, INCHES)).toBe(number === 0 ? 0 : number);
      }),
    );
  });

  it('reads back wall-clock times in every form of the guide', () => {
    const minutes = fc.integer({ min: 0, max: 1439 });
    fc.assert(
      fc.property(
        minutes,
        fc.integer({ min: 1, max: 28 }),
        fc.integer({ min: 1, max: 12 }),
        (minute, date, month) => {
          const two = (n: number): string => String(n).padStart(2, '0');
          const [hour, rest] = [Math.floor(minute / 60), two(minute % 60)];
          const wall = `2026-${two(month)}-${two(date)}T${two(hour)}:${rest}`;
          const half = `${hour % 12 === 0 ? 12 : hour % 12}:${rest} ${hour < 12 ? 'AM' : 'PM'}`;
          expect(read(`2026-${two(month)}-${two(date)} ${hour}:${rest}`, field('clock'))).toBe(wall);
          expect(read(`${month}/${date}/2026 ${half}`, field('clock'))).toBe(wall);
        },
      ),
    );
  });

  const readers = [
    FEET,
    INCHES,
    LEAN,
    KIT,
    COUNT,
    TEMPERATURE,
    field('degrees'),
    field('clock'),
    field('day'),
  ];
  it('never makes a number of a text without a digit, and never throws', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme' }), fc.constantFrom(...readers), (raw, as) => {
        const reading = readCell(textCell(raw), as, SYSTEM);
        const number = 'value' in reading && reading.value !== null;
        expect(number && !/[\p{N}]/u.test(raw)).toBe(false);
      }),
    );
  });

  it('keeps the digits: a number read from junk around digits holds what the text says', () => {
    // A letter that belongs to no unit, anywhere in the text, is never read over.
    const letters = fc.constantFrom('x', 'q', '?', '~', 'k', '*', '€', '|');
    fc.assert(
      fc.property(
        fc.string(),
        letters,
        fc.string(),
        fc.constantFrom(...readers),
        (before, letter, after, as) => {
          const reading = readCell(textCell(`${before}1${letter}2${after}`), as, SYSTEM);
          expect('problem' in reading).toBe(true);
        },
      ),
    );
  });
});
