import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useStartBatch } from '#src/features/work-orders/api/start-batch.ts';
import { upload } from '#src/lib/api/upload.ts';
import type { UploadReply, WorkOrder } from '#shared/generated/api-types.ts';

/** Puts the workbook into the open batch of its order, or into a new one. Gives the batch's id. */
export function useHandIn(order: WorkOrder) {
  const client = useQueryClient();
  const start = useStartBatch();
  const [sent, setSent] = useState<{ bytes: number; total: number } | null>(null);
  const handIn = useMutation({
    mutationFn: async (file: File) => {
      const batchId = order.openBatch ?? (await start.mutateAsync(order.id)).id;
      await upload<UploadReply>({
        path: `/api/batches/${batchId}/workbook`,
        method: 'PUT',
        field: 'workbook',
        files: [file],
        onProgress: (bytes, total) => setSent({ bytes, total }),
      });
      return batchId;
    },
    onSettled: () => {
      setSent(null);
      return Promise.all([
        client.invalidateQueries({ queryKey: ['batches'] }),
        client.invalidateQueries({ queryKey: ['work-orders'] }),
      ]);
    },
  });
  return { handIn, sent };
}
