import { SectionHead } from '#src/components/ui/page-band.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import type { RecordRow } from '#shared/generated/api-types.ts';
import { fieldTitle } from '#shared/records/field-meta.ts';

/** What was computed from the measurements. Without a fill ratio there is no table of what its ± comes from: `hint` says it here. */
export function DerivedFigures({ record, hint }: { record: RecordRow; hint: boolean }) {
  const { derived, kind } = record;
  const figures = [
    { word: 'Void', value: derived.voidFt3, unit: 'ft3' },
    { word: 'Foam placed', value: derived.placedFt3, unit: 'ft3' },
    { word: 'Fill ratio', value: derived.fillRatio, unit: 'ratio', plusMinus: derived.fillRatioU },
    { word: 'Embedment due', value: derived.dueFt, unit: 'ft' },
    { word: 'Water with the pole in', value: derived.waterWithPoleIn, unit: 'in' },
    { word: 'Least annulus', value: derived.leastAnnulusIn, unit: 'in' },
  ].filter((figure) => figure.value !== null || kind === 'set');
  return (
    <section aria-labelledby="derived">
      <SectionHead title="Computed" id="derived" aside={`on standard ${record.standard}`} />
      <dl className="grid grid-cols-[repeat(auto-fill,minmax(9.5rem,1fr))] gap-x-4 gap-y-1.5 px-gutter py-2.5 text-table">
        {figures.map(({ word, ...figure }) => (
          <div key={word}>
            <dt className="text-small text-muted">{word}</dt>
            <dd className="font-semibold">
              <Quantity {...figure} />
            </dd>
          </div>
        ))}
      </dl>
      {hint && derived.worstReading ? (
        <p className="px-gutter pb-2.5 text-small text-ink-2">
          Most of the uncertainty comes from {fieldTitle(kind, derived.worstReading).toLowerCase()}: measure
          that again first.
        </p>
      ) : null}
    </section>
  );
}
