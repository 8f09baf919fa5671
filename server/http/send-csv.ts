import { pipeline } from 'node:stream/promises';
import { Readable } from 'node:stream';
import type { Response } from 'express';
import type { Pool } from 'pg';
import QueryStream from 'pg-query-stream';
import { VALUE_TYPES } from '#server/db/value-types.ts';
import { csvLine, type CsvCell } from '#shared/export/csv.ts';

/** UTF-8 byte order mark: without it the common spreadsheets read the bytes as another encoding. */
const BOM = '\uFEFF';

/** Streams a query as a CSV file, a few hundred rows at a time: memory does not grow with the list. */
export async function sendCsv<Row>(options: {
  pool: Pool;
  res: Response;
  fileName: string;
  sql: string;
  values: readonly unknown[];
  head: readonly string[];
  line: (row: Row) => readonly CsvCell[];
}): Promise<void> {
  const { pool, res, fileName, head, line } = options;
  const client = await pool.connect();
  let failed: Error | undefined;
  try {
    const query = new QueryStream(options.sql, [...options.values], {
      batchSize: 500,
      types: VALUE_TYPES as never,
    });
    const stream = client.query(query);
    res.type('text/csv; charset=utf-8').attachment(fileName);
    const lines = async function* () {
      yield BOM + csvLine(head);
      for await (const row of stream) yield csvLine(line(row as Row));
    };
    await pipeline(Readable.from(lines()), res);
  } catch (error) {
    failed = error as Error;
    // The answer has begun: a broken connection is the only honest end. One that the reader left is no fault.
    if (!res.headersSent) throw error;
  } finally {
    client.release(failed);
  }
}
