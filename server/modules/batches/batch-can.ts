import { may, type Ability, type Action, type Actor } from '#shared/permissions/ability.ts';
import { isRefusal } from '#shared/review/outcome.ts';
import { moveRevision, type RevisionAction, type RevisionState } from '#shared/review/revision.ts';
import type { BatchDbRow } from './batch-select.ts';

const MOVES: readonly { name: string; needs: Action; action: RevisionAction }[] = [
  { name: 'upload', needs: 'hand-in', action: { type: 'upload' } },
  { name: 'submit', needs: 'hand-in', action: { type: 'submit' } },
  { name: 'withdraw', needs: 'hand-in', action: { type: 'withdraw' } },
  { name: 'take', needs: 'review', action: { type: 'take' } },
  { name: 'release', needs: 'review', action: { type: 'release' } },
  { name: 'close-review', needs: 'review', action: { type: 'close' } },
  { name: 'assign', needs: 'assign', action: { type: 'assign', inspectorId: '' } },
];

/** What the person may do with the batch as it stands: the ability's word and the state machine's. */
export function batchCan(row: BatchDbRow, viewer: { actor: Actor; ability: Ability }): string[] {
  const { actor, ability } = viewer;
  const owned = { contractorId: row.contractor_id };
  const state = revisionState(row);
  return MOVES.filter(
    ({ needs, action, name }) =>
      may(ability, needs, 'Batch', owned) &&
      !isRefusal(moveRevision(state, action, actor)) &&
      // Taking again what one already holds is allowed, and no news.
      !(name === 'take' && row.status === 'in-review'),
  ).map(({ name }) => name);
}

export function revisionState(
  row: Pick<BatchDbRow, 'status' | 'contractor_id' | 'inspector_id' | 'input' | 'run_input' | 'counts'>,
): RevisionState {
  return {
    status: row.status,
    contractorId: row.contractor_id,
    inspectorId: row.inspector_id,
    lines: row.counts?.lines ?? 0,
    incomplete: row.counts?.incomplete ?? 0,
    // Nothing is being checked in a draft: it has no lines yet, or its last upload could not be read.
    checkCurrent: row.status === 'draft' || (row.run_input !== null && row.run_input === row.input),
  };
}
