import { useMemo } from 'react';
import { groupNotRun } from '../lib/not-run-words.ts';
import type { NotRun as Entry } from '#src/workers/check/protocol.ts';

/** What the server will look at besides. */
export function NotRun({ notRun }: { notRun: readonly Entry[] }) {
  const groups = useMemo(() => groupNotRun(notRun), [notRun]);
  if (groups.length === 0) return null;
  return (
    <details className="border-b border-hairline px-gutter py-3 text-table">
      <summary className="cursor-pointer font-semibold pointer-coarse:min-h-11">
        Not looked at here ({notRun.length})
      </summary>
      <dl className="mt-2 grid gap-2">
        {groups.map(({ reason, titles }) => (
          <div key={reason}>
            <dt className="text-ink-2">{reason}:</dt>
            <dd className="text-muted">{titles.join(', ')}</dd>
          </div>
        ))}
      </dl>
    </details>
  );
}
