import { useRef, useState } from 'react';
import type { FindingActions } from './finding-item.tsx';
import { LineItem } from './line-item.tsx';
import type { LineView } from '../lib/line-view.ts';
import { useListWindow } from '#src/components/table/use-list-window.ts';
import { WindowList } from '#src/components/table/window-list.tsx';
import { useHotkeys } from '#src/lib/use-hotkeys.ts';

type Props = FindingActions & { readonly lines: readonly LineView[]; readonly decided: boolean };

/** The lines that passed the filters; only those in the window are drawn. J and K go from line to line. */
export function LineList({ lines, ...rest }: Props) {
  const body = useRef<HTMLDivElement>(null);
  const [active, setActive] = useState(-1);
  const window = useListWindow({
    body,
    count: lines.length,
    rowHeight: 120,
    keyOf: (index) => lines[index]?.record.id ?? String(index),
    onNearEnd: null,
  });
  function move(step: number): void {
    const next = Math.max(0, Math.min(lines.length - 1, active + step));
    setActive(next);
    window.virtualizer.scrollToIndex(next);
  }
  useHotkeys({ j: () => move(1), k: () => move(-1) });
  return (
    <WindowList label="Lines" body={body} window={window} rows={lines} active={active}>
      {(line, index) => (
        <LineItem line={line} active={index === active} onActive={() => setActive(index)} {...rest} />
      )}
    </WindowList>
  );
}
