import pg from 'pg';

const parsers: Readonly<Record<number, (text: string) => unknown>> = {
  // int8: counts and sequence numbers, all far below 2^53.
  20: (text) => {
    const value = Number(text);
    if (!Number.isSafeInteger(value))
      throw new RangeError(`${text} is beyond the whole numbers JavaScript keeps exactly.`);
    return value;
  },
  // date: a calendar day is never an instant.
  1082: (text) => text,
  // timestamptz: the form it has on the wire. Columns keep milliseconds, so a page's cursor finds its row again.
  1184: (text) => new Date(text).toISOString(),
  1700: Number,
};

/** How columns of plain SQL come back: instants as ISO strings in UTC, days as `YYYY-MM-DD`, whole and decimal numbers as numbers, JSON parsed. */
export const VALUE_TYPES: pg.CustomTypesConfig = {
  getTypeParser: ((oid: Parameters<typeof pg.types.getTypeParser>[0], format?: 'text' | 'binary') =>
    parsers[oid] ?? pg.types.getTypeParser(oid, format as 'text')) as pg.CustomTypesConfig['getTypeParser'],
};
