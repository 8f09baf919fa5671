import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useRef, useState } from 'react';
import { batchKey } from '../api/batch.ts';
import { useSendWorkbook } from '../api/send-workbook.ts';
import { sortFiles } from '../lib/sort-files.ts';
import { useUploadQueue } from '#src/lib/api/use-upload-queue.ts';
import type { Batch } from '#shared/generated/api-types.ts';

const SETTLE_MS = 1_200;

/** Takes whatever is dropped, chosen or photographed and sends it where it belongs. */
export function useIntake(batch: Batch) {
  const client = useQueryClient();
  const { send, sent } = useSendWorkbook(batch.id);
  const [told, setTold] = useState<readonly string[]>([]);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  // Photographs come many a second: what they change is fetched when it is quiet.
  const onStored = useCallback(() => {
    clearTimeout(timer.current);
    timer.current = setTimeout(
      () => void client.invalidateQueries({ queryKey: batchKey(batch.id) }),
      SETTLE_MS,
    );
  }, [client, batch.id]);
  const { queue, files, counts } = useUploadQueue(
    { path: `/api/batches/${batch.id}/photos`, method: 'POST', field: 'photos' },
    onStored,
  );
  function take(chosen: readonly File[]): void {
    const { workbooks, photographs, others } = sortFiles(chosen);
    const [workbook, ...more] = workbooks;
    if (workbook) send.mutate(workbook);
    if (photographs.length > 0) queue.add(photographs);
    setTold([
      ...(more.length > 0
        ? [
            `A batch has one workbook: ${workbook?.name} was taken, ${more.map(({ name }) => name).join(', ')} not.`,
          ]
        : []),
      ...(others.length > 0 ? [`Neither workbook nor photograph, so left out: ${listed(others)}.`] : []),
    ]);
  }
  return {
    take,
    told,
    sendWorkbook: (file: File) => send.mutate(file),
    workbook: { sent, error: send.error },
    photograph: (file: File, name: string) => queue.add([new File([file], name, { type: file.type })]),
    queue,
    files,
    counts,
  };
}

const MOST = 5;

function listed(names: readonly string[]): string {
  const more = names.length - MOST;
  return names.slice(0, MOST).join(', ') + (more > 0 ? ` and ${more} more` : '');
}
