import { Moment } from '#src/components/ui/moment.tsx';
import type { HistoryEntry } from '#shared/generated/api-types.ts';

/** What became of a line over all its revisions, oldest first. */
export function HistoryList({ entries }: { entries: readonly HistoryEntry[] }) {
  return (
    <ol className="text-table">
      {entries.map((entry) => (
        <li
          key={`${entry.at} ${entry.title} ${entry.revision} ${entry.detail}`}
          className="grid grid-cols-[9.5rem_minmax(0,1fr)] gap-x-4 border-b border-hairline px-gutter py-1.5 max-sm:grid-cols-1"
        >
          <span className="text-muted">
            <Moment at={entry.at} />
          </span>
          <span>
            <span className="font-semibold">{entry.title}</span>
            <span className="text-ink-2">
              {entry.revision === null ? '' : `, revision ${entry.revision}`}
              {entry.by ? `, ${entry.by}` : ''}
            </span>
            {entry.detail ? <span className="block text-ink-2">{entry.detail}</span> : null}
          </span>
        </li>
      ))}
    </ol>
  );
}
