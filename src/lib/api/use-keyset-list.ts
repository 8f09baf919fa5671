import { keepPreviousData, useInfiniteQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { api, type ApiOptions } from '#src/lib/api/client.ts';

export type Page<Row> = {
  readonly items: readonly Row[];
  readonly nextCursor: string | null;
  readonly total: number | null;
};

export type KeysetList<Row> = {
  readonly rows: readonly Row[];
  /** Null: the server did not count. */
  readonly total: number | null;
  readonly isPending: boolean;
  /** The rows shown belong to the filters before: new ones are on their way. */
  readonly isStale: boolean;
  readonly error: Error | null;
  readonly hasMore: boolean;
  readonly isLoadingMore: boolean;
  readonly loadMore: () => void;
  readonly refetch: () => void;
};

/** A list by keyset pages; rows before stay while other filters load. */
export function useKeysetList<Row>(request: {
  readonly key: string;
  readonly path: string;
  readonly query?: ApiOptions['query'];
  readonly limit?: number;
}): KeysetList<Row> {
  const { key, path, query, limit = 100 } = request;
  const list = useInfiniteQuery({
    queryKey: [key, 'list', query ?? {}],
    queryFn: ({ pageParam, signal }) =>
      api<Page<Row>>(path, { query: { ...query, limit, cursor: pageParam }, signal }),
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.nextCursor,
    placeholderData: keepPreviousData,
  });
  const rows = useMemo(() => list.data?.pages.flatMap((page) => page.items) ?? [], [list.data]);
  return {
    rows,
    total: list.data?.pages[0]?.total ?? null,
    isPending: list.isPending,
    isStale: list.isPlaceholderData,
    error: list.error,
    hasMore: list.hasNextPage,
    isLoadingMore: list.isFetchingNextPage,
    loadMore: () => void list.fetchNextPage(),
    refetch: () => void list.refetch(),
  };
}
