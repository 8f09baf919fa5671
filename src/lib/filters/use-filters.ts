import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import {
  nextSort,
  parseSort,
  readFilters,
  sortText,
  writeFilters,
  type FilterValues,
  type Sort,
} from '#src/lib/filters/filter-params.ts';

export type Filters = {
  readonly values: FilterValues;
  readonly count: number;
  readonly set: (name: string, value: string | null) => void;
  readonly clear: () => void;
  readonly sort: Sort | null;
  /** For the query of a request: `-margin`. */
  readonly sortParam: string | null;
  readonly toggleSort: (key: string) => void;
};

const NO_KEYS: readonly string[] = [];

/** `names` and `sortKeys` must be constants outside the component. */
export function useFilters(names: readonly string[], sortKeys: readonly string[] = NO_KEYS): Filters {
  const [search, setSearch] = useSearchParams();
  const values = useMemo(() => readFilters(search, names), [search, names]);
  const sort = useMemo(() => parseSort(search.get('sort'), sortKeys), [search, sortKeys]);
  const change = useCallback(
    (changes: Record<string, string | null>) =>
      setSearch((current) => writeFilters(current, changes), { preventScrollReset: true }),
    [setSearch],
  );
  return {
    values,
    count: Object.keys(values).length,
    set: (name, value) => change({ [name]: value }),
    clear: () => change(Object.fromEntries(names.map((name) => [name, null]))),
    sort,
    sortParam: sortText(sort),
    toggleSort: (key) => change({ sort: sortText(nextSort(sort, key)) }),
  };
}
