import type { Severity } from '#shared/findings/types.ts';
import { accept, refuse, type Outcome } from './outcome.ts';
import type { ActionDue, Grounds } from './states.ts';

/** Where a finding stands after its newest decision. */
export type FindingState = 'undecided' | 'approved' | 'rejected' | 'concession-asked';

export type DecisionRequest = {
  readonly decision: 'approve' | 'reject';
  readonly grounds?: Exclude<Grounds, 'concession'> | null;
  readonly action?: ActionDue | null;
  /** Calendar day `YYYY-MM-DD` by which the action is due. */
  readonly dueOn?: string | null;
  readonly reason?: string | null;
};

export type FindingFacts = {
  readonly severity: Severity;
  readonly state: FindingState;
  /** The contractor answered this finding in writing. */
  readonly answered: boolean;
};

export type Decision = {
  readonly decision: 'approve' | 'reject';
  readonly grounds: Grounds | null;
  readonly action: ActionDue | null;
  readonly dueOn: string | null;
  readonly reason: string | null;
};

/**
 * May an inspector decide this finding so? `today` is the owner's calendar day: what is due cannot be due in the past.
 * A concession is not decided here: an inspector asks for it, an engineer grants it.
 */
export function decideFinding(
  finding: FindingFacts,
  request: DecisionRequest,
  today: string,
): Outcome<Decision> {
  const reason = request.reason?.trim() || null;
  if (finding.severity === 'note')
    return refuse('decision.note', 'A note is information and needs no decision.');
  if (finding.state === 'concession-asked')
    return refuse(
      'decision.concession-asked',
      'A concession has been asked for this finding; an engineer answers it.',
    );
  if (request.decision === 'approve') {
    if (!request.grounds)
      return refuse(
        'decision.grounds-required',
        'Say on what ground the finding is approved: evidence or answer.',
      );
    if (request.grounds === 'answer') {
      if (finding.severity !== 'query')
        return refuse(
          'decision.answer-settles-queries-only',
          'An answer settles a query only. Approve a nonconformity on evidence, or ask for a concession.',
        );
      if (!finding.answered)
        return refuse('decision.not-answered', 'The contractor has not answered this finding yet.');
    }
    if (request.grounds === 'evidence' && !reason)
      return refuse('decision.reason-required', 'Say what the photograph or field check shows.');
    return accept({ decision: 'approve', grounds: request.grounds, action: null, dueOn: null, reason });
  }
  if (!request.action)
    return refuse('decision.action-required', 'Say what is due: correct the record, rework or repair.');
  if (!request.dueOn) return refuse('decision.due-required', 'Say by which day it is due.');
  if (request.dueOn < today)
    return refuse('decision.due-past', 'The due day has already passed. Choose today or a later day.');
  if (!reason)
    return refuse(
      'decision.reason-required',
      'Say why the finding is rejected, so that the contractor knows what to mend.',
    );
  return accept({ decision: 'reject', grounds: null, action: request.action, dueOn: request.dueOn, reason });
}

/** May a concession be asked for this finding? */
export function askConcession(finding: FindingFacts, reason: string): Outcome<{ reason: string }> {
  if (finding.severity === 'note')
    return refuse('decision.note', 'A note is information and needs no decision.');
  if (finding.state === 'concession-asked')
    return refuse('decision.concession-asked', 'A concession has already been asked for.');
  const text = reason.trim();
  return text
    ? accept({ reason: text })
    : refuse('decision.reason-required', 'Say why a concession is asked for.');
}
