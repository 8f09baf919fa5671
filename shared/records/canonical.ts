/** JSON with sorted keys: equal for equal content, whatever order it was read in. */
export const canonical = (value: unknown): string => {
  if (Array.isArray(value)) return `[${value.map(canonical).join(',')}]`;
  if (value !== null && typeof value === 'object') {
    const entries = Object.entries(value).toSorted(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0));
    return `{${entries.map(([key, one]) => `${JSON.stringify(key)}:${canonical(one)}`).join(',')}}`;
  }
  return (
    JSON.stringify(typeof value === 'number' && !Number.isFinite(value) ? String(value) : value) ?? 'null'
  );
};

/** Text order by code unit: the same in every locale. */
export const byText = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);
