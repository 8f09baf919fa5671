import type { PlainTableProps } from '#src/components/table/plain-table.tsx';

/** The same table where it does not fit: the first column heads a card, the others are named values. */
export function PlainCards<Row>({ caption, columns, rows, rowKey }: PlainTableProps<Row>) {
  const [main, ...others] = columns;
  return (
    <div role="table" aria-label={caption} className="text-table">
      {rows.map((row) => (
        <div key={rowKey(row)} role="row" className="border-b border-hairline px-gutter py-2.5">
          {main ? (
            <div role="cell" className="font-semibold">
              {main.figures ? <span className="text-small font-normal text-muted">{main.title} </span> : null}
              {main.cell(row)}
            </div>
          ) : null}
          <div
            role="presentation"
            className="mt-0.5 grid grid-cols-[repeat(auto-fill,minmax(9rem,1fr))] gap-x-4 gap-y-1"
          >
            {others.map((column) => (
              <div key={column.id} role="cell" className="min-w-0">
                <span className="block text-small text-muted">{column.title}</span>
                <span className="block break-words [&_*]:whitespace-normal">{column.cell(row)}</span>
              </div>
            ))}
          </div>
        </div>
      ))}
    </div>
  );
}
