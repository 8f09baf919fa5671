import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';

/** A line with what the check found on it. */
export type LineView = {
  readonly record: RecordRow;
  readonly findings: readonly FindingRow[];
};

export type BatchView = {
  readonly lines: readonly LineView[];
  /** Findings of the workbook as a whole. */
  readonly loose: readonly FindingRow[];
};

export function joinFindings(records: readonly RecordRow[], findings: readonly FindingRow[]): BatchView {
  const ofRecord = new Map<string, FindingRow[]>();
  const loose: FindingRow[] = [];
  for (const finding of findings) {
    const own = finding.recordId === null ? null : ofRecord.get(finding.recordId);
    if (own) own.push(finding);
    else if (finding.recordId === null) loose.push(finding);
    else ofRecord.set(finding.recordId, [finding]);
  }
  return {
    lines: records.map((record) => ({ record, findings: ofRecord.get(record.id) ?? [] })),
    loose,
  };
}

/** A nonconformity or a query stands on it; notes are for information. */
export const wantsLook = (line: Pick<LineView, 'findings'>): boolean =>
  line.findings.some((finding) => finding.severity !== 'note');

/** A value is missing or cannot be read: while one stands, the batch is not taken. */
export const isIncomplete = (finding: Pick<FindingRow, 'code' | 'severity'>): boolean =>
  finding.severity === 'nonconformity' && finding.code.startsWith('record-');

export const isUnanswered = (finding: Pick<FindingRow, 'severity' | 'answer'>): boolean =>
  finding.severity !== 'note' && finding.answer === null;

const ORDER = { nonconformity: 0, query: 1, note: 2 } as const;

export function worstSeverity(findings: readonly FindingRow[]): FindingRow['severity'] | null {
  let worst: FindingRow['severity'] | null = null;
  for (const { severity } of findings) {
    if (worst === null || ORDER[severity] < ORDER[worst]) worst = severity;
  }
  return worst;
}
