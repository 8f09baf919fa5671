import schema from '#schemas/standard/v1.schema.json' with { type: 'json' };
import { findingTitle } from '#shared/findings/render.ts';
import type { RuleSetting } from '#shared/standard/types.ts';
import type { Severity } from '#shared/findings/types.ts';

export type RuleLimit = {
  readonly key: string;
  readonly title: string;
  readonly unit: string;
  readonly minimum: number;
  readonly maximum: number;
  readonly value: number;
};
export type RuleRow = {
  readonly code: string;
  readonly title: string;
  readonly severity: Severity;
  readonly on: boolean;
  readonly limits: readonly RuleLimit[];
};

type ParamSchema = {
  readonly title?: string;
  readonly minimum?: number;
  readonly maximum?: number;
  readonly 'x-unit'?: string;
};
type RuleSchema = {
  readonly $ref?: string;
  readonly properties?: {
    readonly params?: { readonly properties?: Readonly<Record<string, ParamSchema>> };
  };
};

const RULE_SCHEMAS = schema.properties.rules.properties as Readonly<Record<string, RuleSchema>>;
const DEFINITIONS = schema.$defs as Readonly<Record<string, unknown>>;

function paramsOf(code: string): Readonly<Record<string, ParamSchema>> {
  const rule = RULE_SCHEMAS[code];
  const found = rule?.$ref ? (DEFINITIONS[rule.$ref.split('/').at(-1) ?? ''] as RuleSchema) : rule;
  return found?.properties?.params?.properties ?? {};
}

const UNKNOWN_TITLE = findingTitle('no-such-rule');

/** The title of a rule; one that the program does not check yet is spelled out from its code. */
export function ruleTitle(code: string): string {
  const title = findingTitle(code);
  if (title !== UNKNOWN_TITLE) return title;
  const words = code.replaceAll('-', ' ');
  return words.charAt(0).toUpperCase() + words.slice(1);
}

const ORDER = new Map(Object.keys(RULE_SCHEMAS).map((code, index) => [code, index]));
const orderOf = (code: string): number => ORDER.get(code) ?? ORDER.size;

/** The rules of a version in the schema's order, which is the trade's (the database keeps none), each with what it compares with. A body of another shape has none. */
export function ruleRows(body: Readonly<Record<string, unknown>>): readonly RuleRow[] {
  const rules = body['rules'];
  if (typeof rules !== 'object' || rules === null) return [];
  const settings = Object.entries(rules as Readonly<Record<string, RuleSetting>>).toSorted(
    ([a], [b]) => orderOf(a) - orderOf(b),
  );
  return settings.map(([code, setting]) => ({
    code,
    title: ruleTitle(code),
    severity: setting.severity,
    on: setting.on,
    limits: Object.entries(paramsOf(code)).flatMap(([key, param]) => {
      const value = setting.params[key];
      if (typeof value !== 'number') return [];
      return {
        key,
        title: param.title ?? key,
        unit: param['x-unit'] ?? '',
        minimum: param.minimum ?? -Infinity,
        maximum: param.maximum ?? Infinity,
        value,
      };
    }),
  }));
}
