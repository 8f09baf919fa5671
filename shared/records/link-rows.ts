import type { CleanRow } from './clean-row.ts';
import { structureKey } from './structure-key.ts';
import { KINDS, type Kind } from './types.ts';

/** A line to which rows of other sheets belong. */
export type LinkTarget = {
  readonly kind: Kind;
  readonly structureNumber: string;
  readonly occurrence: number;
};

export type LinkedRows<L extends LinkTarget> = {
  readonly of: ReadonlyMap<L, readonly CleanRow[]>;
  /** Rows whose structure has no line. */
  readonly orphans: readonly CleanRow[];
  /** Rows of a structure on two kinds' sheets that do not say which, with the lines they may belong to. */
  readonly ambiguous: readonly { readonly row: CleanRow; readonly lines: readonly L[] }[];
};

const isKind = (value: unknown): value is Kind => KINDS.some((kind) => kind === value);

/**
 * Links pour and event rows to lines by structure number, and by kind where a structure stands on two sheets. Where
 * one stands twice on a sheet, the first line takes them: counting foam twice would be worse, and `done-twice` says so.
 * Rows without a readable structure number are left out: they have their finding.
 */
export const linkRows = <L extends LinkTarget>(
  rows: readonly CleanRow[],
  lines: readonly L[],
): LinkedRows<L> => {
  const byStructure = new Map<string, Map<Kind, L>>();
  for (const line of lines) {
    const key = structureKey(line.structureNumber);
    if (key === '') continue;
    const kinds = byStructure.get(key) ?? new Map<Kind, L>();
    const held = kinds.get(line.kind);
    if (!held || line.occurrence < held.occurrence) kinds.set(line.kind, line);
    byStructure.set(key, kinds);
  }
  const of = new Map<L, CleanRow[]>();
  const orphans: CleanRow[] = [];
  const ambiguous: { row: CleanRow; lines: readonly L[] }[] = [];
  for (const row of rows) {
    const key = structureKey(row.values['structureNumber']);
    if (key === '') continue;
    const kinds = byStructure.get(key) ?? new Map<Kind, L>();
    const kind = row.values['kind'];
    const candidates = [...kinds.values()];
    const line = isKind(kind) ? kinds.get(kind) : candidates[0];
    if (!line) orphans.push(row);
    else if (!isKind(kind) && candidates.length > 1) ambiguous.push({ row, lines: candidates });
    else {
      const held = of.get(line);
      if (held) held.push(row);
      else of.set(line, [row]);
    }
  }
  return { of, orphans, ambiguous };
};
