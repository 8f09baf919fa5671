import { useState } from 'react';
import { DataList } from '#src/components/table/data-list.tsx';
import { FilterBar } from '#src/components/table/filter-bar.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { Button, ButtonLink } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { paths } from '#src/config/paths.ts';
import { useKeysetList } from '#src/lib/api/use-keyset-list.ts';
import { useContractorOptions, useWorkOrderOptions } from '#src/lib/filters/reference-options.ts';
import { useFilters } from '#src/lib/filters/use-filters.ts';
import { rowsText, totalText } from '#src/lib/formats-list.ts';
import { useHotkeys } from '#src/lib/use-hotkeys.ts';
import type { RegisterCandidate, RegisterEntriesReply } from '#shared/generated/api-types.ts';
import { CANDIDATE_COLUMNS, ChosenCandidates } from '../components/candidate-columns.tsx';
import { EnterDialog } from '../components/enter-dialog.tsx';
import { EnteredResult } from '../components/entered-result.tsx';
import { useCandidateSelection } from '../components/use-candidate-selection.ts';

const FILTERS = ['workOrder', 'contractor'] as const;
const KEYS = [
  { keys: ['J', 'K'], does: 'row' },
  { keys: ['X'], does: 'tick' },
  { keys: ['A'], does: 'all or none' },
  { keys: ['E'], does: 'enter' },
] as const;

/** Approved lines that wait for the clerk. */
export function Component() {
  const filters = useFilters(FILTERS);
  const workOrders = useWorkOrderOptions();
  const contractors = useContractorOptions() ?? [];
  const [asking, setAsking] = useState(false);
  const [reply, setReply] = useState<RegisterEntriesReply | null>(null);
  const list = useKeysetList<RegisterCandidate>({
    key: 'register-candidates',
    path: '/api/register/candidates',
    query: filters.values,
    limit: 200,
  });
  const columns = useColumns({
    columns: CANDIDATE_COLUMNS,
    rows: list.rows,
    rowKey: (row) => row.recordId,
    storageKey: 'register-candidates',
  });
  const { selection, toggle, chosen, all, none } = useCandidateSelection(list.rows);
  const everyOne = chosen.length > 0 && chosen.length === list.rows.length;
  const allOrNone = everyOne ? none : all;
  const ask = () => chosen.length > 0 && setAsking(true);
  useHotkeys({ a: allOrNone, e: () => void ask() });

  return (
    <ChosenCandidates value={{ selection, toggle }}>
      <DocumentTitle>Enter approved lines</DocumentTitle>
      <PageBand
        title="Enter approved lines"
        facts={
          <>
            <Fact>
              <b>{totalText(list)}</b> wait
            </Fact>
            <Fact>
              <b>{chosen.length}</b> ticked
            </Fact>
          </>
        }
        actions={
          <>
            <Button size="small" hotkey="A" disabled={list.rows.length === 0} onClick={allOrNone}>
              {everyOne ? 'Tick none' : 'Tick all'}
            </Button>
            <Button kind="primary" size="small" hotkey="E" disabled={chosen.length === 0} onClick={ask}>
              Enter…
            </Button>
          </>
        }
      />
      <FilterBar
        filters={filters}
        define={[
          { name: 'workOrder', label: 'Work order', any: 'all', options: workOrders },
          { name: 'contractor', label: 'Contractor', any: 'all', options: contractors },
        ]}
      />
      {reply ? <EnteredResult reply={reply} /> : null}
      <DataList
        label="Approved lines that wait for the register"
        list={list}
        columns={columns}
        rowKeys={{
          x: (row) => toggle(row.recordId),
          'shift+x': (row) => toggle(row.recordId, { through: true }),
        }}
        empty={
          filters.count > 0 ? (
            <EmptyState
              title="No line waits here"
              action={<Button onClick={filters.clear}>Clear the filters</Button>}
            >
              Lines of other work orders or contractors may wait.
            </EmptyState>
          ) : (
            <EmptyState
              title="No approved line waits"
              action={<ButtonLink to={paths.register.to()}>Go to the register</ButtonLink>}
            >
              Lines come here when an inspector closes a review. Every line approved so far is on record.
            </EmptyState>
          )
        }
      />
      <StatusBar left={rowsText(list)} keys={KEYS} />
      <EnterDialog
        chosen={chosen}
        open={asking}
        onOpenChange={setAsking}
        onEntered={(entered) => {
          setReply(entered);
          setAsking(false);
          none();
        }}
      />
    </ChosenCandidates>
  );
}
