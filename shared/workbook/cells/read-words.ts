import { bareWord, trimText } from './clean-text.ts';
import { type Reading, unreadable, value } from './reading.ts';

/** Bare forms of each list of words, made once a list: a batch asks for them a hundred thousand times. */
const bareForms = new WeakMap<readonly string[], ReadonlyMap<string, string>>();

function formsOf(words: readonly string[]): ReadonlyMap<string, string> {
  const held = bareForms.get(words);
  if (held !== undefined) return held;
  const made = new Map(words.map((word) => [bareWord(word), word]));
  bareForms.set(words, made);
  return made;
}

/** The word-code that a text means, as `Not by us` means `not-by-us`; null when it is none of them. */
export function wordOf(text: string, words: readonly string[]): string | null {
  return words.length === 0 ? null : (formsOf(words).get(bareWord(text)) ?? null);
}

/** Words that stand for a missing value somewhere in the workbook, whether or not this column takes them. */
export const MISSING_WORDS = ['not-yet', 'not-by-us', 'not-measured'] as const;

/** One of the column's codes, whatever its case, blanks and hyphens. */
export function readCode(text: string, allowed: readonly string[]): Reading {
  const code = wordOf(text, allowed);
  if (code !== null) return value(code);
  return { problem: { code: 'record-code', params: { found: trimText(text), allowed: allowed.join(', ') } } };
}

/** Text as it stands, without surrounding blanks. */
export function readText(text: string): Reading {
  return value(trimText(text));
}

/** Above this a number in a cell has lost digits: the programs keep fifteen. */
const DIGITS_KEPT = 1e15;

/** The text of a number cell: a structure number typed as figures. */
export function numberAsText(number: number): Reading {
  return Math.abs(number) >= DIGITS_KEPT ? unreadable('digits-lost') : value(String(number));
}
