import { byText } from './canonical.ts';
import { rowContent } from './row-content.ts';
import { kindKey } from './structure-key.ts';
import type { SourceLine } from './types.ts';
import { WORK_TIME } from './work-day.ts';

/**
 * Occurrence of each line: 1 for the first of its structure and kind in the batch. The order is by work time,
 * then by content, never by row, so that moving rows about changes no line's identity.
 */
export const occurrences = (lines: readonly SourceLine[]): ReadonlyMap<SourceLine, number> => {
  const same = new Map<string, SourceLine[]>();
  for (const line of lines) {
    const key = kindKey(line.kind, line.structureNumber);
    const group = same.get(key);
    if (group) group.push(line);
    else same.set(key, [line]);
  }
  const numbers = new Map<SourceLine, number>();
  for (const group of same.values()) {
    if (group.length > 1) {
      const order = new Map(group.map((line) => [line, sortKey(line)]));
      group.sort((a, b) => byText(order.get(a) ?? '', order.get(b) ?? ''));
    }
    group.forEach((line, index) => numbers.set(line, index + 1));
  }
  return numbers;
};

const sortKey = (line: SourceLine): string => {
  const at = line.values[WORK_TIME[line.kind]];
  return `${typeof at === 'string' ? at : '~'} ${rowContent(line)}`;
};
