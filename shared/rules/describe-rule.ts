import { describe, expect, it } from 'vitest';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import { ruleSetting } from '#shared/standard/rule-setting.ts';
import { lineOf, type PartialLine } from './testing.ts';
import type { CheckContext, FindingDraft, LineRule } from './types.ts';

type Case = {
  readonly name: string;
  readonly line: PartialLine;
  readonly context?: Partial<CheckContext>;
  readonly params?: Readonly<Record<string, number>>;
};
type Expected = Partial<Omit<FindingDraft, 'source' | 'params'>> & {
  readonly params?: Readonly<Record<string, unknown>>;
};
type Invalid = Case & {
  readonly expected: readonly Expected[];
  /** Decimals to which numbers must agree; 9 unless said. */
  readonly digits?: number;
};

const run = (rule: LineRule, { line, context, params }: Case): readonly FindingDraft[] =>
  rule.check(lineOf(line), params ?? ruleSetting(DEMO_STANDARD, rule.code)?.params ?? {}, {
    ...DEMO_CONTEXT,
    ...context,
  });

const near = (value: unknown, digits: number): unknown =>
  typeof value === 'number' ? (expect.closeTo(value, digits) as unknown) : value;

/** Lines that meet the rule, and lines that do not with what is expected of their findings, in order. */
export const describeRule = (
  rule: LineRule,
  { valid, invalid }: { readonly valid: readonly Case[]; readonly invalid: readonly Invalid[] },
): void => {
  describe(`rule ${rule.code}`, () => {
    it.each(valid)('meets: $name', (one) => {
      expect(run(rule, one)).toEqual([]);
    });
    it.each(invalid)('finds: $name', (one) => {
      const drafts = run(rule, one);
      expect(drafts).toHaveLength(one.expected.length);
      one.expected.forEach((expected, index) => {
        const wanted = Object.fromEntries(
          Object.entries(expected).map(([key, value]) => [key, near(value, one.digits ?? 9)]),
        );
        expect(drafts[index]).toMatchObject(wanted);
      });
    });
  });
};
