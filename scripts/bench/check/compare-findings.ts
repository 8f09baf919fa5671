import type { Structures } from './run-steps.ts';

const RULES = ['fill-short', 'embedment-short'] as const;

/**
 * What both found, in words.
 * @throws when they differ in any structure
 */
export function compareFindings(ours: Structures, theirs: Structures): string {
  const said = RULES.map((rule) => {
    const other = new Set(theirs[rule]);
    const own = new Set(ours[rule]);
    const differ = [...own]
      .filter((each) => !other.has(each))
      .concat([...other].filter((each) => !own.has(each)));
    if (differ.length > 0)
      throw new Error(`${rule} differs on ${differ.length} structures: ${differ.slice(0, 5).join(', ')}`);
    return `${rule} ${own.size}`;
  });
  return `  both find the same: ${said.join(', ')}`;
}
