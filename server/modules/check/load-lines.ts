import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { kindKey, lineKey } from '#shared/records/structure-key.ts';
import type { Kind } from '#shared/records/types.ts';
import type { LineState } from '#shared/review/states.ts';

export type KnownLines = {
  /** Line key (`kind|STRUCTURE|occurrence`) by id. */
  readonly keyById: ReadonlyMap<string, string>;
  /** `kind|STRUCTURE` of lines that stand from an earlier revision: approved, held or on record. */
  readonly standing: ReadonlySet<string>;
  readonly returned: ReadonlySet<string>;
};

export type LineRow = {
  id: string;
  kind: Kind;
  structure_number: string;
  occurrence: number;
  state: LineState;
};

export function loadLines(em: EntityManager, batchId: string): Promise<LineRow[]> {
  return rows<LineRow>(
    em,
    'select id, kind, structure_number, occurrence, state from lines where batch_id = $1',
    [batchId],
  );
}

export function knownLines(lines: readonly LineRow[]): KnownLines {
  const keysIn = (...states: LineState[]) =>
    new Set(
      lines.flatMap((line) =>
        states.includes(line.state) ? [kindKey(line.kind, line.structure_number)] : [],
      ),
    );
  return {
    keyById: new Map(
      lines.map((line) => [line.id, lineKey(line.kind, line.structure_number, line.occurrence)]),
    ),
    standing: keysIn('approved', 'held', 'on-record'),
    returned: keysIn('returned'),
  };
}
