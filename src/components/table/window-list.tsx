import type { ReactNode, RefObject } from 'react';
import type { ListWindow } from './use-list-window.ts';

type Props<Row> = {
  readonly label: string;
  readonly body: RefObject<HTMLDivElement | null>;
  readonly window: ListWindow;
  readonly rows: readonly Row[];
  readonly active?: number;
  readonly children: (row: Row, index: number) => ReactNode;
};

/** A list of things of any height, of which only those in the window are drawn; its length and places are told. */
export function WindowList<Row>({ label, body, window, rows, active = -1, children }: Props<Row>) {
  const { virtualizer, items, margin } = window;
  return (
    <div
      ref={body}
      role="list"
      aria-label={label}
      className="relative"
      style={{ height: virtualizer.getTotalSize() }}
    >
      {items.map((item) => {
        const row = rows[item.index];
        return row === undefined ? null : (
          <div
            key={item.key}
            ref={virtualizer.measureElement}
            data-index={item.index}
            role="listitem"
            aria-setsize={rows.length}
            aria-posinset={item.index + 1}
            aria-current={item.index === active ? 'true' : undefined}
            className="absolute inset-x-0 top-0"
            style={{ transform: `translateY(${item.start - margin}px)` }}
          >
            {children(row, item.index)}
          </div>
        );
      })}
    </div>
  );
}
