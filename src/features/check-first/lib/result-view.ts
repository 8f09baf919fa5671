import type { ShownFinding } from '#shared/check/shown-finding.ts';
import type { SheetFinding } from '#shared/drawing/sheet-types.ts';
import type { Severity } from '#shared/findings/types.ts';
import type { CheckedLine } from '#src/workers/check/protocol.ts';

export const SHOWS = ['want', 'clean', 'all'] as const;
export type Show = (typeof SHOWS)[number];

/** A nonconformity or a query stands on it; notes are for information. */
export const wantsLook = ({ findings }: Pick<CheckedLine, 'findings'>): boolean =>
  findings.some(({ severity }) => severity !== 'note');

export const passes = (line: CheckedLine, show: Show): boolean =>
  show === 'all' || (show === 'want') === wantsLook(line);

const ORDER = { nonconformity: 0, query: 1, note: 2 } as const;

/** What does not conform, then queries, then notes; else as the check found them. */
export const inOrder = (findings: readonly ShownFinding[]): readonly ShownFinding[] =>
  findings.toSorted((a, b) => ORDER[a.severity] - ORDER[b.severity]);

export const worstOf = (findings: readonly ShownFinding[]): Severity | null =>
  inOrder(findings)[0]?.severity ?? null;

/** Findings as balloons of the drawing: numbered as the list has them. */
export const balloonsOf = (findings: readonly ShownFinding[]): readonly SheetFinding[] =>
  inOrder(findings)
    .filter(({ severity }) => severity !== 'note')
    .map(({ fingerprint, ...finding }, index) => ({ ...finding, id: fingerprint, number: index + 1 }));
