import { useLayoutEffect, useRef, useState, type ReactNode } from 'react';
import { PlainCards } from '#src/components/table/plain-cards.tsx';
import { classNames } from '#src/lib/class-names.ts';
import { useWidth } from '#src/lib/use-width.ts';

export type PlainColumn<Row> = {
  readonly id: string;
  readonly title: string;
  readonly figures?: boolean;
  readonly cell: (row: Row) => ReactNode;
};

export type PlainTableProps<Row> = {
  /** Said to screen readers. */
  readonly caption: string;
  readonly columns: readonly PlainColumn<Row>[];
  readonly rows: readonly Row[];
  readonly rowKey: (row: Row) => string;
};

/** A short table that stands whole on the page (measurements, versions, pours); cards where it is wider than its place. */
export function PlainTable<Row>({ caption, columns, rows, rowKey }: PlainTableProps<Row>) {
  const frame = useRef<HTMLDivElement>(null);
  const width = useWidth(frame);
  // What the table took when it did not fit: it comes back where there is that much again.
  const [needed, setNeeded] = useState(0);
  const cards = width > 0 && needed > width;
  useLayoutEffect(() => {
    const place = frame.current;
    const table = place?.firstElementChild;
    if (!place || !table || cards) return undefined;
    const observer = new ResizeObserver(() => {
      if (place.scrollWidth > place.clientWidth) setNeeded(place.scrollWidth);
    });
    observer.observe(place);
    observer.observe(table);
    return () => observer.disconnect();
  }, [cards]);
  if (cards)
    return (
      <div ref={frame}>
        <PlainCards caption={caption} columns={columns} rows={rows} rowKey={rowKey} />
      </div>
    );
  return (
    <div ref={frame} className="overflow-x-auto">
      <table className="w-full border-collapse text-table">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="border-b-[1.5px] border-ink">
            {columns.map((column) => (
              <th
                key={column.id}
                scope="col"
                className={classNames(
                  'px-2 py-1.5 font-semibold whitespace-nowrap text-ink-2 first:pl-gutter last:pr-gutter max-sm:px-1.5',
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
                    'px-2 py-1.5 align-baseline first:pl-gutter last:pr-gutter max-sm:px-1.5',
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
