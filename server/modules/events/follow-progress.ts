import type { EntityManager } from '@mikro-orm/postgresql';
import type { Listener } from '#server/jobs/listen.ts';
import { PROGRESS_CHANNEL, readProgress, type Progress } from '#server/jobs/progress.ts';

type Following = {
  readonly subject: string;
  readonly listener: Listener;
  /** A fresh one for each look. */
  readonly em: () => EntityManager;
  readonly tell: (progress: Progress) => void;
  readonly onError: (error: unknown) => void;
};

/**
 * Tells where a subject stands now and after every change. Changes that come faster than they can be read are told as
 * one, the newest. Returns what ends it.
 */
export function followProgress({ subject, listener, em, tell, onError }: Following): () => void {
  let over = false;
  let reading = false;
  let again = false;
  let last = '';

  const look = async (): Promise<void> => {
    if (reading) {
      again = true;
      return;
    }
    reading = true;
    try {
      do {
        again = false;
        const progress = await readProgress(em(), subject);
        const text = JSON.stringify(progress);
        if (over) return;
        if (!progress || text === last) continue;
        last = text;
        tell(progress);
      } while (again);
    } catch (error) {
      onError(error);
    } finally {
      reading = false;
    }
  };
  // Listening begins before the first look: nothing falls between them.
  const off = listener.on(PROGRESS_CHANNEL, (payload) => {
    if (payload === null || payload === subject) void look();
  });
  void look();
  return () => {
    over = true;
    off();
  };
}
