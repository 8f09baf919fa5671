import { shownFinding, type ShownFinding } from '#shared/check/shown-finding.ts';
import type { CheckedRecord, CheckResult } from '#shared/check/types.ts';
import { findingTitle } from '#shared/findings/render.ts';
import { lineKey } from '#shared/records/structure-key.ts';
import type { CheckedLine, NotRun } from './protocol.ts';

export type CheckedLines = {
  readonly lines: readonly CheckedLine[];
  /** Findings of the workbook as a whole, and of rows that belong to no line. */
  readonly loose: readonly ShownFinding[];
  readonly notRun: readonly NotRun[];
};

const toLine = (record: CheckedRecord, findings: readonly ShownFinding[]): CheckedLine => ({
  kind: record.kind,
  structureNumber: record.structureNumber,
  occurrence: record.occurrence,
  sheet: record.sheet,
  row: record.row,
  values: record.values,
  derived: record.derived,
  workDay: record.workDay,
  standardNumber: record.standardNumber,
  pours: record.pours.map((pour) => ({
    row: pour.source.row,
    event: pour.event,
    pourNumber: pour.pourNumber,
    pouredAt: pour.pouredAt,
    product: pour.product,
    lot: pour.lot,
    kitFt3: pour.kitFt3,
    quantity: pour.quantity,
    wastedQuantity: pour.wastedQuantity,
  })),
  findings,
});

/** A check's result by line, in words. */
export function checkedLines({ records, findings, skipped }: CheckResult): CheckedLines {
  const byLine = new Map<string, ShownFinding[]>(
    records.map((one) => [lineKey(one.kind, one.structureNumber, one.occurrence), []]),
  );
  const loose: ShownFinding[] = [];
  for (const finding of findings) {
    const { kind, structureNumber, occurrence } = finding;
    const own = kind === null ? undefined : byLine.get(lineKey(kind, structureNumber, occurrence ?? 1));
    (own ?? loose).push(shownFinding(finding));
  }
  return {
    lines: records.map((one) =>
      toLine(one, byLine.get(lineKey(one.kind, one.structureNumber, one.occurrence)) ?? []),
    ),
    loose,
    notRun: skipped.map((one) => ({ ...one, title: findingTitle(one.code) })),
  };
}
