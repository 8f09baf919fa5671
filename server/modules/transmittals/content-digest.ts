import { createHash } from 'node:crypto';
import { exportValue } from '#shared/export/export-row.ts';
import type { ContentSheet } from './read-content.ts';

export type ContentSummary = {
  /** SHA-256 over the rows, sheet by sheet: the same content has the same digest, whatever program wrote the file. */
  readonly digest: string;
  /** Rows of each sheet by its name. */
  readonly counts: ReadonlyMap<string, number>;
};

/** Reads the content once through, before the file is written, so that its cover can carry the digest. */
export async function contentDigest(sheets: readonly ContentSheet[]): Promise<ContentSummary> {
  const hash = createHash('sha256');
  const counts = new Map<string, number>();
  for (const sheet of sheets) {
    hash.update(`${JSON.stringify([sheet.name, ...sheet.columns.map((column) => column.key)])}\n`);
    let n = 0;
    for await (const rows of sheet.chunks())
      for (const row of rows) {
        hash.update(
          `${JSON.stringify(sheet.columns.map((column) => exportValue(row, column.key) ?? null))}\n`,
        );
        n += 1;
      }
    counts.set(sheet.name, n);
  }
  return { digest: hash.digest('hex'), counts };
}
