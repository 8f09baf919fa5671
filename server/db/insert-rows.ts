import type { EntityManager } from '@mikro-orm/postgresql';
import type { QueryResultRow } from 'pg';
import { rows, run } from '#server/db/rows.ts';
import { storableText } from '#server/db/storable-text.ts';

/** Rows of one statement: one JSON document of them stays well under the protocol's limits at this number. */
const CHUNK = 1_000;

/** Rows as one JSON document that PostgreSQL takes; for `insertDocument`. */
export function rowsDocument(list: readonly Readonly<Record<string, unknown>>[]): string {
  const text = JSON.stringify(list);
  if (!/\\u0000|\\ud[89a-f]/i.test(text)) return text;
  return JSON.stringify(list, (_key, part: unknown) =>
    typeof part === 'string' ? storableText(part) : part,
  );
}

function quoted(name: string): string {
  if (!/^[a-z_][a-z0-9_]*$/.test(name)) throw new Error(`"${name}" is not a name of a table or column.`);
  return `"${name}"`;
}

function statement(table: string, columns: readonly string[]): string {
  const names = columns.map(quoted).join(', ');
  return `insert into ${quoted(table)} (${names}) select ${names} from jsonb_populate_recordset(null::${quoted(table)}, $1::jsonb)`;
}

/**
 * Inserts many rows as one JSON parameter a chunk, so that PostgreSQL's limit of 65,535 parameters is never near.
 * Keys are column names; every row has the keys of the first. Columns left out take their defaults.
 */
export async function insertRows(
  em: EntityManager,
  table: string,
  list: readonly Readonly<Record<string, unknown>>[],
): Promise<void> {
  const [first] = list;
  if (first === undefined) return;
  const text = statement(table, Object.keys(first));
  for (let at = 0; at < list.length; at += CHUNK) {
    await run(em, text, [rowsDocument(list.slice(at, at + CHUNK))]);
  }
}

/** Inserts rows that were written as one document elsewhere; as insertRows, in one statement. */
export async function insertDocument(
  em: EntityManager,
  table: string,
  { columns, text }: { readonly columns: readonly string[]; readonly text: string },
): Promise<void> {
  await run(em, statement(table, columns), [text]);
}

/** As insertRows, and gives back the `returning` columns in no promised order. */
export async function insertRowsReturning<T extends QueryResultRow>(
  em: EntityManager,
  options: {
    table: string;
    list: readonly Readonly<Record<string, unknown>>[];
    returning: readonly string[];
  },
): Promise<T[]> {
  const out: T[] = [];
  const [first] = options.list;
  if (first === undefined) return out;
  const text = `${statement(options.table, Object.keys(first))} returning ${options.returning.map(quoted).join(', ')}`;
  for (let at = 0; at < options.list.length; at += CHUNK) {
    out.push(...(await rows<T>(em, text, [rowsDocument(options.list.slice(at, at + CHUNK))])));
  }
  return out;
}
