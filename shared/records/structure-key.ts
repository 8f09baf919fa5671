import type { Kind } from './types.ts';

/** What is its own key, as most structure numbers are: capitals, digits and signs of ASCII, no spaces. */
const PLAIN = /^[!-`{-~]*$/;

/** Structure numbers are the same when they differ only in case and spaces. */
export const structureKey = (structureNumber: unknown): string => {
  if (typeof structureNumber !== 'string' && typeof structureNumber !== 'number') return '';
  const text = String(structureNumber);
  return PLAIN.test(text) ? text : text.normalize('NFKC').replaceAll(/\s+/g, ' ').trim().toUpperCase();
};

/** Key of a structure's line of one kind, occurrence apart. */
export const kindKey = (kind: Kind, structureNumber: unknown): string =>
  `${kind}|${structureKey(structureNumber)}`;

/** Key of a line in its batch; photographs come to the check by it. */
export const lineKey = (kind: Kind, structureNumber: unknown, occurrence: number): string =>
  `${kindKey(kind, structureNumber)}|${occurrence}`;
