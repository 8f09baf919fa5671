import { SectionHead } from '#src/components/ui/page-band.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import type { SheetLimits } from '#shared/drawing/sheet-types.ts';
import type { RecordRow } from '#shared/generated/api-types.ts';
import { fieldTitle } from '#shared/records/field-meta.ts';

type Props = {
  readonly record: RecordRow;
  readonly hint: boolean;
  /** Of the standard that the line was checked on; without them the figures stand alone. */
  readonly limits?: SheetLimits;
};

type Figure = {
  readonly word: string;
  readonly value: number | null;
  readonly unit: string;
  readonly plusMinus?: number | null;
  readonly least?: number;
  readonly most?: number;
};

/** What was computed from the measurements. Without a fill ratio there is no table of what its ± comes from: `hint` says it here. */
export function DerivedFigures({ record, hint, limits = {} }: Props) {
  const { derived, kind } = record;
  const figures: readonly Figure[] = [
    { word: 'Void', value: derived.voidFt3, unit: 'ft3' },
    { word: 'Foam placed', value: derived.placedFt3, unit: 'ft3' },
    {
      word: 'Fill ratio',
      value: derived.fillRatio,
      unit: 'ratio',
      plusMinus: derived.fillRatioU,
      least: limits.fillLeast,
    },
    { word: 'Embedment due', value: derived.dueFt, unit: 'ft' },
    { word: 'Water with the pole in', value: derived.waterWithPoleIn, unit: 'in', most: limits.waterMostIn },
    { word: 'Least annulus', value: derived.leastAnnulusIn, unit: 'in', least: limits.annulusLeastIn },
  ].filter((figure) => figure.value !== null || kind === 'set');
  return (
    <section aria-labelledby="derived">
      <SectionHead title="Computed" id="derived" aside={`on standard ${record.standard}`} />
      <dl className="grid grid-cols-[repeat(auto-fill,minmax(9.5rem,1fr))] gap-x-4 gap-y-1.5 px-gutter py-2.5 text-table">
        {figures.map(({ word, least, most, ...figure }) => (
          <div key={word}>
            <dt className="text-small text-muted">{word}</dt>
            <dd className="font-semibold">
              <Quantity {...figure} />
            </dd>
            {figure.value === null ? null : (
              <Against value={figure.value} unit={figure.unit} least={least} most={most} />
            )}
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

type AgainstProps = Pick<Figure, 'unit' | 'least' | 'most'> & { readonly value: number };

/** Limit and margin under the figure. */
function Against({ value, unit, least, most }: AgainstProps) {
  const limit = least ?? most;
  if (limit === undefined) return null;
  return (
    <dd className="text-small text-muted">
      limit <Quantity value={limit} unit={unit} />, margin{' '}
      <Quantity value={least === undefined ? limit - value : value - limit} unit={unit} margin />
    </dd>
  );
}
