import { useKeysetList } from '#src/lib/api/use-keyset-list.ts';
import type { Concession } from '#shared/generated/api-types.ts';

export const CONCESSION_STATES = ['asked', 'granted', 'refused', 'withdrawn'] as const;

/** `state` undefined: those of every state. */
export function useConcessions(state: string | undefined) {
  return useKeysetList<Concession>({ key: 'concessions', path: '/api/concessions', query: { state } });
}
