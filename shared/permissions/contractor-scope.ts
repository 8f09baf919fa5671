import type { Ability, Action, SubjectName } from './ability.ts';

/** Whose rows of a subject a person may touch: one contractor's, or everybody's (`contractorId` null). */
export type ContractorScope = { readonly contractorId: string | null };

/**
 * The wall between contractors as a value for SQL, taken from the ability itself: lists are filtered by what the
 * rules say. Null: not allowed at all. Throws on a condition that is not plain equality on `contractorId`.
 */
export function contractorScope(ability: Ability, action: Action, name: SubjectName): ContractorScope | null {
  const rules = ability.rulesFor(action, name).filter((rule) => !rule.inverted);
  if (rules.length === 0) return null;
  if (rules.some((rule) => rule.conditions === undefined)) return { contractorId: null };
  const ids = new Set(rules.map((rule) => idOf(rule.conditions)));
  const [id] = ids;
  if (ids.size !== 1 || id === undefined)
    throw new Error(`The rules on ${name} cannot be written as one contractor.`);
  return { contractorId: id };
}

function idOf(conditions: unknown): string {
  const entries = Object.entries(conditions as object);
  const [first] = entries;
  if (entries.length !== 1 || first?.[0] !== 'contractorId' || typeof first[1] !== 'string')
    throw new Error('A condition is not plain equality on contractorId.');
  return first[1];
}
