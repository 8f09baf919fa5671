import { useQuery } from '@tanstack/react-query';
import { batchFindingsQuery } from '../api/batch-findings.ts';
import { batchLinesQuery } from '../api/batch-lines.ts';
import { FindingItem, type FindingActions } from './finding-item.tsx';
import { describeLine } from '../lib/describe-line.ts';
import { joinFindings } from '../lib/line-view.ts';
import { EmptyState } from '#src/components/ui/empty-state.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { LINE_WORDS } from '#src/components/ui/state-word.tsx';
import { counted, formatDay } from '#src/lib/formats.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import type { Batch } from '#shared/generated/api-types.ts';

type Props = FindingActions & { readonly batch: Batch };

/** What came back with the revision before, why, and what is due; the lines that stand below. */
export function ReturnedPanel({ batch, ...actions }: Props) {
  const before = batch.revision.number - 1;
  const metric = useUnitSystem() === 'metric';
  const lines = useQuery(batchLinesQuery(batch.id, before));
  const findings = useQuery(batchFindingsQuery(batch.id, before));
  const error = lines.error ?? findings.error;
  if (error) {
    return <ErrorState error={error} what="What came back" onRetry={() => void lines.refetch()} />;
  }
  if (!lines.data || !findings.data) return <Skeleton lines={5} />;
  const view = joinFindings(lines.data, findings.data);
  const returned = view.lines.filter((line) => line.record.state === 'returned');
  const standing = view.lines.filter((line) => line.record.state !== 'returned');
  return (
    <>
      <SectionHead
        title={`${counted(returned.length, 'line')} came back with revision ${before}`}
        aside={batch.revision.dueOn ? `due ${formatDay(batch.revision.dueOn)}` : null}
      />
      {returned.length === 0 ? <EmptyState title="No line waits for you any more" /> : null}
      {returned.map((line) => (
        <section
          key={line.record.id}
          aria-label={`Returned line ${line.record.structureNumber}`}
          className="border-b border-hairline px-gutter pt-3"
        >
          <h3 className="flex items-center gap-2">
            <Glyph name="cross" />
            <span className="font-semibold">{line.record.structureNumber}</span>
            <span className="text-table text-muted">{describeLine(line.record, metric)}</span>
          </h3>
          {line.record.decision?.reason ? (
            <p className="text-ink-2">“{line.record.decision.reason}”</p>
          ) : null}
          <ul>
            {line.findings
              .filter((finding) => finding.decision?.decision === 'reject' || finding.answer !== null)
              .map((finding) => (
                <FindingItem key={finding.id} finding={finding} line={line} {...actions} />
              ))}
          </ul>
        </section>
      ))}
      {standing.length > 0 ? (
        <>
          <SectionHead title="Lines that stand and need nothing from you" aside={standing.length} />
          <ul className="grid grid-cols-[repeat(auto-fill,minmax(14rem,1fr))] gap-x-6 px-gutter py-2">
            {standing.map(({ record }) => (
              <li key={record.id} className="flex items-center gap-2 py-0.5">
                <Glyph name={LINE_WORDS[record.state].glyph} />
                <span className="font-semibold">{record.structureNumber}</span>
                <span className="ml-auto text-table text-muted">{LINE_WORDS[record.state].word}</span>
              </li>
            ))}
          </ul>
        </>
      ) : null}
    </>
  );
}
