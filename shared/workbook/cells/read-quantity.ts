import { cleanMeasure } from './clean-text.ts';
import { parseNumber, splitUnit } from './parse-number.ts';
import { type Reading, unreadable, value, wrongUnit } from './reading.ts';
import { unitOfWord } from './unit-words.ts';

/** Units that may stand beside the value in a column of another name without changing it. */
const SAME: Readonly<Record<string, readonly string[]>> = {
  'in-per-10ft': ['in'],
  'in-per-ft': ['in'],
  degF: ['deg'],
};

/** A number as text with its unit, no unit, or a wrong one. `unit` null: a bare number. */
export function readQuantity(text: string, unit: string | null): Reading {
  const { number, unit: word } = splitUnit(cleanMeasure(text));
  if (number === '') return unreadable('number');
  if (word !== '') {
    const found = unitOfWord(word);
    if (found === null) return unreadable('number');
    if (found !== unit && !(SAME[unit ?? ''] ?? []).includes(found)) return wrongUnit(found, unit ?? '');
  }
  const parsed = parseNumber(number);
  return 'number' in parsed ? value(parsed.number) : unreadable(parsed.fault);
}
