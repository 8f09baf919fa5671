import type { Scalar } from '#shared/records/types.ts';

export type NumberParam = {
  readonly type: 'number';
  readonly title: string;
  readonly description?: string;
  readonly 'x-unit': string;
  readonly default: number;
  readonly minimum: number;
  readonly maximum: number;
};
type Properties = Readonly<Record<string, NumberParam>>;

/** JSON Schema (2020-12) of a rule's parameters from its properties. */
export const paramsSchema = <P extends Properties>(properties: P) =>
  ({
    $schema: 'https://json-schema.org/draft/2020-12/schema',
    type: 'object',
    additionalProperties: false,
    required: Object.keys(properties),
    properties,
  }) as const;

/** A parameter of the standard's version; the rule's default where the version lacks it or holds something else. */
export const numberOf = (
  params: Readonly<Record<string, Scalar>>,
  schema: { readonly properties: Properties },
  name: string,
): number => {
  const value = params[name];
  if (typeof value === 'number' && Number.isFinite(value)) return value;
  return schema.properties[name]?.default ?? 0;
};
