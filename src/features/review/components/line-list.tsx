import { useVirtualizer } from '@tanstack/react-virtual';
import { useEffect, useRef } from 'react';
import { LineButton, WholeBatchButton } from '#src/features/review/components/line-button.tsx';
import { WHOLE_BATCH } from '#src/features/review/desk/use-place.ts';
import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';

type Props = {
  readonly lines: readonly RecordRow[];
  readonly selected: string | null;
  readonly onSelect: (id: string) => void;
  /** Findings that belong to no line; they have an entry of their own above the lines. */
  readonly ownFindings: readonly FindingRow[];
};

const ROW_PX = 33;

/** Lines of the batch; a window of them is drawn. */
export function LineList({ lines, selected, onSelect, ownFindings }: Props) {
  const frame = useRef<HTMLDivElement>(null);
  // oxlint-disable-next-line react/incompatible-library -- nothing here is memoized by a compiler
  const virtualizer = useVirtualizer({
    count: lines.length,
    getScrollElement: () => frame.current,
    estimateSize: () => ROW_PX,
    getItemKey: (index) => lines[index]?.id ?? index,
    overscan: 12,
  });
  const at = lines.findIndex((line) => line.id === selected);
  useEffect(() => {
    if (at >= 0) virtualizer.scrollToIndex(at, { align: 'auto' });
  }, [at, virtualizer]);
  return (
    <div className="flex min-h-0 flex-1 flex-col">
      {ownFindings.length > 0 ? (
        <WholeBatchButton
          findings={ownFindings}
          current={selected === WHOLE_BATCH}
          onSelect={() => onSelect(WHOLE_BATCH)}
        />
      ) : null}
      {lines.length === 0 ? (
        <p className="px-3 py-4 text-table text-ink-2">No line is under this tab.</p>
      ) : null}
      <div ref={frame} className="min-h-0 flex-1 overflow-y-auto">
        <ul aria-label="Lines" className="relative" style={{ height: virtualizer.getTotalSize() }}>
          {virtualizer.getVirtualItems().map((item) => {
            const line = lines[item.index];
            return line ? (
              <li
                key={item.key}
                ref={virtualizer.measureElement}
                data-index={item.index}
                aria-posinset={item.index + 1}
                aria-setsize={lines.length}
                className="absolute inset-x-0 top-0"
                style={{ transform: `translateY(${item.start}px)` }}
              >
                <LineButton line={line} current={line.id === selected} onSelect={() => onSelect(line.id)} />
              </li>
            ) : null;
          })}
        </ul>
      </div>
    </div>
  );
}
