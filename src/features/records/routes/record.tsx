import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { RecordPage } from '#src/features/records/components/record-page.tsx';
import { recordSheetQuery } from '#src/lib/api/record-sheet.ts';

export function Component() {
  const { id = '' } = useParams();
  const sheet = useQuery(recordSheetQuery(id));
  return (
    <>
      <DocumentTitle>{sheet.data ? `Record ${sheet.data.record.structureNumber}` : 'Record'}</DocumentTitle>
      {sheet.data ? <RecordPage key={id} data={sheet.data} /> : null}
      {sheet.isPending ? <Skeleton lines={14} label="Loading the record" /> : null}
      {sheet.isError && !sheet.data ? (
        <ErrorState error={sheet.error} what="The record" onRetry={() => void sheet.refetch()} />
      ) : null}
    </>
  );
}
