import { useQuery } from '@tanstack/react-query';
import { batchInputsQuery } from '../api/batch-inputs.ts';
import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Moment } from '#src/components/ui/moment.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import type { InputRow } from '#shared/generated/api-types.ts';

const COLUMNS: readonly PlainColumn<InputRow>[] = [
  { id: 'file', title: 'File', cell: (row) => <span className="font-semibold">{row.fileName}</span> },
  { id: 'kind', title: 'Kind', cell: (row) => (row.kind === 'workbook' ? 'workbook' : 'photograph') },
  { id: 'revision', title: 'Revision', figures: true, cell: (row) => row.revision },
  { id: 'n', title: 'Upload', figures: true, cell: (row) => row.n },
  {
    id: 'at',
    title: 'Handed in',
    cell: (row) => (
      <span className="whitespace-nowrap">
        <Moment at={row.at} />
      </span>
    ),
  },
  { id: 'by', title: 'By', cell: (row) => row.by },
  {
    id: 'sha',
    title: 'SHA-256',
    cell: (row) => (
      <span title={row.sha256} className="text-muted">
        {row.sha256.slice(0, 12)}…
      </span>
    ),
  },
];

/** Every file handed in, replaced ones too: nothing is overwritten. */
export function FilesPanel({ batchId }: { batchId: string }) {
  const inputs = useQuery(batchInputsQuery(batchId));
  if (inputs.isPending) return <Skeleton lines={4} />;
  if (inputs.isError) {
    return <ErrorState error={inputs.error} what="The list of files" onRetry={() => void inputs.refetch()} />;
  }
  if (inputs.data.length === 0) {
    return (
      <EmptyState title="Nothing was handed in yet">
        Each file that is handed in is kept and listed here.
      </EmptyState>
    );
  }
  return (
    <PlainTable caption="Files handed in" rows={inputs.data} rowKey={(row) => row.id} columns={COLUMNS} />
  );
}
