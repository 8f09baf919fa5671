import type { Unreadable } from '#shared/workbook/cells/reading.ts';
import { say } from './say.ts';
import type { Params } from './types.ts';

/** Why a cell could not be read, as the end of a sentence. */
const BECAUSE: Readonly<Record<Unreadable, string>> = {
  number: 'which is no number',
  length: 'which is no length',
  clock: 'which is no date and time',
  day: 'which is no date',
  degrees: 'which is no angle in degrees',
  temperature: 'which is no temperature',
  separators: 'whose points and commas make no number (a point parts decimals, a comma thousands)',
  fraction: 'which holds no proper fraction',
  whole: 'which is not a whole number',
  boolean: 'which is TRUE or FALSE and no reading',
  'date-for-number': 'of which the spreadsheet has made a date; a number is expected',
  'date-for-text': 'of which the spreadsheet has made a date; a text is expected',
  'time-only': 'which is a time without its date',
  'day-only': 'which is a date without its time',
  'no-such-day': 'which is a day that no calendar has',
  inches: 'where 12 inches or more stand beside feet',
  hemisphere: 'whose N, S, E or W contradicts the column or the sign',
  'digits-lost': 'a number so long that the spreadsheet has lost its last digits',
  word: 'a word that this column does not take',
};

const isKnown = (why: unknown): why is Unreadable => typeof why === 'string' && Object.hasOwn(BECAUSE, why);

export const unreadableBecause = ({ why, word }: Params): string => {
  if (!isKnown(why)) return 'which cannot be read for what is expected there';
  return why === 'word' && word !== undefined ? `and "${say(word, null)}" is ${BECAUSE.word}` : BECAUSE[why];
};
