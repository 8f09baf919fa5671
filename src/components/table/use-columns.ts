import {
  columnVisibilityFeature,
  tableFeatures,
  useTable,
  type ColumnVisibilityState,
} from '@tanstack/react-table';
import { useMemo } from 'react';
import type { DataColumn } from '#src/components/table/columns.ts';

const features = tableFeatures({ columnVisibilityFeature });
const PREFIX = 'upstand.columns.';

function chosen<Row>(columns: readonly DataColumn<Row>[], storageKey: string): ColumnVisibilityState {
  const visibility = Object.fromEntries(columns.map((column) => [column.id, !column.off]));
  try {
    const kept: unknown = JSON.parse(localStorage.getItem(PREFIX + storageKey) ?? 'null');
    if (typeof kept === 'object' && kept !== null) {
      for (const [id, shown] of Object.entries(kept)) {
        if (id in visibility && typeof shown === 'boolean') visibility[id] = shown;
      }
    }
  } catch {
    // Nothing kept, or kept by another version: the list's own choice stands.
  }
  return visibility;
}

/** Rows and columns of a list as a table model; which columns are shown is kept for this browser. */
export function useColumns<Row extends object>(options: {
  readonly columns: readonly DataColumn<Row>[];
  readonly rows: readonly Row[];
  readonly rowKey: (row: Row) => string;
  readonly storageKey: string;
}) {
  const { columns, rows, rowKey, storageKey } = options;
  const definitions = useMemo(
    () => columns.map((column) => ({ id: column.id, header: column.title, enableHiding: !column.main })),
    [columns],
  );
  const table = useTable({
    features,
    columns: definitions,
    data: rows as Row[],
    getRowId: rowKey,
    initialState: { columnVisibility: chosen(columns, storageKey) },
  });
  const visibleIds = new Set(table.getVisibleLeafColumns().map((column) => column.id));

  function toggle(id: string, shown: boolean): void {
    const next = { ...table.state.columnVisibility, [id]: shown };
    table.setColumnVisibility(next);
    try {
      localStorage.setItem(PREFIX + storageKey, JSON.stringify(next));
    } catch {
      // Storage is closed: the choice lasts as long as the page.
    }
  }

  return {
    rows: table.getRowModel().rows,
    visible: columns.filter((column) => visibleIds.has(column.id)),
    isVisible: (id: string) => visibleIds.has(id),
    toggle,
  };
}
