import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { batchKey } from './batch.ts';
import { upload } from '#src/lib/api/upload.ts';
import type { UploadReply } from '#shared/generated/api-types.ts';

/** Hands in the workbook, with bytes sent of bytes while it goes. */
export function useSendWorkbook(batchId: string) {
  const client = useQueryClient();
  const [sent, setSent] = useState<{ bytes: number; total: number } | null>(null);
  const send = useMutation({
    mutationFn: (file: File) =>
      upload<UploadReply>({
        path: `/api/batches/${batchId}/workbook`,
        method: 'PUT',
        field: 'workbook',
        files: [file],
        onProgress: (bytes, total) => setSent({ bytes, total }),
      }),
    onMutate: (file) => setSent({ bytes: 0, total: file.size }),
    onSettled: () => {
      setSent(null);
      return client.invalidateQueries({ queryKey: batchKey(batchId) });
    },
  });
  return { send, sent };
}
