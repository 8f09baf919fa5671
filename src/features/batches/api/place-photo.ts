import { useMutation, useQueryClient } from '@tanstack/react-query';
import { batchKey } from './batch.ts';
import { api } from '#src/lib/api/client.ts';
import type { Photo, PhotoMatchBody } from '#shared/generated/api-types.ts';

/** Puts a photograph on a line and view by hand; `match` null takes it off. The batch is then checked again. */
export function usePlacePhoto(batchId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ photoId, match }: { photoId: string; match: PhotoMatchBody | null }) =>
      match
        ? api<Photo>(`/api/photos/${photoId}/match`, { method: 'PUT', body: match })
        : api<Photo>(`/api/photos/${photoId}/match`, { method: 'DELETE' }),
    onSettled: () => client.invalidateQueries({ queryKey: batchKey(batchId) }),
  });
}
