import type { RevisionStatus } from '#shared/review/states.ts';

/** The contractor still works on it: files may be replaced, and its content is nobody else's to see. */
export const isOpen = (status: RevisionStatus): boolean =>
  status === 'draft' || status === 'checking' || status === 'checked';
