import { findingWord } from '#shared/review/finding-word.ts';
import { inOrder } from '#shared/drawing/number-findings.ts';
import { MeasuredAgainst } from '#src/components/ui/measured-against.tsx';
import type { FindingRow } from '#shared/generated/api-types.ts';

/** As many as the foot of a Letter sheet holds below the drawing. */
const ROOM = 5;

/** The findings in short, on paper only, so that a balloon is not a number alone. */
export function PrintFindings({ findings }: { findings: readonly FindingRow[] }) {
  const due = inOrder(findings).filter((finding) => finding.severity !== 'note');
  if (due.length === 0) return null;
  return (
    <ol className="mt-3 hidden border-t border-ink print:block">
      {due.slice(0, ROOM).map((finding, index) => (
        <li key={finding.id} className="flex flex-wrap gap-x-4 border-b border-hairline py-1 text-table">
          <span className="font-semibold">
            {index + 1}. {finding.title}
          </span>
          <MeasuredAgainst
            measured={finding.measured}
            limit={finding.limit}
            margin={finding.margin}
            unit={finding.unit}
            uncertainty={finding.uncertainty}
          />
          <span className="ml-auto text-ink-2">{findingWord(finding)?.word ?? 'not decided'}</span>
        </li>
      ))}
      {due.length > ROOM ? (
        <li className="py-1 text-table text-ink-2">
          and {due.length - ROOM} more, on the page of the record
        </li>
      ) : null}
    </ol>
  );
}
