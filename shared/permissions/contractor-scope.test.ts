import { describe, expect, it } from 'vitest';
import { defineAbilityFor, ROLES, type Actor, type SubjectName } from './ability.ts';
import { contractorScope } from './contractor-scope.ts';

const actor = (role: Actor['role']): Actor => ({
  id: 'u1',
  email: 'a@b.example',
  name: 'A',
  role,
  orgId: 'org-1',
  orgKind: role === 'contractor' ? 'contractor' : 'owner',
  orgName: 'Org',
});
const OWN: SubjectName[] = [
  'WorkOrder',
  'Batch',
  'Record',
  'Finding',
  'Photo',
  'RegisterEntry',
  'Concession',
];

describe('contractorScope', () => {
  it.each(OWN)('a contractor reads only their own %s', (name) => {
    expect(contractorScope(defineAbilityFor(actor('contractor')), 'read', name)).toEqual({
      contractorId: 'org-1',
    });
  });

  it.each(ROLES.filter((role) => role !== 'contractor'))('%s reads every batch', (role) => {
    expect(contractorScope(defineAbilityFor(actor(role)), 'read', 'Batch')).toEqual({ contractorId: null });
  });

  it('says null where nothing is allowed', () => {
    expect(contractorScope(defineAbilityFor(actor('contractor')), 'read', 'Trail')).toBeNull();
    expect(contractorScope(defineAbilityFor(actor('inspector')), 'hand-in', 'Batch')).toBeNull();
  });
});
