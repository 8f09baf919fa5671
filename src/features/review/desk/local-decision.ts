import type { Decision } from '#src/features/review/api/send-decision.ts';
import type { FindingRow, RecordRow, RecordSheetData } from '#shared/generated/api-types.ts';
import { lineState } from '#shared/review/line-state.ts';

export type Author = { readonly name: string; readonly at: string };

/** The finding as it will be once the server agrees: shown at once, taken back if it does not. */
export function expectedFinding(decision: Decision, author: Author): FindingRow | null {
  const by = { by: author.name, at: author.at };
  switch (decision.type) {
    case 'finding': {
      const { finding, request } = decision;
      const word = {
        decision: request.decision,
        grounds: request.grounds ?? null,
        action: request.action ?? null,
        dueOn: request.dueOn ?? null,
        reason: request.reason ?? null,
        ...by,
      };
      return { ...finding, state: request.decision === 'approve' ? 'approved' : 'rejected', decision: word };
    }
    case 'concession':
      return { ...decision.finding, state: 'concession-asked', decision: null };
    case 'undo-finding':
      return { ...decision.finding, state: 'undecided', decision: null };
    default:
      return null;
  }
}

/** The line as it will be once the server agrees with a word on the line itself. */
export function expectedRecord(
  decision: Decision,
  { findings, author }: { findings: readonly FindingRow[]; author: Author },
): RecordRow | null {
  if (decision.type !== 'line' && decision.type !== 'undo-line') return null;
  const word =
    decision.type === 'line'
      ? {
          decision: decision.request.decision,
          reason: decision.request.reason ?? null,
          by: author.name,
          at: author.at,
        }
      : null;
  return followFindings({ ...decision.record, decision: word }, findings);
}

/** State and counts of a line after its findings, by the same rule as the server's. */
export function followFindings(record: RecordRow, findings: readonly FindingRow[]): RecordRow {
  if (record.state === 'on-record' || record.state === 'abandoned') return record;
  const due = findings.filter((finding) => finding.severity !== 'note');
  return {
    ...record,
    counts: {
      ...record.counts,
      undecided: due.filter((finding) => finding.state === 'undecided').length,
    },
    state: lineState({ findings: due, decision: record.decision?.decision ?? null }),
  };
}

export function withFinding<T extends Pick<RecordSheetData, 'record' | 'findings'>>(
  sheet: T,
  finding: FindingRow,
): T {
  const findings = sheet.findings.map((one) => (one.id === finding.id ? finding : one));
  return { ...sheet, findings, record: followFindings(sheet.record, findings) };
}
