import { queryOptions, useQuery, useQueryClient } from '@tanstack/react-query';
import { batchKey } from './batch.ts';
import { api } from '#src/lib/api/client.ts';
import { isFinal, useProgress, type JobProgress } from '#src/lib/api/use-progress.ts';
import type { Batch, CheckProgress } from '#shared/generated/api-types.ts';

const fetchCheck = (batchId: string, signal?: AbortSignal) =>
  api<CheckProgress>(`/api/batches/${batchId}/check`, { signal });

const checkQuery = (batchId: string) =>
  queryOptions({
    queryKey: [...batchKey(batchId), 'check'],
    queryFn: ({ signal }) => fetchCheck(batchId, signal),
  });

export type CheckState = {
  readonly state: CheckProgress['state'];
  /** Rows checked of rows; total 0: not known yet. */
  readonly done: number;
  readonly total: number;
  /** Why the workbook was refused. */
  readonly problem: unknown;
};

/** How far the check of the newest upload is, followed while it goes on. Everything of the batch is fetched anew when it ends. */
export function useCheck(batch: Batch): CheckState | null {
  const client = useQueryClient();
  const { data } = useQuery(checkQuery(batch.id));
  const known = data && data.input >= batch.input ? data : null;
  const running = batch.status === 'checking' || (known !== null && !isFinal(known));
  const refetch = () => void client.invalidateQueries({ queryKey: batchKey(batch.id) });
  // A newer input is another check of the same revision: followed anew.
  const live = useProgress(running ? `check:${batch.revision.id}` : null, {
    poll: () => fetchCheck(batch.id),
    onFinal: refetch,
    turn: batch.input,
  });
  if (running && live) return merge(live);
  return known;
}

function merge({ state, done, total, problem }: JobProgress): CheckState {
  return { state: state === 'issued' ? 'done' : state, done, total: total ?? 0, problem: problem ?? null };
}
