/**
 * What a member may be: a word, or words between bars (`string|null`); an object with at least these members; a list of
 * one shape, in brackets. More members than are named may be there: shapes may grow and never shrink.
 */
export type Shape = string | { readonly [member: string]: Shape } | readonly [Shape];

const WORDS: Readonly<Record<string, (value: unknown) => boolean>> = {
  string: (value) => typeof value === 'string',
  number: (value) => typeof value === 'number' && Number.isFinite(value),
  int: (value) => Number.isInteger(value),
  boolean: (value) => typeof value === 'boolean',
  object: (value) => typeof value === 'object' && value !== null && !Array.isArray(value),
  list: Array.isArray,
  null: (value) => value === null,
  uuid: (value) => typeof value === 'string' && /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/.test(value),
  sha256: (value) => typeof value === 'string' && /^[0-9a-f]{64}$/.test(value),
  day: (value) => typeof value === 'string' && /^\d{4}-\d\d-\d\d$/.test(value),
};

/** Where a value is not of the shape, each place with what is there; empty when it is. */
export function differences(shape: Shape, value: unknown, at = ''): string[] {
  if (typeof shape === 'string') {
    const fits = shape.split('|').some((word) => (WORDS[word] ?? ((it: unknown) => it === word))(value));
    return fits ? [] : [`${at || '/'} is ${JSON.stringify(value)}, not ${shape}`];
  }
  if (isList(shape)) {
    if (!Array.isArray(value)) return [`${at || '/'} is no list`];
    return value.flatMap((item, index) => differences(shape[0], item, `${at}/${index}`));
  }
  if (typeof value !== 'object' || value === null)
    return [`${at || '/'} is ${JSON.stringify(value)}, no object`];
  return Object.entries(shape).flatMap(([member, inner]) =>
    member in value
      ? differences(inner, (value as Record<string, unknown>)[member], `${at}/${member}`)
      : [`${at}/${member} is missing`],
  );
}

const isList = (shape: Shape): shape is readonly [Shape] => Array.isArray(shape);
