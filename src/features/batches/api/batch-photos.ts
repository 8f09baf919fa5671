import { queryOptions, useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { batchKey } from './batch.ts';
import { api } from '#src/lib/api/client.ts';
import { useProgress, type JobProgress } from '#src/lib/api/use-progress.ts';
import type { Photo } from '#shared/generated/api-types.ts';

const fetchPhotos = async (batchId: string, signal?: AbortSignal) =>
  (await api<{ items: Photo[] }>(`/api/batches/${batchId}/photos`, { signal })).items;

export const batchPhotosQuery = (batchId: string) =>
  queryOptions({
    queryKey: [...batchKey(batchId), 'photos'],
    queryFn: ({ signal }) => fetchPhotos(batchId, signal),
  });

/**
 * Pictures are made after the upload: each appears when it is there. Followed by events, and by asking where those do
 * not get through; record sheets that show the photographs are fetched anew at the end.
 */
export function usePhotosPrepared(batchId: string): void {
  const client = useQueryClient();
  const { data = [] } = useQuery(batchPhotosQuery(batchId));
  const waiting = waitingIn(data);
  const live = useProgress(waiting > 0 ? `photos:${batchId}` : null, {
    poll: async () => progressOf(await fetchPhotos(batchId)),
    // More came in while the pictures before them were made: followed anew.
    turn: data.length,
    onFinal: () => {
      void client.invalidateQueries({ queryKey: batchKey(batchId) });
      void client.invalidateQueries({ queryKey: ['records'] });
    },
  });
  const done = live?.done ?? 0;
  useEffect(() => {
    if (done > 0) void client.invalidateQueries({ queryKey: batchPhotosQuery(batchId).queryKey });
  }, [client, batchId, done]);
}

/** Those whose picture is neither made nor given up. */
const waitingIn = (photos: readonly Photo[]): number =>
  photos.filter((photo) => photo.state === 'stored' && photo.problem === null).length;

function progressOf(photos: readonly Photo[]): JobProgress {
  const waiting = waitingIn(photos);
  return {
    state: waiting === 0 ? 'done' : 'running',
    done: photos.length - waiting,
    total: photos.length,
  };
}

export const photoFile = (photoId: string, size: 'thumb' | 'display' | 'original'): string =>
  `/api/photos/${photoId}/file?size=${size}`;
