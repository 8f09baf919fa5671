import { formatDay, formatWallClock } from '#src/lib/formats.ts';
import { Quantity } from '#src/components/ui/quantity.tsx';

type Props = {
  readonly measured: number | string | null;
  readonly limit: number | string | null;
  readonly margin: number | null;
  readonly unit: string | null;
  readonly uncertainty?: number | null;
  /** What the figure is, where it is not a reading. */
  readonly word?: string;
};

/** `measured 5.80 ft   limit 6.00 ft   margin −0.20 ft`: limit and margin beside every measured value. */
export function MeasuredAgainst({ measured, limit, margin, unit, uncertainty, word = 'measured' }: Props) {
  // A word alone, as of the view that a missing photograph should show, is no limit; the sentence says it.
  if (measured === null && typeof limit !== 'number') return null;
  return (
    <span className="flex flex-wrap gap-x-4 text-table">
      <Part word={word} value={measured} unit={unit} plusMinus={uncertainty} />
      <Part word="limit" value={limit} unit={unit} />
      {margin === null ? null : (
        <span>
          <span className="text-muted">margin </span>
          <Quantity value={margin} unit={unit ?? ''} margin />
        </span>
      )}
    </span>
  );
}

type PartProps = {
  readonly word: string;
  readonly value: number | string | null;
  readonly unit: string | null;
  readonly plusMinus?: number | null;
};

function Part({ word, value, unit, plusMinus }: PartProps) {
  if (value === null) return null;
  return (
    <span>
      <span className="text-muted">{word} </span>
      {typeof value === 'number' ? (
        <Quantity value={value} unit={unit ?? ''} plusMinus={plusMinus} />
      ) : (
        formatDay(formatWallClock(value))
      )}
    </span>
  );
}
