import { say } from './say.ts';
import type { Params } from './types.ts';

/** How each way of reading a cell is put into words. */
const READ: Readonly<Record<string, string>> = {
  text: 'a text',
  'length-ft': `a length in feet, as 5.8 or 5' 10"`,
  'length-in': 'a length in inches, as 18, 18.5 or 18 1/2',
  number: 'a number',
  integer: 'a whole number',
  'temperature-f': 'a temperature in °F',
  degrees: 'degrees as a number',
  clock: 'a date and time, as 2026-04-14 10:24',
  day: 'a date, as 2026-04-14',
};

const WORDS: Readonly<Record<string, string>> = {
  'not-yet': 'not yet',
  'not-by-us': 'not by us',
  'not-measured': 'not measured',
};

const bounds = ({ minimum, maximum, unit }: Params): string => {
  const u = typeof unit === 'string' ? unit : 'count';
  if (typeof minimum === 'number' && typeof maximum === 'number')
    return `, from ${say(minimum, u)} to ${say(maximum, u)}`;
  if (typeof minimum === 'number') return `, at least ${say(minimum, u)}`;
  return typeof maximum === 'number' ? `, at most ${say(maximum, u)}` : '';
};

/** What a cell should hold, as the end of a sentence; empty where nothing is known of it. */
export const expectation = (params: Params): string => {
  const { allowed, words, read } = params;
  const plain =
    Array.isArray(allowed) && allowed.length > 0
      ? `one of: ${allowed.join(', ')}`
      : typeof read === 'string' && Object.hasOwn(READ, read)
        ? `${READ[read]}${bounds(params)}`
        : '';
  const others = Array.isArray(words) ? words.map((word) => `"${WORDS[String(word)] ?? word}"`) : [];
  return [plain, ...others].filter(Boolean).join(', or ');
};
