import type { ReactNode } from 'react';
import { classNames } from '#src/lib/class-names.ts';

export type PlainColumn<Row> = {
  readonly id: string;
  readonly title: string;
  readonly figures?: boolean;
  readonly cell: (row: Row) => ReactNode;
};

type Props<Row> = {
  /** Said to screen readers. */
  readonly caption: string;
  readonly columns: readonly PlainColumn<Row>[];
  readonly rows: readonly Row[];
  readonly rowKey: (row: Row) => string;
};

/** A short table that stands whole on the page (measurements, versions, pours). Scrolls sideways inside itself when narrow. */
export function PlainTable<Row>({ caption, columns, rows, rowKey }: Props<Row>) {
  return (
    // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex -- what scrolls must be reachable by keyboard
    <div role="region" aria-label={caption} tabIndex={0} className="overflow-x-auto">
      <table className="w-full border-collapse text-table">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="border-b-[1.5px] border-ink">
            {columns.map((column) => (
              <th
                key={column.id}
                scope="col"
                className={classNames(
                  'px-2 py-1.5 font-semibold whitespace-nowrap text-ink-2 first:pl-gutter last:pr-gutter',
                  column.figures ? 'text-right' : 'text-left',
                )}
              >
                {column.title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)} className="border-b border-hairline">
              {columns.map((column) => (
                <td
                  key={column.id}
                  className={classNames(
                    'px-2 py-1.5 align-baseline first:pl-gutter last:pr-gutter',
                    column.figures && 'text-right whitespace-nowrap',
                  )}
                >
                  {column.cell(row)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
