import { RULES } from '#shared/rules/registry.ts';

/** Rules by their title, for filters. */
export const RULE_OPTIONS: readonly { readonly value: string; readonly label: string }[] = RULES.map(
  ({ code, title }) => ({ value: code, label: title }),
).toSorted((a, b) => a.label.localeCompare(b.label, 'en'));

export const KIND_OPTIONS = [
  { value: 'set', label: 'set' },
  { value: 'straighten', label: 'straighten' },
  { value: 'relevel', label: 're-level' },
] as const;

/** `relevel` -> `re-level`. */
export function kindWord(kind: string): string {
  return KIND_OPTIONS.find((one) => one.value === kind)?.label ?? kind;
}
