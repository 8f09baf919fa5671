import type { Severity } from '#shared/findings/types.ts';
import type { FindingState } from './finding-decision.ts';
import type { LineState } from './states.ts';

export type LineFacts = {
  readonly findings: readonly { readonly severity: Severity; readonly state: FindingState }[];
  /** The inspector's newest decision on the line itself, if any. */
  readonly decision: 'approve' | 'return' | null;
};

/**
 * State of a line under review. Returned when any finding is rejected or the line itself is; undecided while a
 * nonconformity or query is; held while a concession is asked for; approved when every finding is. A line without
 * findings to decide waits for the inspector's own word: nothing is approved unseen.
 */
export function lineState(
  line: LineFacts,
): Extract<LineState, 'undecided' | 'approved' | 'returned' | 'held'> {
  const due = line.findings.filter((finding) => finding.severity !== 'note');
  if (line.decision === 'return' || due.some((finding) => finding.state === 'rejected')) return 'returned';
  if (due.some((finding) => finding.state === 'undecided')) return 'undecided';
  if (due.some((finding) => finding.state === 'concession-asked')) return 'held';
  if (due.length > 0) return 'approved';
  return line.decision === 'approve' ? 'approved' : 'undecided';
}
