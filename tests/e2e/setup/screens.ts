import type { Caller, World } from '#tests/api/authorisation/world.ts';

export type Screen = {
  readonly name: string;
  readonly as: Caller | 'nobody';
  readonly path: (world: World) => string;
  /** The control that brings up what is to be looked at. */
  readonly press?: RegExp;
  /** Where it has to be brought into sight first on a narrow screen. */
  readonly pressNarrow?: RegExp;
  /** The tab that is to be looked at, where it is not the first. */
  readonly tab?: string;
  /** The key that does so, where there is a keyboard. */
  readonly key?: string;
};

/** Every screen with something on it, as the role that works with it. */
export const SCREENS: readonly Screen[] = [
  { name: 'sign in', as: 'nobody', path: () => '/sign-in' },
  { name: 'forgotten password', as: 'nobody', path: () => '/password-reset' },
  {
    name: 'choosing a password',
    as: 'nobody',
    path: ({ shared }) => `/password-reset/${shared.invitationToken}`,
  },
  { name: 'home of a contractor', as: 'first', path: () => '/' },
  { name: 'home of an inspector', as: 'inspector', path: () => '/' },
  { name: 'home of a clerk', as: 'clerk', path: () => '/' },
  { name: 'work orders', as: 'first', path: () => '/work-orders' },
  { name: 'work order', as: 'first', path: ({ of }) => `/work-orders/${of.first.orderId}` },
  { name: 'kit planner', as: 'first', path: () => '/planner?boreIn=20&waterIn=3&tempF=cold' },
  {
    name: 'kits of a work order',
    as: 'administrator',
    path: ({ of }) => `/planner?view=order&built=too&order=${of.first.orderId}`,
  },
  { name: 'kits for the truck', as: 'first', path: () => '/planner?view=table' },
  { name: 'new work order', as: 'administrator', path: () => '/work-orders', press: /^New work order/ },
  { name: 'choosing what to check for', as: 'first', path: () => '/check' },
  {
    name: 'checking a workbook first',
    as: 'first',
    path: ({ of }) => `/work-orders/${of.first.orderId}/check`,
  },
  {
    name: 'typing a line',
    as: 'first',
    path: ({ of }) => `/work-orders/${of.first.orderId}/check?tab=line`,
  },
  { name: 'batches', as: 'first', path: () => '/batches' },
  { name: 'draft batch', as: 'first', path: ({ of }) => `/batches/${of.first.draft.id}` },
  { name: 'submitting', as: 'first', path: ({ of }) => `/batches/${of.first.draft.id}`, press: /^Submit/ },
  {
    name: 'photographs of a batch',
    as: 'first',
    path: ({ of }) => `/batches/${of.first.draft.id}?tab=photos`,
  },
  { name: 'changes of a batch', as: 'first', path: ({ of }) => `/batches/${of.first.draft.id}?tab=changes` },
  { name: 'files of a batch', as: 'first', path: ({ of }) => `/batches/${of.first.draft.id}?tab=files` },
  { name: 'batch on record', as: 'first', path: ({ of }) => `/batches/${of.first.done.id}` },
  { name: 'review queue', as: 'inspector', path: () => '/review' },
  { name: 'review desk', as: 'inspector', path: ({ of }) => `/review/${of.first.open.id}?tab=all` },
  {
    name: 'keys of the desk',
    as: 'inspector',
    path: ({ of }) => `/review/${of.first.open.id}`,
    key: '?',
  },
  {
    name: 'rejecting',
    as: 'inspector',
    path: ({ of }) => `/review/${of.first.open.id}`,
    press: /^Reject/,
    pressNarrow: /^Evidence/,
  },
  {
    name: 'closing',
    as: 'inspector',
    path: ({ of }) => `/review/${of.first.open.id}`,
    press: /^Close review/,
  },
  { name: 'record', as: 'inspector', path: ({ of }) => `/records/${of.first.done.recordId}` },
  {
    name: 'record with a finding',
    as: 'auditor',
    path: ({ of }) => `/records/${of.first.done.recordIds[1]}`,
  },
  { name: 'concessions', as: 'engineer', path: () => '/concessions' },
  {
    name: 'concession to answer',
    as: 'engineer',
    path: ({ of }) => `/concessions/${of.first.concessionAsked}`,
  },
  {
    name: 'concession granted',
    as: 'engineer',
    path: ({ of }) => `/concessions/${of.first.concessionGranted}`,
  },
  { name: 'register', as: 'auditor', path: () => '/register' },
  { name: 'entering', as: 'clerk', path: () => '/register/enter' },
  { name: 'register record', as: 'auditor', path: ({ of }) => `/register/${of.first.recordNumber}` },
  { name: 'nonconformities', as: 'auditor', path: () => '/nonconformities' },
  { name: 'nothing as filtered', as: 'auditor', path: () => '/nonconformities?q=nothing' },
  { name: 'lots', as: 'auditor', path: () => '/lots' },
  { name: 'lot', as: 'administrator', path: ({ shared }) => `/lots/${shared.lotId}` },
  { name: 'transmittals', as: 'clerk', path: () => '/transmittals' },
  { name: 'issuing', as: 'clerk', path: () => '/transmittals', press: /^Issue…/ },
  { name: 'transmittal', as: 'clerk', path: ({ of }) => `/transmittals/${of.first.transmittalId}` },
  { name: 'standard', as: 'engineer', path: () => '/standard' },
  { name: 'standard version', as: 'engineer', path: () => '/standard/1' },
  {
    name: 'draft of the standard',
    as: 'engineer',
    path: ({ shared }) => `/standard/${shared.draftStandard}`,
  },
  { name: 'trail', as: 'auditor', path: () => '/trail' },
  { name: 'people', as: 'administrator', path: () => '/people' },
  { name: 'mail', as: 'administrator', path: () => '/mail' },
  // The message itself is shown in a frame that runs no script, so none of axe's: its plain text is looked at.
  {
    name: 'message',
    as: 'administrator',
    path: ({ shared }) => `/mail/${shared.mailId}`,
    tab: 'As plain text',
  },
  { name: 'jobs', as: 'administrator', path: () => '/jobs' },
  { name: 'search', as: 'auditor', path: () => '/search?q=A-' },
  { name: 'no such page', as: 'auditor', path: () => '/nowhere' },
];
