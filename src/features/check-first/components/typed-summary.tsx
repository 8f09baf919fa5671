import type { PlacedFinding } from '../lib/place-findings.ts';
import { Glyph } from '#src/components/ui/glyph.tsx';
import { SEVERITY_WORDS } from '#src/components/ui/state-word.tsx';
import { counted } from '#src/lib/formats.ts';

const goTo = (input: string): void => {
  const field = document.getElementById(input);
  field?.scrollIntoView({ block: 'center' });
  field?.focus({ preventScroll: true });
};

/** All that the check says of the line, each leading to its field. */
export function TypedSummary({ placed, checked }: { placed: readonly PlacedFinding[]; checked: boolean }) {
  const said = placed.filter((one) => !one.blank);
  const first = placed.find((one) => one.blank);
  const blank = new Set(placed.flatMap((one) => (one.blank ? [one.input] : []))).size;
  return (
    <section aria-labelledby="typed-summary" className="border-b border-hairline px-gutter py-3">
      <div role="status">
        <h2 id="typed-summary" className="font-semibold">
          {!checked
            ? 'The check begins with the first key'
            : placed.length === 0
              ? 'Nothing found on this line'
              : `${counted(said.length, 'finding')}${blank > 0 ? `, ${counted(blank, 'field')} still to fill in` : ''}`}
        </h2>
      </div>
      {said.length > 0 || first ? (
        <ul className="mt-1 grid gap-1 text-table">
          {said.map(({ finding, input }) => (
            <li key={finding.fingerprint} className="flex items-start gap-1.5">
              <Glyph
                name={SEVERITY_WORDS[finding.severity].glyph}
                label={SEVERITY_WORDS[finding.severity].word}
                className="mt-0.5"
              />
              <SummaryLink input={input}>{`${finding.title}: ${finding.message}`}</SummaryLink>
            </li>
          ))}
          {first ? (
            <li className="flex items-start gap-1.5">
              <Glyph name="dotted" className="mt-0.5" />
              <SummaryLink input={first.input}>Go to the first field that is still to fill in</SummaryLink>
            </li>
          ) : null}
        </ul>
      ) : null}
    </section>
  );
}

function SummaryLink({ input, children }: { input: string | null; children: string }) {
  return input === null ? (
    <span>{children}</span>
  ) : (
    <button
      type="button"
      className="text-left underline decoration-rule underline-offset-4 hover:decoration-ink pointer-coarse:min-h-11"
      onClick={() => goTo(input)}
    >
      {children}
    </button>
  );
}
