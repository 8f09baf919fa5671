import { cleanMeasure } from './clean-text.ts';
import { parseNumber } from './parse-number.ts';
import { readQuantity } from './read-quantity.ts';
import { type Reading, unreadable, value, wrongUnit } from './reading.ts';

/** `5' 10"`, `5 ft 9 1/2 in`, `6'-6"`, `5' 10`: feet, then inches; groups: sign, feet, inches. */
const FEET_INCHES =
  /^([+-]?) ?([\d.,]+) ?(?:'|ft\.?|feet|foot)[ ,-]*(\d[\d.,/ -]*?) ?(?:"|in\.?|ins\.?|inch|inches)?$/;

function readFeetInches(match: RegExpExecArray): Reading {
  const [, sign, feetText = '', inchText = ''] = match;
  const feet = parseNumber(feetText);
  const inches = parseNumber(inchText);
  if ('fault' in feet) return unreadable(feet.fault);
  if ('fault' in inches) return unreadable(inches.fault);
  // 5.5' 6" says two things about the half foot; 5' 14" is a slip of some kind.
  // 1'000 is somebody's thousand.
  if (!Number.isInteger(feet.number) || /^\d{3}/.test(inchText)) return unreadable('length');
  if (inches.number >= 12) return unreadable('inches');
  const total = feet.number + inches.number / 12;
  return value(sign === '-' && total !== 0 ? -total : total);
}

/** A length written in a column in feet, in feet. */
export function readLengthFt(text: string): Reading {
  const match = FEET_INCHES.exec(cleanMeasure(text));
  return match ? readFeetInches(match) : asLength(readQuantity(text, 'ft'));
}

/** A length written in a column in inches (or inches per 10 ft, per ft). Feet in such a column are a wrong unit, whatever follows them. */
export function readLengthIn(text: string, unit: string): Reading {
  if (FEET_INCHES.test(cleanMeasure(text))) return wrongUnit('ft', unit);
  return asLength(readQuantity(text, unit));
}

/** What is no number here is no length. */
function asLength(reading: Reading): Reading {
  return 'problem' in reading && reading.problem.params['why'] === 'number' ? unreadable('length') : reading;
}
