import type { UseQueryResult } from '@tanstack/react-query';
import { ChangesPanel } from './changes-panel.tsx';
import { FilesPanel } from './files-panel.tsx';
import { FirstSteps } from './first-steps.tsx';
import { LinesPanel } from './lines-panel.tsx';
import { PhotosPanel } from './photos-panel.tsx';
import { ReturnedPanel } from './returned-panel.tsx';
import type { BatchView } from '../lib/line-view.ts';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { Tabs } from '#src/components/ui/tabs.tsx';
import type { Filters } from '#src/lib/filters/use-filters.ts';
import type { Batch, FindingRow, RecordRow } from '#shared/generated/api-types.ts';

const TABS = ['returned', 'lines', 'photos', 'changes', 'files'] as const;
export type BatchTab = (typeof TABS)[number];

/** The tab of the address; without one, what wants attention first. */
export function readTab(text: string | null, batch: { returned: boolean; checked: boolean }): BatchTab {
  const chosen = TABS.find((one) => one === text);
  if (chosen && (chosen !== 'returned' || batch.returned)) return chosen;
  return batch.returned && !batch.checked ? 'returned' : 'lines';
}

type Props = {
  readonly tab: BatchTab;
  readonly onTab: (tab: BatchTab) => void;
  readonly batch: Batch;
  readonly revision: number | null;
  /** Lines came back and wait for their next revision. */
  readonly returned: boolean;
  readonly view: BatchView;
  readonly queries: {
    readonly lines: UseQueryResult<readonly RecordRow[]>;
    readonly findings: UseQueryResult<readonly FindingRow[]>;
  };
  readonly filters: Filters;
  readonly onPhotograph: (file: File, name: string) => void;
};

export function BatchTabs(props: Props) {
  const { tab, onTab, batch, returned, view } = props;
  const tabs = [
    ...(returned ? [{ value: 'returned' as const, label: 'Came back' }] : []),
    { value: 'lines' as const, label: 'Lines', count: view.lines.length },
    { value: 'photos' as const, label: 'Photographs', count: batch.counts.photos },
    { value: 'changes' as const, label: 'What changed' },
    { value: 'files' as const, label: 'Files' },
  ];
  return (
    <Tabs label="Batch" value={tab} onChange={onTab} tabs={tabs}>
      <Panel {...props} />
    </Tabs>
  );
}

function Panel({ tab, batch, revision, view, queries, filters, onPhotograph }: Props) {
  const newest = revision === null;
  const actions = { batchId: batch.id, open: newest && batch.can.includes('upload'), onPhotograph };
  if (tab === 'files') return <FilesPanel batchId={batch.id} />;
  if (tab === 'changes') return <ChangesPanel batchId={batch.id} />;
  if (tab === 'returned') return <ReturnedPanel batch={batch} {...actions} />;
  const { lines, findings } = queries;
  const error = lines.error ?? findings.error;
  if (error && !lines.data) {
    return (
      <ErrorState
        error={error}
        what="The lines"
        onRetry={() => void Promise.all([lines.refetch(), findings.refetch()])}
      />
    );
  }
  if (!lines.data || !findings.data) return <Skeleton lines={8} />;
  if (tab === 'photos') return <PhotosPanel batch={batch} records={lines.data} />;
  if (view.lines.length === 0 && view.loose.length === 0) return <FirstSteps batch={batch} />;
  return <LinesPanel view={view} filters={filters} decided={!newest || isHandedIn(batch)} {...actions} />;
}

const isHandedIn = ({ status }: Batch): boolean =>
  status !== 'draft' && status !== 'checking' && status !== 'checked';
