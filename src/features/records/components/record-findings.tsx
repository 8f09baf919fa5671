import { FindingFacts } from '#src/components/evidence/finding-facts.tsx';
import { inOrder } from '#shared/drawing/number-findings.ts';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { SEVERITY_WORDS } from '#src/components/ui/state-word.tsx';
import { classNames } from '#src/lib/class-names.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

type Props = {
  readonly findings: readonly FindingRow[];
  readonly marked: string | null;
  readonly onMark: (id: string | null) => void;
};

/** Findings of a record with the number of their balloon; to read. */
export function RecordFindings({ findings, marked, onMark }: Props) {
  const ordered = inOrder(findings);
  return (
    <section aria-labelledby="findings">
      <SectionHead title="Findings" id="findings" aside={ordered.length === 0 ? 'none' : ordered.length} />
      {ordered.length === 0 ? (
        <p className="px-gutter py-2.5 text-table text-ink-2">The check found nothing to remark.</p>
      ) : null}
      <ul>
        {ordered.map((finding, index) => (
          // oxlint-disable-next-line jsx-a11y/no-noninteractive-element-interactions -- the pointer only marks the balloon; nothing is done by it
          <li
            key={finding.id}
            id={`finding-${finding.id}`}
            tabIndex={-1}
            onMouseEnter={() => onMark(finding.id)}
            onMouseLeave={() => onMark(null)}
            className={classNames(
              'flex gap-3 border-b border-hairline px-gutter py-2.5',
              finding.id === marked && 'bg-sheet',
            )}
          >
            <span className="flex w-9 shrink-0 items-start gap-1.5 pt-0.5 font-semibold">
              {finding.severity === 'note' ? '' : index + 1}
              <Glyph
                name={SEVERITY_WORDS[finding.severity].glyph}
                label={SEVERITY_WORDS[finding.severity].word}
                className="mt-0.75"
              />
            </span>
            <div className="min-w-0">
              <h3 className="font-semibold">{finding.title}</h3>
              <FindingFacts finding={finding} remedy={finding.state === 'undecided'} />
            </div>
          </li>
        ))}
      </ul>
    </section>
  );
}
