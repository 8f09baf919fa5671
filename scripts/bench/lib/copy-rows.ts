import { spawn } from 'node:child_process';
import { once } from 'node:events';
import path from 'node:path';
import { findPostgres } from '#scripts/lib/find-postgres.mjs';

export type CopyValue = string | number | boolean | null;

/** A value as PostgreSQL's text format has it. */
function copyText(value: CopyValue): string {
  if (value === null) return String.raw`\N`;
  return String(value).replaceAll(/[\\\t\n\r]/g, (sign) => ESCAPES[sign] ?? sign);
}
const ESCAPES: Readonly<Record<string, string>> = { '\\': '\\\\', '\t': '\\t', '\n': '\\n', '\r': '\\r' };

/**
 * Fills a table by COPY through psql. Triggers and foreign keys rest meanwhile: the rows of a bench are right by how they
 * are made. `url` signs in as a superuser.
 */
export async function copyRows(
  url: string,
  target: { readonly table: string; readonly columns: readonly string[] },
  rows: Iterable<readonly CopyValue[]>,
): Promise<void> {
  const psql = path.join(findPostgres() ?? '', 'psql');
  const child = spawn(psql, [
    url,
    '-q',
    '-v',
    'ON_ERROR_STOP=1',
    '-c',
    'set session_replication_role = replica',
    '-c',
    `copy ${target.table} (${target.columns.join(', ')}) from stdin`,
  ]);
  let said = '';
  child.stderr.on('data', (part: Buffer) => (said += part.toString()));
  const ended = once(child, 'close');
  let part = '';
  for (const row of rows) {
    part += `${row.map(copyText).join('\t')}\n`;
    if (part.length < 1 << 20) continue;
    if (!child.stdin.write(part)) await Promise.race([once(child.stdin, 'drain'), ended]);
    part = '';
  }
  child.stdin.end(part);
  const [code] = (await ended) as [number];
  if (code !== 0) throw new Error(`COPY into ${target.table} failed: ${said}`);
}
