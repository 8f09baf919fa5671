import { gridTracks, type DataColumn } from '#src/components/table/columns.ts';
import { unitWord } from '#shared/units/format-quantity.ts';
import { classNames } from '#src/lib/class-names.ts';
import type { Sort } from '#src/lib/filters/filter-params.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';

type Props<Row> = {
  readonly columns: readonly DataColumn<Row>[];
  readonly sort: Sort | null;
  readonly onSort?: (key: string) => void;
};

/** The head stays below the page's header; heavier ink line under it. */
export function ListHead<Row>({ columns, sort, onSort }: Props<Row>) {
  const metric = useUnitSystem() === 'metric';
  return (
    <div role="rowgroup" className="sticky top-band z-10 bg-paper print:static">
      <div
        role="row"
        aria-rowindex={1}
        style={{ gridTemplateColumns: gridTracks(columns) }}
        className="grid gap-x-5 border-b-[1.5px] border-ink px-gutter"
      >
        {columns.map((column) => {
          const active = column.sort !== undefined && sort?.key === column.sort ? sort : null;
          return (
            <div
              key={column.id}
              role="columnheader"
              aria-sort={active ? (active.descending ? 'descending' : 'ascending') : undefined}
              className={classNames(
                'flex min-h-8.5 min-w-0 items-center py-1 text-table font-semibold text-ink-2',
                column.figures && 'justify-end text-right',
              )}
            >
              <HeadLabel
                text={column.unit ? `${column.title}, ${unitWord(column.unit, { metric })}` : column.title}
                active={active}
                onSort={column.sort && onSort ? () => onSort(column.sort ?? '') : null}
              />
            </div>
          );
        })}
      </div>
    </div>
  );
}

type LabelProps = {
  readonly text: string;
  readonly active: Sort | null;
  readonly onSort: (() => void) | null;
};

function HeadLabel({ text, active, onSort }: LabelProps) {
  if (!onSort) return <span className="truncate">{text}</span>;
  return (
    <button
      type="button"
      onClick={onSort}
      className="inline-flex min-h-6 min-w-0 items-center gap-1.5 hover:text-ink"
    >
      <span className="truncate">{text}</span>
      <svg
        viewBox="0 0 8 10"
        width="8"
        height="10"
        aria-hidden="true"
        className={classNames('shrink-0', active ? 'fill-ink' : 'fill-hairline')}
      >
        {active?.descending ? null : <path d="M4 0 7.5 4.2H.5Z" />}
        {active && !active.descending ? null : <path d="M4 10 .5 5.8h7Z" />}
      </svg>
    </button>
  );
}
