import { AbilityBuilder, createMongoAbility, subject, type MongoAbility } from '@casl/ability';

export const ROLES = ['contractor', 'inspector', 'engineer', 'clerk', 'auditor', 'administrator'] as const;
export type Role = (typeof ROLES)[number];

/** Who asks. Taken from the session on the server, from the session reply on the client. */
export type Actor = {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly role: Role;
  readonly orgId: string;
  readonly orgKind: 'owner' | 'contractor';
  readonly orgName: string;
};

/** Subjects that belong to a contractor carry `contractorId`; the wall between contractors is this one field. */
export type Owned = { contractorId: string };
export type SubjectName =
  | 'WorkOrder'
  | 'Batch'
  | 'Record'
  | 'Finding'
  | 'Photo'
  | 'Concession'
  | 'RegisterEntry'
  | 'Nonconformity'
  | 'Transmittal'
  | 'Lot'
  | 'Product'
  | 'Standard'
  | 'Trail'
  | 'Person'
  | 'Organisation'
  | 'Mail'
  | 'Job';
export type Action =
  | 'read'
  | 'create'
  | 'update'
  /** contractor: workbook and photographs of a draft; submit and withdraw it; answer a finding */
  | 'hand-in'
  /** inspector: take, release, decide, close a review, ask for a concession, reopen */
  | 'review'
  /** administrator: hand a taken review to another inspector; abandon a line */
  | 'assign'
  /** engineer: grant or refuse a concession */
  | 'concede'
  /** clerk: enter on the register, refer back */
  | 'enter'
  /** clerk: issue a transmittal */
  | 'issue'
  | 'publish'
  | 'export'
  | 'verify';

type Subjects = SubjectName | (Owned & { __caslSubjectType__: SubjectName });
export type Ability = MongoAbility<[Action, Subjects]>;

/** The one definition of who may do what. Rows of a list are filtered in SQL by the same conditions (plain equality). */
export function defineAbilityFor(actor: Actor): Ability {
  const { can, build } = new AbilityBuilder<Ability>(createMongoAbility);
  const ownRead: SubjectName[] = [
    'WorkOrder',
    'Batch',
    'Record',
    'Finding',
    'Photo',
    'RegisterEntry',
    'Concession',
  ];

  if (actor.role === 'contractor') {
    const own = { contractorId: actor.orgId };
    for (const name of ownRead) can('read', name, own);
    can('create', 'Batch', own);
    can('hand-in', 'Batch', own);
    can('hand-in', 'Finding', own);
    can('hand-in', 'Photo', own);
    can('read', ['Product', 'Standard']);
    return build();
  }

  can('read', [
    ...ownRead,
    'Nonconformity',
    'Transmittal',
    'Lot',
    'Product',
    'Standard',
    'Trail',
    'Organisation',
  ]);
  can('export', ['RegisterEntry', 'Nonconformity']);
  switch (actor.role) {
    case 'inspector':
      can('review', ['Batch', 'Record', 'Finding', 'Concession']);
      break;
    case 'engineer':
      can('concede', 'Concession');
      can(['create', 'publish'], 'Standard');
      break;
    case 'clerk':
      can('enter', 'RegisterEntry');
      can('issue', 'Transmittal');
      break;
    case 'auditor':
      can('verify', 'Trail');
      can('read', 'Person');
      break;
    case 'administrator':
      can(['read', 'create', 'update'], ['Person', 'Organisation', 'WorkOrder', 'Lot', 'Product']);
      can('assign', ['Batch', 'Record']);
      can('verify', 'Trail');
      can('read', 'Mail');
      can(['read', 'update'], 'Job');
      break;
  }
  return build();
}

/** May this actor do this to this one object? `contractorId` is the object's own. */
export function may(ability: Ability, action: Action, name: SubjectName, object: Owned): boolean {
  return ability.can(action, subject(name, { ...object }) as never);
}
