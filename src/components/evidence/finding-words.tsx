import type { ReactNode } from 'react';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { MeasuredAgainst } from '#src/components/ui/measured-against.tsx';
import { SEVERITY_WORDS } from '#src/components/ui/state-word.tsx';
import { keepTogether } from '#src/lib/keep-together.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

type Props = {
  readonly finding: Pick<
    FindingRow,
    'severity' | 'title' | 'message' | 'remedy' | 'measured' | 'limit' | 'margin' | 'unit' | 'sheet' | 'cell'
  > & { readonly uncertainty?: number | null };
  /** Before the title. */
  readonly lead?: ReactNode;
  /** What can be done about it. */
  readonly children?: ReactNode;
};

/** One finding in full: what, how far from the limit, where it stands in the workbook, what puts it right. */
export function FindingWords({ finding, lead, children }: Props) {
  const severity = SEVERITY_WORDS[finding.severity];
  return (
    <li className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-2 border-b border-hairline py-3 last:border-b-0">
      <Glyph name={severity.glyph} className="mt-1" label={severity.word} />
      <div>
        <h3 className="text-base font-semibold">
          {lead}
          {finding.title}
        </h3>
        <p className="text-ink-2">{keepTogether(finding.message)}</p>
        {finding.margin === null && typeof finding.measured !== 'number' ? null : (
          <MeasuredAgainst {...finding} />
        )}
        <p className="text-table text-ink-2">
          {finding.sheet && finding.cell ? (
            <span className="font-semibold text-ink">
              {finding.sheet}!{finding.cell}
              {'. '}
            </span>
          ) : null}
          {keepTogether(finding.remedy)}
        </p>
        {children}
      </div>
    </li>
  );
}
