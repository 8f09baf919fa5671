import { kindKey } from '#shared/records/structure-key.ts';
import type { DesignFact } from './types.ts';

const made = new WeakMap<readonly DesignFact[], ReadonlyMap<string, DesignFact>>();

/** What the work order plans, by kind and structure; made once for a context, so that a check stays linear in its lines. */
export const designIndex = (design: readonly DesignFact[]): ReadonlyMap<string, DesignFact> => {
  const before = made.get(design);
  if (before) return before;
  const index = new Map(design.map((fact) => [kindKey(fact.kind, fact.structureNumber), fact]));
  made.set(design, index);
  return index;
};
