import { useRef, useState } from 'react';
import type { FindingActions } from './finding-item.tsx';
import { LineItem } from './line-item.tsx';
import type { LineView } from '../lib/line-view.ts';
import { useListWindow } from '#src/components/table/use-list-window.ts';
import { useHotkeys } from '#src/lib/use-hotkeys.ts';

type Props = FindingActions & { readonly lines: readonly LineView[]; readonly decided: boolean };

/** The lines that passed the filters; only those in the window are drawn. J and K go from line to line. */
export function LineList({ lines, ...rest }: Props) {
  const body = useRef<HTMLDivElement>(null);
  const [active, setActive] = useState(-1);
  const { virtualizer, items, margin } = useListWindow({
    body,
    count: lines.length,
    rowHeight: 120,
    keyOf: (index) => lines[index]?.record.id ?? String(index),
    onNearEnd: null,
  });
  function move(step: number): void {
    const next = Math.max(0, Math.min(lines.length - 1, active + step));
    setActive(next);
    virtualizer.scrollToIndex(next);
  }
  useHotkeys({ j: () => move(1), k: () => move(-1) });
  return (
    <div
      ref={body}
      role="list"
      aria-label="Lines"
      className="relative"
      style={{ height: virtualizer.getTotalSize() }}
    >
      {items.map((item) => {
        const line = lines[item.index];
        return line ? (
          <div
            key={item.key}
            ref={virtualizer.measureElement}
            data-index={item.index}
            role="listitem"
            aria-setsize={lines.length}
            aria-posinset={item.index + 1}
            aria-current={item.index === active ? 'true' : undefined}
            className="absolute inset-x-0 top-0"
            style={{ transform: `translateY(${item.start - margin}px)` }}
          >
            <LineItem
              line={line}
              active={item.index === active}
              onActive={() => setActive(item.index)}
              {...rest}
            />
          </div>
        ) : null;
      })}
    </div>
  );
}
