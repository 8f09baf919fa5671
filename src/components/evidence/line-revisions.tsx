import { useQuery } from '@tanstack/react-query';
import { TextLink } from '#src/components/ui/text-link.tsx';
import { paths } from '#src/config/paths.ts';
import { lineRevisionsQuery } from '#src/lib/api/line-revisions.ts';
import type { Batch, RecordRow } from '#shared/generated/api-types.ts';

/** Where a line came back: the same line as it was handed in before and after. Nothing for one that was handed in once. */
export function LineRevisions({ batch, record }: { batch: Batch; record: RecordRow }) {
  const { data = [] } = useQuery(lineRevisionsQuery(batch, record));
  if (data.length < 2) return null;
  return (
    <p className="flex flex-wrap gap-x-4 border-b border-hairline px-gutter py-2 text-table text-ink-2">
      As handed in:
      {data.map(({ revision, recordId }) =>
        recordId === record.id ? (
          <span key={recordId} className="font-semibold text-ink">
            revision {revision}, this one
          </span>
        ) : (
          <TextLink key={recordId} to={paths.record.to(recordId)}>
            revision {revision}
          </TextLink>
        ),
      )}
    </p>
  );
}
