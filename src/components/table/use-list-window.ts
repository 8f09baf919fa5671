import { useWindowVirtualizer } from '@tanstack/react-virtual';
import { useEffect, useLayoutEffect, useRef, useState, type RefObject } from 'react';

/** Height of the page's header and of the list's own head, both of which stay in sight. */
const STICKY_PX = 84;

/** Which rows are in the window: a list of any length draws a few dozen. */
export function useListWindow(options: {
  readonly body: RefObject<HTMLDivElement | null>;
  readonly count: number;
  readonly rowHeight: number;
  readonly keyOf: (index: number) => string;
  readonly onNearEnd: (() => void) | null;
}) {
  const { body, count, rowHeight, keyOf, onNearEnd } = options;
  const [margin, setMargin] = useState(0);
  // What stands above the list (charts, callouts) may grow after the first paint.
  useLayoutEffect(() => {
    const top = body.current?.getBoundingClientRect().top ?? 0;
    setMargin(Math.round(top + globalThis.scrollY));
  }, [body, count]);
  // oxlint-disable-next-line react/incompatible-library -- nothing here is memoized by a compiler
  const virtualizer = useWindowVirtualizer({
    count,
    estimateSize: () => rowHeight,
    getItemKey: keyOf,
    overscan: 12,
    scrollMargin: margin,
    scrollPaddingStart: STICKY_PX,
    scrollPaddingEnd: 48,
  });
  const items = virtualizer.getVirtualItems();
  const last = items.at(-1)?.index ?? -1;
  const more = useRef(onNearEnd);
  useEffect(() => {
    more.current = onNearEnd;
  });
  useEffect(() => {
    if (count > 0 && last >= count - 20) more.current?.();
  }, [last, count]);
  return { virtualizer, items, margin };
}

export type ListWindow = ReturnType<typeof useListWindow>;
