import { randomUUID } from 'node:crypto';
import { storableText } from '#server/db/storable-text.ts';
import type { CheckedRecord } from '#shared/check/types.ts';
import { lineKey, structureKey } from '#shared/records/structure-key.ts';
import type { LineRow } from './load-lines.ts';

export type AssignedLines = {
  /** Rows of `lines` for every record, keys as the columns but for the batch. */
  readonly rows: readonly Readonly<Record<string, unknown>>[];
  /** Line id by line key. */
  readonly ids: ReadonlyMap<string, string>;
};

/** A line is the same over all checks and revisions of its batch: known ones keep their ids, others are given one. */
export function assignLines(records: readonly CheckedRecord[], known: readonly LineRow[]): AssignedLines {
  const ids = new Map(
    known.map((line) => [lineKey(line.kind, line.structure_number, line.occurrence), line.id]),
  );
  const rows = records.map(({ kind, structureNumber, occurrence }) => {
    const written = storableText(structureNumber);
    // Two numbers that differ only in what no database can hold are one line in it.
    const stored = lineKey(kind, written, occurrence);
    const id = ids.get(stored) ?? randomUUID();
    ids.set(stored, id).set(lineKey(kind, structureNumber, occurrence), id);
    return { id, kind, structure_key: structureKey(written), structure_number: written, occurrence };
  });
  return { rows, ids };
}
