import type { Cell } from '#shared/workbook/types.ts';
import { trimText } from './clean-text.ts';
import { readClock, readDay } from './read-clock.ts';
import { readDegrees } from './read-degrees.ts';
import { readLengthFt, readLengthIn } from './read-length.ts';
import { readQuantity } from './read-quantity.ts';
import { MISSING_WORDS, numberAsText, readCode, readText, wordOf } from './read-words.ts';
import { type ReadField, type Reading, unreadable, value } from './reading.ts';

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
    case 'number':
    case 'integer':
      return whole(field, readQuantity(cell.raw, field.unit));
    case 'code':
      return readCode(cell.raw, field.allowed ?? []);
    default:
      return readText(cell.raw);
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
  const word = wordOf(cell.raw, field.words);
  if (word !== null) return value(word);
  const missing = field.read === 'text' ? null : wordOf(cell.raw, MISSING_WORDS);
  if (missing !== null) return unreadable('word', { word: missing });
  return readTextCell(cell, field, date1904);
}
