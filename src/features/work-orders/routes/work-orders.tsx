import { useMemo, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { CreateOrderDialog } from '../components/create-order-dialog.tsx';
import { ORDER_COLUMNS } from '../components/order-columns.tsx';
import { ColumnChooser } from '#src/components/table/column-chooser.tsx';
import { DataList } from '#src/components/table/data-list.tsx';
import { useColumns } from '#src/components/table/use-columns.ts';
import { Button } from '#src/components/ui/button.tsx';
import { DocumentTitle } from '#src/components/ui/document-title.tsx';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { Fact, PageBand } from '#src/components/ui/page-band.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { paths } from '#src/config/paths.ts';
import { useKeysetList } from '#src/lib/api/use-keyset-list.ts';
import { counted } from '#src/lib/formats.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import { useUser } from '#src/lib/session/session.ts';
import type { WorkOrder } from '#shared/generated/api-types.ts';

export function Component() {
  const own = useUser().role === 'contractor';
  const mayCreate = useCan('create', 'WorkOrder');
  const [creating, setCreating] = useState(false);
  const navigate = useNavigate();
  const list = useKeysetList<WorkOrder>({ key: 'work-orders', path: '/api/work-orders' });
  // An open batch is its contractor's to continue; the owner's people see the orders of all.
  const offered = useMemo(
    () => ORDER_COLUMNS.filter((column) => column.id !== (own ? 'contractor' : 'open')),
    [own],
  );
  const columns = useColumns<WorkOrder>({
    columns: offered,
    rows: list.rows,
    rowKey: (row) => row.id,
    storageKey: 'work-orders',
  });
  return (
    <>
      <DocumentTitle>Work orders</DocumentTitle>
      <PageBand
        title="Work orders"
        facts={list.total === null ? null : <Fact>{counted(list.total, 'work order')}</Fact>}
        actions={
          <>
            <ColumnChooser {...columns} columns={offered} />
            {mayCreate ? (
              <Button kind="primary" onClick={() => setCreating(true)}>
                New work order…
              </Button>
            ) : null}
          </>
        }
      />
      <DataList
        label="Work orders"
        list={list}
        columns={columns}
        rowTo={(row) => paths.workOrder.to(row.id)}
        empty={
          <EmptyState title="No work orders yet">
            {own
              ? 'The owner lets a work order to you; it appears here with its design list.'
              : 'An administrator creates them, with the design list of structures.'}
          </EmptyState>
        }
      />
      <StatusBar
        left={list.total === null ? '' : `${list.rows.length} of ${list.total}`}
        keys={[
          { keys: ['J', 'K'], does: 'row' },
          { keys: ['Enter'], does: 'open' },
        ]}
      />
      {creating ? (
        <CreateOrderDialog
          onClose={() => setCreating(false)}
          onCreated={(id) => void navigate(paths.workOrder.to(id))}
        />
      ) : null}
    </>
  );
}
