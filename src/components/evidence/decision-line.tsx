import { findingWord } from '#shared/review/finding-word.ts';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { formatInstant } from '#src/lib/formats.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';

/** Where a finding stands, why, by whom and when. Nothing while it is undecided. */
export function DecisionLine({ finding }: { finding: FindingRow }) {
  const word = findingWord(finding);
  const { decision } = finding;
  if (!word) return null;
  return (
    <div className="flex gap-1.5">
      <Glyph name={word.glyph} className="mt-0.75" />
      <p className="min-w-0">
        <span className="font-semibold">{word.word}</span>
        {decision ? (
          <span className="block text-ink-2">
            {decision.reason ? `${decision.reason} ` : ''}
            <span className="text-muted">
              {decision.by}, {formatInstant(decision.at)}
            </span>
          </span>
        ) : null}
      </p>
    </div>
  );
}
