import type { CheckContext, ContextPart, Rule, StandardInForce } from '#shared/rules/types.ts';
import { ruleSetting } from '#shared/standard/rule-setting.ts';
import type { Skipped } from './types.ts';

const REASON: Readonly<Record<ContextPart, Skipped['reason']>> = {
  asOfMs: 'no-time',
  lots: 'no-lots',
  lotUse: 'no-lot-use',
  design: 'no-design',
  neighbours: 'no-register',
  area: 'no-area',
  register: 'no-register',
  photos: 'no-photos',
  otherPhotos: 'no-photos',
  siblings: 'no-siblings',
  previous: 'no-earlier-check',
};

/** Rules that did not run, or not on all: a part of their context is not known here, or a standard used has them off. */
export const skippedRules = (
  rules: readonly Rule[],
  standards: readonly StandardInForce[],
  context: CheckContext,
): readonly Skipped[] =>
  rules.flatMap((rule): Skipped[] => {
    const lacking = rule.needs.find((part) => context[part] === null);
    if (lacking) return [{ code: rule.code, reason: REASON[lacking] }];
    const off = standards.filter((standard) => ruleSetting(standard.body, rule.code)?.on !== true);
    if (off.length > 0) {
      const inPart = off.length < standards.length;
      const numbers = off.map((standard) => standard.n).toSorted((a, b) => a - b);
      return [{ code: rule.code, reason: 'off', ...(inPart ? { standards: numbers } : {}) }];
    }
    const inPart = rule.needs.some((part) => context.ownOnly?.includes(part));
    return inPart ? [{ code: rule.code, reason: 'own-only' }] : [];
  });
