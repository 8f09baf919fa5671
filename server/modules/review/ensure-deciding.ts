import { conflict } from '#server/http/problem.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import type { LineState, RevisionStatus } from '#shared/review/states.ts';

/**
 * Decisions are taken by the inspector who holds the review; on a line reopened after it closed, by any inspector.
 * @throws Problem 409 that says who or what stands in the way
 */
export function ensureDeciding(
  subject: {
    readonly revision_status: RevisionStatus;
    readonly inspector_id: string | null;
    readonly line_state: LineState | null;
    readonly contractor_id: string;
  },
  actor: Actor,
): void {
  if (actor.orgId === subject.contractor_id)
    throw conflict(
      'revision.own-work',
      'An inspector may decide nothing of a batch they are the contractor of.',
    );
  if (subject.revision_status === 'in-review') {
    if (subject.inspector_id === actor.id) return;
    throw conflict('revision.taken', 'Another inspector holds this batch. Nothing was changed.');
  }
  if (subject.revision_status === 'decided' && subject.line_state === 'undecided') return;
  throw subject.revision_status === 'submitted'
    ? conflict('revision.not-taken', 'Take the batch from the queue first, then decide.')
    : conflict(
        'revision.not-in-review',
        'The review of this batch is closed. Reopen the line to decide it again.',
      );
}
