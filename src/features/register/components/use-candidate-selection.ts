import { useCallback, useMemo, useState } from 'react';
import type { RegisterCandidate } from '#shared/generated/api-types.ts';
import { toggled, toggledThrough, type Selection } from './selection.ts';

const NONE: Selection = new Set();

/** Which candidates are ticked. Rows that left the list (entered by a colleague, filtered away) are not among `chosen`. */
export function useCandidateSelection(rows: readonly RegisterCandidate[]) {
  const [selection, setSelection] = useState<Selection>(NONE);
  const [anchor, setAnchor] = useState<string | null>(null);
  const order = useMemo(() => rows.map((row) => row.recordId), [rows]);
  const toggle = useCallback(
    (id: string, { through = false } = {}) => {
      setSelection((current) =>
        through ? toggledThrough(current, { order, anchor, id }) : toggled(current, id),
      );
      setAnchor(id);
    },
    [order, anchor],
  );
  return {
    selection,
    toggle,
    chosen: rows.filter((row) => selection.has(row.recordId)),
    all: () => setSelection(new Set(order)),
    none: () => setSelection(NONE),
  };
}
