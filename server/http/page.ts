import type { JsonSchema } from '#server/http/define-route.ts';
import { problem, type Problem } from '#server/http/problem.ts';

export type Page<T> = { items: T[]; nextCursor: string | null; total: number | null };
export type PageQuery = { limit?: number; cursor?: string };

/** Spread into a list route's `query`. */
export const PAGE_QUERY: Readonly<Record<string, JsonSchema>> = {
  limit: { type: 'integer', minimum: 1, maximum: 200, description: 'Rows in this page; 50 when not given.' },
  cursor: { type: 'string', minLength: 1, maxLength: 1000, description: '`nextCursor` of the page before.' },
};

export function pageSchema(items: JsonSchema): JsonSchema {
  return {
    type: 'object',
    properties: {
      items: { type: 'array', items },
      nextCursor: { type: ['string', 'null'] },
      total: { type: ['integer', 'null'] },
    },
    required: ['items', 'nextCursor', 'total'],
  };
}

/** A value of the sort key of the last row of a page; the id comes last so that no two rows are alike. */
export type CursorPart = string | number | null;
export type CursorType = 'string' | 'number' | 'instant' | 'uuid' | 'day';

const FITS: Readonly<Record<CursorType, (part: unknown) => boolean>> = {
  string: (part) => typeof part === 'string' && part.length <= 300 && !part.includes('\0'),
  // The place of a row in its list; what is no whole number the database would not take as one.
  number: (part) => typeof part === 'number' && Number.isSafeInteger(part) && part >= 0,
  instant: (part) => typeof part === 'string' && isInstant(part),
  uuid: (part) => typeof part === 'string' && /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i.test(part),
  day: (part) =>
    typeof part === 'string' && /^\d{4}-\d{2}-\d{2}$/.test(part) && isInstant(`${part}T00:00:00Z`),
};

function isInstant(text: string): boolean {
  return (
    /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}:\d{2}(\.\d{1,6})?(Z|[+-]\d{2}:\d{2})$/.test(text) &&
    !Number.isNaN(Date.parse(text))
  );
}

export function encodeCursor(parts: readonly CursorPart[]): string {
  return Buffer.from(JSON.stringify(parts)).toString('base64url');
}

/** A problem that names one query parameter. */
export function badQuery(field: string, detail: string): Problem {
  return problem(400, 'request.invalid', `The parameter “${field}” cannot be used: ${detail}`, {
    errors: [{ pointer: `#/query/${field}`, code: `${field}.invalid`, detail }],
  });
}

/**
 * Reads a cursor against the types of the sort key; a part may be null where the type ends in `?`.
 * @throws Problem 400 naming `cursor` for anything that this list did not hand out
 */
export function decodeCursor(
  cursor: string,
  types: readonly (CursorType | `${CursorType}?`)[],
): CursorPart[] {
  let parts: unknown;
  try {
    parts = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'));
  } catch {
    parts = null;
  }
  const fits =
    Array.isArray(parts) &&
    parts.length === types.length &&
    types.every((type, index) => {
      const part: unknown = (parts as unknown[])[index];
      if (part === null) return type.endsWith('?');
      return FITS[type.replace('?', '') as CursorType](part);
    });
  if (!fits) throw badQuery('cursor', 'it was not given out by this list. Start again from the first page.');
  return parts as CursorPart[];
}

/** @throws Problem 400 naming `cursor` */
export function parsePage(
  query: PageQuery,
  types: readonly (CursorType | `${CursorType}?`)[],
): { limit: number; after: CursorPart[] | null } {
  return { limit: query.limit ?? 50, after: query.cursor ? decodeCursor(query.cursor, types) : null };
}

/**
 * Makes a page of rows fetched with `limit + 1`, so that the last page is known without a second query.
 * `key` gives the sort key of a row.
 */
export function toPage<Row, Item>(options: {
  rows: readonly Row[];
  limit: number;
  total?: number | null;
  key: (row: Row) => readonly CursorPart[];
  item: (row: Row) => Item;
}): Page<Item> {
  const { rows, limit, key, item, total = null } = options;
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  return {
    items: shown.map(item),
    nextCursor: rows.length > limit && last !== undefined ? encodeCursor(key(last)) : null,
    total,
  };
}
