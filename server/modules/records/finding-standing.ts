import type { FindingDecision } from '#shared/generated/api-types.ts';
import type { ActionDue, Grounds } from '#shared/review/states.ts';

/** Words of the API for the states that the projection keeps. */
export const FINDING_STATES = {
  open: 'undecided',
  approved: 'approved',
  rejected: 'rejected',
  held: 'concession-asked',
} as const;

/** The newest decision row of a finding, as a query has it. */
export type DecisionColumns = {
  decision: string | null;
  grounds: Grounds | null;
  action: ActionDue | null;
  due_on: string | null;
  reason: string | null;
  decided_by: string | null;
  decided_at: string | null;
};

/** The decision that stands; null where there is none, it was undone, or an engineer is asked. */
export function decisionOf(row: DecisionColumns): FindingDecision | null {
  const { decision } = row;
  if ((decision !== 'approve' && decision !== 'reject') || row.decided_at === null) return null;
  return {
    decision,
    grounds: row.grounds,
    action: row.action,
    dueOn: row.due_on,
    reason: row.reason,
    by: row.decided_by ?? '',
    at: row.decided_at,
  };
}
