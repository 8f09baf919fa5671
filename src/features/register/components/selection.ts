export type Selection = ReadonlySet<string>;

export function toggled(selection: Selection, id: string): Selection {
  const next = new Set(selection);
  if (!next.delete(id)) next.add(id);
  return next;
}

/** All rows between the last one touched and this one take this one's new state, as with Shift in any list. */
export function toggledThrough(
  selection: Selection,
  { order, anchor, id }: { order: readonly string[]; anchor: string | null; id: string },
): Selection {
  const from = anchor === null ? -1 : order.indexOf(anchor);
  const to = order.indexOf(id);
  if (from < 0 || to < 0) return toggled(selection, id);
  const next = new Set(selection);
  const add = !selection.has(id);
  for (const one of order.slice(Math.min(from, to), Math.max(from, to) + 1)) {
    if (add) next.add(one);
    else next.delete(one);
  }
  return next;
}
