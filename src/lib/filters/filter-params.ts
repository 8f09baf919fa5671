/** Filters of a list live in the address, so that it can be sent to a colleague. A blank value is no filter. */
export type FilterValues = Readonly<Record<string, string>>;

export function readFilters(search: URLSearchParams, names: readonly string[]): FilterValues {
  const values: Record<string, string> = {};
  for (const name of names) {
    const value = search.get(name)?.trim();
    if (value) values[name] = value;
  }
  return values;
}

/** A new address with some filters changed; what else stands there stays, except the place in the old list. */
export function writeFilters(
  search: URLSearchParams,
  changes: Readonly<Record<string, string | null>>,
): URLSearchParams {
  const next = new URLSearchParams(search);
  next.delete('cursor');
  for (const [name, value] of Object.entries(changes)) {
    const text = value?.trim();
    if (text) next.set(name, text);
    else next.delete(name);
  }
  next.sort();
  return next;
}

export type Sort = { readonly key: string; readonly descending: boolean };

/** `-margin` -> margin, descending. A key that the list does not sort by is no sort. */
export function parseSort(text: string | null, keys: readonly string[]): Sort | null {
  if (!text) return null;
  const descending = text.startsWith('-');
  const key = descending ? text.slice(1) : text;
  return keys.includes(key) ? { key, descending } : null;
}

export function sortText(sort: Sort | null): string | null {
  return sort ? `${sort.descending ? '-' : ''}${sort.key}` : null;
}

/** Ascending, descending, then the list's own order again. */
export function nextSort(current: Sort | null, key: string): Sort | null {
  if (current?.key !== key) return { key, descending: false };
  return current.descending ? null : { key, descending: true };
}
