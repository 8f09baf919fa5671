import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isRefusal } from './outcome.ts';
import { moveRevision, type RevisionAction, type RevisionActor, type RevisionState } from './revision.ts';
import { REVISION_STATUSES } from './states.ts';

const contractor: RevisionActor = { id: 'c1', role: 'contractor', orgId: 'brindle' };
const foreign: RevisionActor = { id: 'c2', role: 'contractor', orgId: 'tamsett' };
const inspector: RevisionActor = { id: 'i1', role: 'inspector', orgId: 'owner' };
const other: RevisionActor = { id: 'i2', role: 'inspector', orgId: 'owner' };
const administrator: RevisionActor = { id: 'a1', role: 'administrator', orgId: 'owner' };

const state = (patch: Partial<RevisionState> = {}): RevisionState => ({
  status: 'checked',
  contractorId: 'brindle',
  inspectorId: null,
  lines: 3,
  incomplete: 0,
  checkCurrent: true,
  ...patch,
});
const move = (from: RevisionState, action: RevisionAction, actor: RevisionActor | null) => {
  const outcome = moveRevision(from, action, actor);
  return isRefusal(outcome) ? outcome.refused : outcome.accepted.status;
};

describe('the life of a revision', () => {
  it('goes from draft to on record', () => {
    expect(move(state({ status: 'draft' }), { type: 'upload' }, contractor)).toBe('checking');
    expect(move(state({ status: 'checking' }), { type: 'finish-check' }, null)).toBe('checked');
    expect(move(state(), { type: 'submit' }, contractor)).toBe('submitted');
    expect(move(state({ status: 'submitted' }), { type: 'take' }, inspector)).toBe('in-review');
    expect(move(state({ status: 'in-review', inspectorId: 'i1' }), { type: 'close' }, inspector)).toBe(
      'decided',
    );
    expect(move(state({ status: 'decided' }), { type: 'enter-last' }, null)).toBe('on-record');
  });

  it('refuses to submit what is incomplete, empty or still being checked', () => {
    expect(move(state({ incomplete: 1 }), { type: 'submit' }, contractor)).toBe('revision.incomplete');
    expect(move(state({ lines: 0 }), { type: 'submit' }, contractor)).toBe('revision.empty');
    expect(move(state({ status: 'draft', lines: 0 }), { type: 'submit' }, contractor)).toBe('revision.empty');
    expect(move(state({ status: 'checking' }), { type: 'submit' }, contractor)).toBe(
      'revision.check-running',
    );
    expect(move(state({ checkCurrent: false }), { type: 'submit' }, contractor)).toBe(
      'revision.check-running',
    );
    expect(move(state({ status: 'submitted' }), { type: 'submit' }, contractor)).toBe('revision.frozen');
  });

  it('lets a contractor withdraw until an inspector takes the batch', () => {
    expect(move(state({ status: 'submitted' }), { type: 'withdraw' }, contractor)).toBe('checked');
    expect(move(state({ status: 'in-review', inspectorId: 'i1' }), { type: 'withdraw' }, contractor)).toBe(
      'revision.taken',
    );
    expect(move(state({ status: 'submitted' }), { type: 'withdraw' }, foreign)).toBe('revision.not-yours');
  });

  it('lets only the holder close or release, and only an administrator reassign', () => {
    const held = state({ status: 'in-review', inspectorId: 'i1' });
    expect(move(held, { type: 'close' }, other)).toBe('revision.taken');
    expect(move(held, { type: 'take' }, other)).toBe('revision.taken');
    expect(move(held, { type: 'take' }, inspector)).toBe('in-review');
    expect(move(held, { type: 'release' }, inspector)).toBe('submitted');
    expect(move(held, { type: 'assign', inspectorId: 'i2' }, administrator)).toBe('in-review');
    expect(move(held, { type: 'assign', inspectorId: 'i2' }, inspector)).toBe('revision.not-administrator');
  });

  it('never lets an inspector decide their own work', () => {
    expect(move(state({ status: 'submitted', contractorId: 'owner' }), { type: 'take' }, inspector)).toBe(
      'revision.own-work',
    );
  });

  it('never changes a frozen revision by an upload, whoever asks', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(
          ...REVISION_STATUSES.filter((status) => !['draft', 'checking', 'checked'].includes(status)),
        ),
        fc.constantFrom(contractor, foreign, inspector, administrator, null),
        (status, actor) => isRefusal(moveRevision(state({ status }), { type: 'upload' }, actor)),
      ),
    );
  });

  it('holds an inspector exactly while in review or decided', () => {
    const actions: RevisionAction['type'][] = [
      'upload',
      'finish-check',
      'fail-check',
      'submit',
      'withdraw',
      'take',
      'release',
      'close',
      'enter-last',
    ];
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.constantFrom(...actions), fc.constantFrom(contractor, inspector, other)), {
          maxLength: 30,
        }),
        (steps) => {
          let now = state({ status: 'draft' });
          for (const [type, actor] of steps) {
            const outcome = moveRevision(now, { type } as RevisionAction, actor);
            if (!isRefusal(outcome)) now = { ...now, ...outcome.accepted };
            const holding = ['in-review', 'decided', 'on-record'].includes(now.status);
            if (holding !== (now.inspectorId !== null)) return false;
          }
          return true;
        },
      ),
    );
  });
});
