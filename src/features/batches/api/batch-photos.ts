import { queryOptions } from '@tanstack/react-query';
import { batchKey } from './batch.ts';
import { api } from '#src/lib/api/client.ts';
import type { Photo } from '#shared/generated/api-types.ts';

export const batchPhotosQuery = (batchId: string) =>
  queryOptions({
    queryKey: [...batchKey(batchId), 'photos'],
    queryFn: async ({ signal }) =>
      (await api<{ items: Photo[] }>(`/api/batches/${batchId}/photos`, { signal })).items,
    // Thumbnails are made after the upload: look again until all are there.
    refetchInterval: ({ state }) => (state.data?.some((photo) => photo.state === 'stored') ? 2_500 : false),
  });

export const photoFile = (photoId: string, size: 'thumb' | 'display' | 'original'): string =>
  `/api/photos/${photoId}/file?size=${size}`;
