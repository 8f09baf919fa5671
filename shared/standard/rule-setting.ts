import type { RuleSetting, Standard } from './types.ts';

/** A rule's entry in a standard; null for a code that the standard does not know. */
export function ruleSetting(standard: Standard, code: string): RuleSetting | null {
  const rules: Readonly<Record<string, RuleSetting>> = standard.rules;
  return Object.hasOwn(rules, code) ? (rules[code] ?? null) : null;
}
