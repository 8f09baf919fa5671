/** Status lives on the revision; a batch shows its newest. */
export const REVISION_STATUSES = [
  'draft',
  'checking',
  'checked',
  'submitted',
  'in-review',
  'decided',
  'on-record',
] as const;
export type RevisionStatus = (typeof REVISION_STATUSES)[number];

export const LINE_STATES = ['undecided', 'approved', 'returned', 'held', 'on-record', 'abandoned'] as const;
export type LineState = (typeof LINE_STATES)[number];

export const GROUNDS = ['evidence', 'answer', 'concession'] as const;
export type Grounds = (typeof GROUNDS)[number];

/** What is due after a rejection; the terms of ISO 9000. */
export const ACTIONS_DUE = ['correct', 'rework', 'repair'] as const;
export type ActionDue = (typeof ACTIONS_DUE)[number];
