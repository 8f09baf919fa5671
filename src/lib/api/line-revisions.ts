import { queryOptions } from '@tanstack/react-query';
import { api } from '#src/lib/api/client.ts';
import type { Page } from '#src/lib/api/use-keyset-list.ts';
import type { Batch, RecordRow } from '#shared/generated/api-types.ts';

export type LineRevision = { readonly revision: number; readonly recordId: string };

/** The records of one line over the revisions of its batch, oldest first; those that the reader may not see yet are left out. */
export const lineRevisionsQuery = (batch: Batch, line: RecordRow) =>
  queryOptions({
    queryKey: ['records', 'revisions', line.lineId, batch.revision.number],
    queryFn: async ({ signal }): Promise<readonly LineRevision[]> => {
      const numbers = Array.from({ length: batch.revision.number + 1 }, (_, n) => n);
      const pages = await Promise.all(
        numbers.map((revision) =>
          api<Page<RecordRow>>(`/api/batches/${batch.id}/records`, {
            query: { structure: line.structureNumber, revision },
            signal,
          }),
        ),
      );
      return pages.flatMap((page, revision) =>
        page.items
          .filter((record) => record.lineId === line.lineId)
          .map((record) => ({ revision, recordId: record.id })),
      );
    },
    enabled: batch.revision.number > 0,
  });
