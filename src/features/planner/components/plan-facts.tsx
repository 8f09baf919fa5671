import type { ReactNode } from 'react';
import { MeasuredAgainst } from '#src/components/ui/measured-against.tsx';
import { Glyph, type GlyphName } from '#src/components/ui/glyph.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { greatestGapIn, leastGapIn } from '#shared/planner/choose-bore.ts';
import type { Plan, PlanNote } from '#shared/planner/plan-types.ts';
import type { Standard } from '#shared/standard/types.ts';

const TONES: Readonly<Record<PlanNote['tone'], { readonly glyph: GlyphName; readonly word: string }>> = {
  nonconform: { glyph: 'triangle', word: 'Does not conform' },
  query: { glyph: 'circle', word: 'Will be asked' },
  note: { glyph: 'info', word: 'Note' },
};

/** Depth, bore and gap beside their limits, and what to know. */
export function PlanFacts({ plan, standard }: { readonly plan: Plan; readonly standard: Standard }) {
  return (
    <section aria-label="The plan">
      <SectionHead title="The plan" aside={`by ${standard.name}`} />
      <dl className="grid grid-cols-[max-content_minmax(0,1fr)] gap-x-4 gap-y-1 px-gutter py-3 text-table">
        {plan.kind === 'set' ? <SetFacts plan={plan} standard={standard} /> : null}
        {plan.kind === 'straighten' ? <StraightenFacts plan={plan} /> : null}
        {plan.kind === 'relevel' ? <RelevelFacts plan={plan} /> : null}
      </dl>
      {plan.notes.length > 0 ? (
        <ul className="grid gap-1.5 border-t border-hairline px-gutter py-3 text-table text-ink-2">
          {plan.notes.map(({ tone, text }) => (
            <li key={text} className="flex gap-2">
              <Glyph name={TONES[tone].glyph} label={TONES[tone].word} className="mt-0.5" />
              <span>{text}</span>
            </li>
          ))}
        </ul>
      ) : null}
    </section>
  );
}

function Fact({ word, children }: { readonly word: string; readonly children: ReactNode }) {
  return (
    <>
      <dt className="text-muted">{word}</dt>
      <dd className="min-w-0">{children}</dd>
    </>
  );
}

function SetFacts({ plan, standard }: { readonly plan: Plan; readonly standard: Standard }) {
  const { dueFt, depthFt, boreIn, leastAnnulusIn: least, greatestAnnulusIn: greatest } = plan;
  const narrow = leastGapIn(standard);
  const wide = greatestGapIn(standard);
  return (
    <>
      <Fact word="Depth due">
        <Quantity value={dueFt} unit="ft" className="font-semibold" />
      </Fact>
      {depthFt !== null && dueFt !== null && Math.abs(depthFt - dueFt) > 1e-9 ? (
        <Fact word="Depth planned">
          <MeasuredAgainst
            word="planned"
            measured={depthFt}
            limit={dueFt}
            margin={depthFt - dueFt}
            unit="ft"
          />
        </Fact>
      ) : null}
      <Fact word="Bore">
        <Quantity value={boreIn} unit="in" className="font-semibold" />
        {plan.assumptions.overDigFt > 0 && depthFt !== null ? (
          <>
            {' '}
            bored <Quantity value={depthFt + plan.assumptions.overDigFt} unit="ft" />
          </>
        ) : null}
      </Fact>
      {least === null ? null : (
        <Fact word="Least gap">
          <MeasuredAgainst word="planned" measured={least} limit={narrow} margin={least - narrow} unit="in" />
        </Fact>
      )}
      {greatest === null || wide === null ? null : (
        <Fact word="Greatest gap">
          <MeasuredAgainst
            word="planned"
            measured={greatest}
            limit={wide}
            margin={wide - greatest}
            unit="in"
          />
        </Fact>
      )}
    </>
  );
}

const numberAt = (plan: Plan, key: string) => {
  const value = plan.values[key];
  return typeof value === 'number' ? value : null;
};

function StraightenFacts({ plan }: { readonly plan: Plan }) {
  return (
    <>
      <Fact word="Gap at grade">
        <Quantity value={numberAt(plan, 'gapAtGradeIn')} unit="in" className="font-semibold" />
      </Fact>
      <Fact word="Depth of the gap">
        <Quantity value={plan.depthFt} unit="ft" className="font-semibold" />
      </Fact>
    </>
  );
}

function RelevelFacts({ plan }: { readonly plan: Plan }) {
  const corners = [
    ['Front left', 'gap1In'],
    ['Back left', 'gap2In'],
    ['Back right', 'gap3In'],
    ['Front right', 'gap4In'],
  ] as const;
  return corners.map(([word, key]) => (
    <Fact key={key} word={`Gap, ${word.toLowerCase()}`}>
      <Quantity value={numberAt(plan, key)} unit="in" className="font-semibold" />
    </Fact>
  ));
}
