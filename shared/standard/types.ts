import type { Product, Standard } from '#shared/generated/records.ts';

export type { Product, Standard };

/** Code of a rule that the standard switches and sets. */
export type RuleCode = keyof Standard['rules'];

/** One rule's entry, whatever its parameters. */
export type RuleSetting = {
  readonly on: boolean;
  readonly severity: 'nonconformity' | 'query' | 'note';
  readonly params: Readonly<Record<string, number>>;
};
