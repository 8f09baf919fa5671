import { useEffect, useMemo, useSyncExternalStore } from 'react';
import {
  countUploads,
  createUploadQueue,
  type UploadQueue,
  type UploadTarget,
} from '#src/lib/api/upload-queue.ts';

/** Queues by the address they send to, for as long as somebody is signed in. */
const queues = new Map<string, UploadQueue>();

/** On signing out: nothing goes on being sent for whoever left. */
export function stopUploads(): void {
  for (const queue of queues.values()) queue.stop();
  queues.clear();
}

/** The uploads of one address: begun on this page or on a visit before. Leaving the site while they run is asked about. */
export function useUploadQueue({ path, method, field }: UploadTarget, onStored: () => void) {
  const queue = useMemo(() => {
    const found = queues.get(path) ?? createUploadQueue({ path, method, field });
    queues.set(path, found);
    return found;
  }, [path, method, field]);
  const files = useSyncExternalStore(queue.subscribe, queue.files, queue.files);
  const counts = useMemo(() => countUploads(files), [files]);
  useEffect(() => queue.onStored(onStored), [queue, onStored]);
  useEffect(() => {
    if (!counts.busy) return undefined;
    const ask = (event: BeforeUnloadEvent) => event.preventDefault();
    globalThis.addEventListener('beforeunload', ask);
    return () => globalThis.removeEventListener('beforeunload', ask);
  }, [counts.busy]);
  return { queue, files, counts };
}
