import type { Comparison } from './find-comparisons.ts';

type Edit = { readonly at: number; readonly remove: number; readonly insert: string };

const editsOf = (comparison: Comparison, id: number): readonly Edit[] => {
  const { start, end, from, operatorAt } = comparison;
  if (operatorAt === null) return [{ at: start, remove: end - start, insert: `__named(${id}, ${from})` }];
  return [
    { at: start, remove: 0, insert: `__compare(${id}, ` },
    { at: operatorAt, remove: from.length, insert: ',' },
    { at: end, remove: 0, insert: ')' },
  ];
};

/**
 * The source with each comparison made a call that knows its number, so that one bundle holds all mutants and a switch
 * chooses. `comparisons` in the order of `findComparisons`, numbered from `firstId`.
 */
export function instrument(source: string, comparisons: readonly Comparison[], firstId: number): string {
  const edits = comparisons
    .flatMap((comparison, index) => editsOf(comparison, firstId + index))
    .map((edit, order) => ({ ...edit, order }))
    .toSorted((a, b) => a.at - b.at || a.order - b.order);
  let out = '';
  let at = 0;
  for (const edit of edits) {
    out += source.slice(at, edit.at) + edit.insert;
    at = edit.at + edit.remove;
  }
  return out + source.slice(at);
}
