import type { Kind } from '#shared/records/types.ts';
import type { LineView } from './types.ts';

const OPENED: Readonly<Record<Kind, string>> = {
  set: 'boredAt',
  straighten: 'pulledAt',
  relevel: 'raisedAt',
};
const DAY = /^\d{4}-\d{2}-\d{2}/;

/** The calendar day (wall clock) on which the ground was opened: bored, pulled or raised. Null when it is not known. */
export const dayOpened = ({ kind, values }: LineView): string | null => {
  const at = values[OPENED[kind]];
  return typeof at === 'string' ? (DAY.exec(at)?.[0] ?? null) : null;
};
