import { readdirSync, readFileSync } from 'node:fs';
import { Ajv2020, type ErrorObject, type ValidateFunction } from 'ajv/dist/2020.js';
import addFormatsModule from 'ajv-formats';
import type { JsonSchema } from '#server/http/define-route.ts';
import { faultSentence } from '#server/http/fault-sentence.ts';
import type { ProblemError } from '#server/http/problem.ts';
import { unstorableText } from '#server/http/unstorable-text.ts';

const API_SCHEMAS = new URL('../../schemas/api/', import.meta.url);
/** Above this many bytes only the first fault is looked for: `allErrors` on unbounded input is work for a stranger. */
const ALL_ERRORS_BYTES = 64 * 1024;
const MOST_ERRORS = 50;

// The package is CommonJS; under ESM its default export may stand one step deeper.
const addFormats = ('default' in addFormatsModule
  ? addFormatsModule.default
  : addFormatsModule) as unknown as (ajv: Ajv2020) => void;

/** The schemas of `schemas/api` by file name, which is how they refer to one another. */
export function readApiSchemas(): ReadonlyMap<string, JsonSchema> {
  const names = readdirSync(API_SCHEMAS).filter((name) => name.endsWith('.schema.json'));
  return new Map(
    names
      .toSorted()
      .map((name) => [name, JSON.parse(readFileSync(new URL(name, API_SCHEMAS), 'utf8')) as JsonSchema]),
  );
}

function createAjv(
  options: { allErrors: boolean; coerceTypes: boolean },
  schemas: ReadonlyMap<string, JsonSchema>,
) {
  const ajv = new Ajv2020({
    strict: false,
    allErrors: options.allErrors,
    coerceTypes: options.coerceTypes ? 'array' : false,
    messages: true,
  });
  addFormats(ajv);
  for (const [name, schema] of schemas) ajv.addSchema(schema, name);
  return ajv;
}

export type Validator = {
  /** A JSON body: nothing is coerced. Empty when it fits; pointers are into the body. */
  body(schema: JsonSchema): (value: unknown, bytes: number) => ProblemError[];
  /** Parameters of an address: text is turned into what the schema asks for, in place. */
  parameters(schema: JsonSchema): (value: object) => ProblemError[];
};

export function createValidator(schemas: ReadonlyMap<string, JsonSchema>): Validator {
  const every = createAjv({ allErrors: true, coerceTypes: false }, schemas);
  const first = createAjv({ allErrors: false, coerceTypes: false }, schemas);
  const address = createAjv({ allErrors: true, coerceTypes: true }, schemas);
  return {
    body(schema) {
      const small = every.compile(schema);
      const large = first.compile(schema);
      return (value, bytes) => run(bytes <= ALL_ERRORS_BYTES ? small : large, value, '');
    },
    parameters(schema) {
      const validate = address.compile(schema);
      return (value) => run(validate, value, '#/query');
    },
  };
}

function run(validate: ValidateFunction, value: unknown, prefix: string): ProblemError[] {
  if (validate(value)) return unstorableText(value, prefix).slice(0, MOST_ERRORS);
  return (validate.errors ?? []).slice(0, MOST_ERRORS).map((error) => toProblemError(error, prefix));
}

function toProblemError(error: ErrorObject, prefix: string): ProblemError {
  const named =
    error.keyword === 'required'
      ? String(error.params.missingProperty)
      : error.keyword === 'additionalProperties'
        ? String(error.params.additionalProperty)
        : null;
  const pointer =
    named === null
      ? error.instancePath
      : `${error.instancePath}/${named.replaceAll('~', '~0').replaceAll('/', '~1')}`;
  return { pointer: `${prefix}${pointer}`, code: error.keyword, detail: faultSentence(error) };
}
