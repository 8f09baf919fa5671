import { ROLES, type Role } from '#shared/permissions/ability.ts';

const DOES: Readonly<Record<Role, string>> = {
  contractor: 'hands in batches of their organisation and answers findings',
  inspector: 'takes batches and decides findings and lines',
  engineer: 'grants concessions, drafts and publishes the standard',
  clerk: 'enters approved lines on the register and issues transmittals',
  auditor: 'reads and exports everything, verifies the trail',
  administrator: 'people, work orders, products and lots; decides no findings',
};

/** Roles that fit an organisation: a contractor's people are contractors, the owner's are anything else. */
export function roleOptions(kind: 'owner' | 'contractor' | null) {
  return ROLES.filter((role) => kind !== null && (role === 'contractor') === (kind === 'contractor')).map(
    (role) => ({ value: role, label: role, note: DOES[role] }),
  );
}

export const ROLE_OPTIONS = ROLES.map((role) => ({ value: role, label: role }));
