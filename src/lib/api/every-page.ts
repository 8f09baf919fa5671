import { api, type ApiOptions } from '#src/lib/api/client.ts';
import type { Page } from '#src/lib/api/use-keyset-list.ts';

/** All rows of a list that is worked on as a whole (the lines of one batch), page after page. */
export async function everyPage<Row>(
  path: string,
  options: { readonly query?: ApiOptions['query']; readonly signal?: AbortSignal } = {},
): Promise<readonly Row[]> {
  const found: Row[] = [];
  let cursor: string | null = null;
  do {
    const page: Page<Row> = await api<Page<Row>>(path, {
      query: { ...options.query, limit: 200, cursor },
      signal: options.signal,
    });
    found.push(...page.items);
    cursor = page.nextCursor;
  } while (cursor !== null);
  return found;
}
