import type { Cell } from '#shared/workbook/types.ts';
import { trimText } from './clean-text.ts';
import { readClock, readDay } from './read-clock.ts';
import { readDegrees } from './read-degrees.ts';
import { readLengthFt, readLengthIn } from './read-length.ts';
import { readQuantity } from './read-quantity.ts';
import { MISSING_WORDS, numberAsText, readCode, readText, wordOf } from './read-words.ts';
import { type ReadField, type Reading, type Unreadable, unreadable, value } from './reading.ts';

const isTime = (field: ReadField): boolean => field.read === 'clock' || field.read === 'day';
const isWritten = (field: ReadField): boolean => field.read === 'text' || field.read === 'code';

function whole(field: ReadField, reading: Reading): Reading {
  if (field.read !== 'integer' || 'problem' in reading) return reading;
  return Number.isInteger(reading.value) ? reading : unreadable('whole');
}

function readNumberCell(cell: Cell, field: ReadField, date1904: boolean): Reading {
  if (field.read === 'clock') return readClock(cell, date1904);
  if (field.read === 'day') return readDay(cell, date1904);
  const number = cell.number ?? Number.NaN;
  // Typing 1/2 or 3-14 into an ordinary cell makes a date of it: what was meant is gone.
  if (cell.dateFormat === true) return unreadable(isWritten(field) ? 'date-for-text' : 'date-for-number');
  if (!isWritten(field)) return whole(field, value(number));
  const text = numberAsText(number);
  if (field.read === 'text' || 'problem' in text) return text;
  return readCode(String(text.value), field.allowed ?? []);
}

/** No measure, time or code is longer; a stranger's megabyte of text is not worth a pattern's time. */
const LONGEST_MEASURE = 200;

const NO_SUCH: Readonly<Record<string, Unreadable>> = {
  clock: 'clock',
  day: 'day',
  'length-ft': 'length',
  'length-in': 'length',
  degrees: 'degrees',
  'temperature-f': 'temperature',
};

function readTextCell(cell: Cell, field: ReadField, date1904: boolean): Reading {
  switch (field.read) {
    case 'clock':
      return readClock(cell, date1904);
    case 'day':
      return readDay(cell, date1904);
    case 'length-ft':
      return readLengthFt(cell.raw);
    case 'length-in':
      return readLengthIn(cell.raw, field.unit ?? 'in');
    case 'degrees':
      return readDegrees(cell.raw, field.key);
    case 'temperature-f': {
      const reading = readQuantity(cell.raw, field.unit);
      const none = 'problem' in reading && reading.problem.params['why'] === 'number';
      return none ? unreadable('temperature') : reading;
    }
    case 'code':
      return readCode(cell.raw, field.allowed ?? []);
    default:
      return whole(field, readQuantity(cell.raw, field.unit));
  }
}

/** Reads one cell for what it plainly is, or says why not. Never guesses, never throws; a blank cell is a null value. */
export function readCell(
  cell: Cell,
  field: ReadField,
  { date1904 }: { readonly date1904: boolean },
): Reading {
  if (cell.kind === 'error') {
    // Empty: a formula whose result was never stored.
    return {
      problem: { code: 'record-formula', params: { error: cell.raw, formula: cell.formula === true } },
    };
  }
  if (trimText(cell.raw) === '') return value(null);
  if (cell.kind === 'boolean') {
    return field.read === 'text' ? value(cell.raw) : unreadable('boolean');
  }
  if (cell.kind === 'number') return readNumberCell(cell, field, date1904);
  if (cell.kind === 'date' && !isTime(field)) {
    return unreadable(isWritten(field) ? 'date-for-text' : 'date-for-number');
  }
  if (field.read === 'text') return readText(cell.raw);
  if (trimText(cell.raw).length > LONGEST_MEASURE) return unreadable(NO_SUCH[field.read] ?? 'number');
  const word = wordOf(cell.raw, field.words);
  if (word !== null) return value(word);
  const missing = wordOf(cell.raw, MISSING_WORDS);
  if (missing !== null) return unreadable('word', { word: missing });
  return readTextCell(cell, field, date1904);
}
