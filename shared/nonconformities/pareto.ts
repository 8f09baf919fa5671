export type ParetoRow<T> = T & { readonly share: number; readonly running: number };

/** Causes by falling count, ties by name, each with its share of all and the running share. */
export function pareto<T extends { readonly count: number; readonly title: string }>(
  causes: readonly T[],
): ParetoRow<T>[] {
  const all = causes.reduce((sum, cause) => sum + cause.count, 0);
  let counted = 0;
  return causes
    .toSorted((a, b) => b.count - a.count || (a.title < b.title ? -1 : a.title > b.title ? 1 : 0))
    .map((cause) => {
      counted += cause.count;
      return { ...cause, share: all > 0 ? cause.count / all : 0, running: all > 0 ? counted / all : 0 };
    });
}
