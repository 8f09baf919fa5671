import { useRef, useState, type ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';
import { columnsFit } from '#src/components/table/columns.ts';
import { ListCard, ListRow } from '#src/components/table/list-row.tsx';
import { ListHead } from '#src/components/table/list-head.tsx';
import type { useColumns } from '#src/components/table/use-columns.ts';
import { useListWindow } from '#src/components/table/use-list-window.ts';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import type { KeysetList } from '#src/lib/api/use-keyset-list.ts';
import { classNames } from '#src/lib/class-names.ts';
import type { Filters } from '#src/lib/filters/use-filters.ts';
import { useHotkeys } from '#src/lib/use-hotkeys.ts';
import { useWidth } from '#src/lib/use-width.ts';

type Props<Row extends object> = {
  readonly label: string;
  readonly list: KeysetList<Row>;
  /** From `useColumns`, shared with a `ColumnChooser`. */
  readonly columns: ReturnType<typeof useColumns<Row>>;
  readonly rowTo?: (row: Row) => string;
  /** Further keys that act on the row one stands on; `enter` here goes before `rowTo`. */
  readonly rowKeys?: Readonly<Record<string, (row: Row) => void>>;
  readonly filters?: Filters;
  /** An EmptyState that says what to do next. */
  readonly empty: ReactNode;
};

/** A list of any length: sticky head, window of rows, J / K / Enter, cards where the columns do not fit. */
export function DataList<Row extends object>({
  label,
  list,
  columns,
  rowTo,
  rowKeys = {},
  filters,
  empty,
}: Props<Row>) {
  const frame = useRef<HTMLDivElement>(null);
  const body = useRef<HTMLDivElement>(null);
  const width = useWidth(frame);
  const cards = width > 0 && !columnsFit(columns.visible, width);
  const [active, setActive] = useState(-1);
  const navigate = useNavigate();
  const { rows } = columns;
  const { virtualizer, items, margin } = useListWindow({
    body,
    count: rows.length,
    rowHeight: cards ? 140 : 33,
    keyOf: (index) => rows[index]?.id ?? String(index),
    onNearEnd: list.hasMore && !list.isLoadingMore ? list.loadMore : null,
  });

  function move(step: number): void {
    const next = Math.max(0, Math.min(rows.length - 1, active + step));
    setActive(next);
    virtualizer.scrollToIndex(next);
    // Enter is for the row now, not for a button that was used before.
    const focused = document.activeElement;
    if (focused instanceof HTMLElement && !body.current?.contains(focused)) focused.blur();
  }
  useHotkeys({
    j: () => move(1),
    k: () => move(-1),
    enter: () => {
      const row = rows[active];
      if (row && rowTo) void navigate(rowTo(row.original));
    },
    ...Object.fromEntries(
      Object.entries(rowKeys).map(([key, act]) => [
        key,
        () => {
          const row = rows[active];
          if (row) act(row.original);
        },
      ]),
    ),
  });

  const Row: typeof ListRow<Row> = cards ? ListCard : ListRow;
  return (
    <div ref={frame} className="flex flex-1 flex-col">
      {list.error && rows.length === 0 ? (
        <ErrorState
          error={list.error}
          what="The list"
          onRetry={list.refetch}
          onClear={filters && filters.count > 0 ? filters.clear : undefined}
        />
      ) : null}
      {list.isPending ? <Skeleton lines={12} /> : null}
      {!list.isPending && !list.error && rows.length === 0 ? empty : null}
      {rows.length > 0 ? (
        <div
          role="table"
          aria-label={label}
          aria-rowcount={list.total === null ? -1 : list.total + 1}
          aria-busy={list.isStale}
          className={classNames(list.isStale && 'opacity-60')}
        >
          {cards ? null : (
            <ListHead<Row>
              columns={columns.visible}
              sort={filters?.sort ?? null}
              onSort={filters?.toggleSort}
            />
          )}
          <div
            ref={body}
            role="rowgroup"
            className="relative print:h-auto!"
            style={{ height: virtualizer.getTotalSize() }}
          >
            {items.map((item) => {
              const row = rows[item.index];
              return row ? (
                <div
                  key={item.key}
                  ref={virtualizer.measureElement}
                  data-index={item.index}
                  role="row"
                  aria-rowindex={item.index + 2}
                  aria-current={item.index === active ? 'true' : undefined}
                  onFocus={() => setActive(item.index)}
                  // On paper the rows take the heights that they have there.
                  className="absolute inset-x-0 top-0 print:static! print:transform-none!"
                  style={{ transform: `translateY(${item.start - margin}px)` }}
                >
                  <Row
                    row={row.original}
                    columns={columns.visible}
                    active={item.index === active}
                    to={rowTo ? rowTo(row.original) : null}
                  />
                </div>
              ) : null;
            })}
          </div>
        </div>
      ) : null}
      {list.isLoadingMore ? <Skeleton lines={2} label="Loading more rows" /> : null}
      {list.error && rows.length > 0 ? (
        <ErrorState error={list.error} what="The next rows" onRetry={list.loadMore} />
      ) : null}
    </div>
  );
}
