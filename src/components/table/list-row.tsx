import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { gridTracks, type DataColumn } from '#src/components/table/columns.ts';
import { classNames } from '#src/lib/class-names.ts';
import { unitWord } from '#shared/units/format-quantity.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';

type Props<Row> = {
  readonly row: Row;
  readonly columns: readonly DataColumn<Row>[];
  readonly active: boolean;
  /** Where the row leads: its main cell is a link. */
  readonly to: string | null;
};

export function ListRow<Row>({ row, columns, active, to }: Props<Row>) {
  return (
    <div
      style={{ gridTemplateColumns: gridTracks(columns) }}
      className={classNames(
        'grid min-h-8 items-center gap-x-5 border-b border-l-[3px] border-hairline pr-gutter pl-[calc(1.125rem-3px)] text-table hover:bg-sheet',
        active ? 'border-l-accent bg-sheet' : 'border-l-transparent',
      )}
    >
      {columns.map((column) => (
        <div
          key={column.id}
          role="cell"
          className={classNames(
            'line-clamp-3 min-w-0 print:line-clamp-none py-1 break-words [&_*]:whitespace-normal',
            column.figures && 'text-right',
            column.main && 'font-semibold',
          )}
        >
          <CellLink to={column.main ? to : null}>{column.cell(row)}</CellLink>
        </div>
      ))}
    </div>
  );
}

/** The same row on a narrow screen: the thing in bold, the rest as named values. */
export function ListCard<Row>({ row, columns, active, to }: Props<Row>) {
  const metric = useUnitSystem() === 'metric';
  const main = columns.find((column) => column.main);
  return (
    <div
      className={classNames(
        'border-b border-l-[3px] border-hairline py-3 pr-gutter pl-[calc(1.125rem-3px)] text-table',
        active ? 'border-l-accent bg-sheet' : 'border-l-transparent',
      )}
    >
      {main ? (
        <div role="cell" className="flex min-h-6 items-center text-lead font-semibold">
          <CellLink to={to}>{main.cell(row)}</CellLink>
        </div>
      ) : null}
      <div
        role="presentation"
        className="mt-0.5 grid grid-cols-[repeat(auto-fill,minmax(9rem,1fr))] gap-x-4 gap-y-1"
      >
        {columns
          .filter((column) => column !== main)
          .map((column) => (
            <div key={column.id} role="cell" className="min-w-0">
              <span className="block text-small text-muted">
                {column.unit ? `${column.title}, ${unitWord(column.unit, { metric })}` : column.title}
              </span>
              <span className="block break-words [&_*]:whitespace-normal">{column.cell(row)}</span>
            </div>
          ))}
      </div>
    </div>
  );
}

function CellLink({ to, children }: { to: string | null; children: ReactNode }) {
  if (to === null) return children;
  return (
    <Link
      to={to}
      className="inline-block max-w-full truncate align-bottom hover:underline pointer-coarse:py-2"
    >
      {children}
    </Link>
  );
}
