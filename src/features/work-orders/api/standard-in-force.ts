import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { StandardVersion } from '#shared/generated/api-types.ts';
import type { Standard } from '#shared/standard/types.ts';

/** The published version in force on a day `YYYY-MM-DD`: the newest that took effect by then. */
export function inForce(versions: readonly StandardVersion[], day: string): StandardVersion | null {
  let found: StandardVersion | null = null;
  for (const version of versions) {
    const { state, effectiveOn } = version;
    if (state !== 'published' || effectiveOn === null || effectiveOn > day) continue;
    if (effectiveOn > (found?.effectiveOn ?? '')) found = version;
  }
  return found;
}

/** The standard that work done on `day` is checked on; null: none is in force. */
export const standardInForceQuery = (day: string) =>
  queryOptions({
    queryKey: ['standard', 'in-force', day],
    queryFn: async ({ signal }) => {
      const { items } = await api<{ items: StandardVersion[] }>('/api/standard/versions', { signal });
      const version = inForce(items, day);
      return version ? (version.body as unknown as Standard) : null;
    },
    staleTime: 5 * 60_000,
  });
