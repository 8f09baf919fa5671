import { DecisionLine } from '#src/components/evidence/decision-line.tsx';
import { MeasuredAgainst } from '#src/components/ui/measured-against.tsx';
import { formatInstant } from '#src/lib/formats.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';
import { keepTogether } from '#src/lib/keep-together.ts';

/** `Set!H9`; null where a finding has no place in the workbook. */
export function cellOf({ sheet, cell }: Pick<FindingRow, 'sheet' | 'cell'>): string | null {
  if (cell === null) return sheet;
  return sheet === null || cell.includes('!') ? cell : `${sheet}!${cell}`;
}

/** What a finding says below its title: figures, place and words; the answer and the decision once there are any. */
export function FindingFacts({ finding, remedy }: { finding: FindingRow; remedy: boolean }) {
  const cell = cellOf(finding);
  const { answer } = finding;
  return (
    <div className="grid gap-0.5 text-table">
      <MeasuredAgainst
        measured={finding.measured}
        limit={finding.limit}
        margin={finding.margin}
        unit={finding.unit}
        uncertainty={finding.uncertainty}
      />
      <p className="text-ink-2">
        {cell === null ? null : <span className="whitespace-nowrap text-ink">{cell}. </span>}
        {keepTogether(finding.message)}
      </p>
      {remedy && finding.remedy ? <p className="text-muted">{finding.remedy}</p> : null}
      {answer ? (
        <p className="border-l-2 border-rule pl-2 text-ink">
          “{answer.text}”{' '}
          <span className="text-muted">
            {answer.by}, {formatInstant(answer.at)}
          </span>
        </p>
      ) : null}
      <DecisionLine finding={finding} />
    </div>
  );
}
