import type { ErrorObject } from 'ajv';

const list = (values: unknown): string => (Array.isArray(values) ? values.join(', ') : String(values));

/** What is wrong there, in words. */
const sentence = ({ keyword, message, params }: ErrorObject): string => {
  if (keyword === 'enum') return `must be one of ${list(params['allowedValues'])}`;
  const extra: unknown = params['additionalProperty'];
  return `${message ?? keyword}${typeof extra === 'string' ? ` (${extra})` : ''}`;
};

/** Every fault that a schema found in a file, each with its place. */
export const schemaFaults = (errors: readonly ErrorObject[] | null | undefined): readonly string[] =>
  (errors ?? []).map((error) => `${error.instancePath.slice(1) || 'the file'}: ${sentence(error)}`);
