import type { BatchChanges, RecordRow } from '#shared/generated/api-types.ts';

export const DESK_TABS = ['undecided', 'findings', 'returned', 'changed', 'all'] as const;
export type DeskTab = (typeof DESK_TABS)[number];

const keyOf = ({ kind, structureNumber }: { kind: string; structureNumber: string }) =>
  `${kind}|${structureNumber}`;

/** Lines with a value that differs from the workbook before. */
export function changedKeys(changes: BatchChanges | undefined): ReadonlySet<string> {
  return new Set(changes?.items.map(keyOf));
}

/** Does the line belong under the tab? */
export function isUnder(tab: DeskTab, line: RecordRow, changed: ReadonlySet<string>): boolean {
  switch (tab) {
    case 'undecided':
      return line.state === 'undecided';
    case 'findings':
      return line.counts.nonconformity + line.counts.query > 0;
    case 'returned':
      return line.state === 'returned';
    case 'changed':
      return changed.has(keyOf(line));
    case 'all':
      return true;
  }
}

export function changesOf(changes: BatchChanges | undefined, line: RecordRow): BatchChanges['items'] {
  return changes?.items.filter((item) => keyOf(item) === keyOf(line)) ?? [];
}

/** A line with nothing to decide but the line itself: these can be approved together. */
export function isClean(line: RecordRow): boolean {
  return line.state === 'undecided' && line.counts.nonconformity + line.counts.query === 0;
}

/** A line that waits for the inspector's own word: none of its findings is open. One that was reopened may have findings. */
export function mayApproveLine(line: RecordRow): boolean {
  return (
    line.can.includes('decide') &&
    line.state === 'undecided' &&
    line.decision === null &&
    line.counts.undecided === 0
  );
}

export type DeskCounts = {
  readonly lines: number;
  readonly approved: number;
  readonly returned: number;
  readonly held: number;
  readonly undecided: number;
  readonly clean: number;
};

export function deskCounts(lines: readonly RecordRow[]): DeskCounts {
  const of = (...states: RecordRow['state'][]) => lines.filter((line) => states.includes(line.state)).length;
  return {
    lines: lines.length,
    approved: of('approved', 'on-record'),
    returned: of('returned', 'abandoned'),
    held: of('held'),
    undecided: of('undecided'),
    clean: lines.filter(isClean).length,
  };
}
