import type { ProblemError } from '#server/http/problem.ts';

const DETAIL = 'has a character that cannot be kept (a null character or half of one). Take it out';

/**
 * Texts that neither a column nor JSON of PostgreSQL can hold: with a null character or half a surrogate pair. No form
 * makes them; programs do, and the database would answer with a fault of its own. Pointers into `value`.
 */
export function unstorableText(value: unknown, pointer: string): ProblemError[] {
  if (typeof value === 'string') return isStorable(value) ? [] : [{ pointer, code: 'text', detail: DETAIL }];
  if (typeof value !== 'object' || value === null) return [];
  const found: ProblemError[] = [];
  for (const [name, inner] of Object.entries(value)) {
    if (!isStorable(name)) found.push({ pointer, code: 'text', detail: DETAIL });
    else
      found.push(...unstorableText(inner, `${pointer}/${name.replaceAll('~', '~0').replaceAll('/', '~1')}`));
  }
  return found;
}

function isStorable(text: string): boolean {
  return !/[\0\p{Surrogate}]/u.test(text);
}
