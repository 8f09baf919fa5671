import type { Role } from '#shared/permissions/ability.ts';
import { accept, refuse, type Outcome } from './outcome.ts';
import type { RevisionStatus } from './states.ts';

/** What decides whether a revision may move on. */
export type RevisionState = {
  readonly status: RevisionStatus;
  readonly contractorId: string;
  /** Inspector who holds it; null unless in review. */
  readonly inspectorId: string | null;
  /** Lines of the newest finished check. */
  readonly lines: number;
  /** Standing `record-…` nonconformities of the newest check. */
  readonly incomplete: number;
  /** The newest check covers the newest upload. */
  readonly checkCurrent: boolean;
};

export type RevisionActor = { readonly id: string; readonly role: Role; readonly orgId: string };

export type RevisionAction =
  | { readonly type: 'upload' }
  | { readonly type: 'finish-check' }
  | { readonly type: 'fail-check' }
  | { readonly type: 'submit' }
  | { readonly type: 'withdraw' }
  | { readonly type: 'take' }
  | { readonly type: 'release' }
  | { readonly type: 'assign'; readonly inspectorId: string }
  | { readonly type: 'close' }
  | { readonly type: 'enter-last' };

const OPEN: readonly RevisionStatus[] = ['draft', 'checking', 'checked'];

/**
 * The life of a revision: draft -> checking -> checked -> submitted -> in-review -> decided -> on-record.
 * Pure: the caller holds the row lock and writes what is accepted.
 */
export function moveRevision(
  state: RevisionState,
  action: RevisionAction,
  actor: RevisionActor | null,
): Outcome<{ status: RevisionStatus; inspectorId: string | null }> {
  const to = (status: RevisionStatus, inspectorId: string | null = null) => accept({ status, inspectorId });
  switch (action.type) {
    case 'upload':
      if (!isContractorOf(state, actor)) return notYours();
      return OPEN.includes(state.status) ? to('checking') : frozen();
    case 'finish-check':
      return state.status === 'checking'
        ? to('checked')
        : refuse('revision.not-checking', 'No check of this revision is running.');
    case 'fail-check':
      return state.status === 'checking'
        ? to('draft')
        : refuse('revision.not-checking', 'No check of this revision is running.');
    case 'submit':
      return isContractorOf(state, actor) ? submit(state) : notYours();
    case 'withdraw':
      if (!isContractorOf(state, actor)) return notYours();
      if (state.status === 'submitted') return to('checked');
      return state.status === 'in-review'
        ? refuse('revision.taken', 'An inspector has taken this batch; it can no longer be withdrawn.')
        : refuse('revision.not-submitted', 'Only a submitted batch can be withdrawn.');
    case 'take':
      return take(state, actor);
    case 'release':
      return state.status === 'in-review' && holds(state, actor) ? to('submitted') : notHeld(state);
    case 'assign':
      if (actor?.role !== 'administrator')
        return refuse(
          'revision.not-administrator',
          'Only an administrator hands a review to another inspector.',
        );
      return state.status === 'submitted' || state.status === 'in-review'
        ? to('in-review', action.inspectorId)
        : refuse('revision.not-in-review', 'Only a submitted batch or one under review has an inspector.');
    case 'close':
      return state.status === 'in-review' && holds(state, actor)
        ? to('decided', state.inspectorId)
        : notHeld(state);
    case 'enter-last':
      return state.status === 'decided'
        ? to('on-record', state.inspectorId)
        : refuse('revision.not-decided', 'Only a decided batch goes on record.');
  }
}

function submit(state: RevisionState): Outcome<{ status: RevisionStatus; inspectorId: string | null }> {
  if (!OPEN.includes(state.status)) return frozen();
  if (state.status === 'checking' || !state.checkCurrent)
    return refuse(
      'revision.check-running',
      'The newest upload is still being checked. Wait for the result, then submit.',
    );
  if (state.status === 'draft' || state.lines === 0)
    return refuse('revision.empty', 'There are no lines to submit. Upload a filled workbook first.');
  if (state.incomplete > 0)
    return refuse(
      'revision.incomplete',
      `${state.incomplete === 1 ? 'One value is' : `${state.incomplete} values are`} missing or cannot be read. Correct the workbook and upload it again.`,
    );
  return accept({ status: 'submitted', inspectorId: null });
}

function take(
  state: RevisionState,
  actor: RevisionActor | null,
): Outcome<{ status: RevisionStatus; inspectorId: string | null }> {
  if (actor?.role !== 'inspector')
    return refuse('revision.not-inspector', 'Only an inspector takes a batch.');
  if (actor.orgId === state.contractorId)
    return refuse(
      'revision.own-work',
      'An inspector may decide nothing of a batch they are the contractor of.',
    );
  if (state.status === 'submitted') return accept({ status: 'in-review', inspectorId: actor.id });
  if (state.status === 'in-review' && state.inspectorId === actor.id)
    return accept({ status: 'in-review', inspectorId: actor.id });
  return state.status === 'in-review'
    ? refuse('revision.taken', 'Another inspector holds this batch.')
    : refuse('revision.not-submitted', 'Only a submitted batch can be taken.');
}

const isContractorOf = (state: RevisionState, actor: RevisionActor | null): boolean =>
  actor?.role === 'contractor' && actor.orgId === state.contractorId;
const holds = (state: RevisionState, actor: RevisionActor | null): boolean =>
  actor?.role === 'inspector' && actor.id === state.inspectorId;
const frozen = () =>
  refuse('revision.frozen', 'This revision has been submitted and can no longer be changed.');
const notYours = () => refuse('revision.not-yours', 'Only the contractor of this batch can do that.');
const notHeld = (state: RevisionState) =>
  state.status === 'in-review'
    ? refuse('revision.taken', 'Another inspector holds this batch.')
    : refuse('revision.not-in-review', 'This batch is not under review.');
