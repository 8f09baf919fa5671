import { Quantity } from '#src/components/ui/quantity.tsx';
import { formatDay, formatWallClock } from '#src/lib/formats.ts';

type Props = {
  readonly value: number | string | null;
  readonly unit: string | null;
  readonly plusMinus?: number | null;
};

/** What was measured or allowed: a quantity, a day, a moment, or a word of the workbook. */
export function ComparedValue({ value, unit, plusMinus }: Props) {
  if (value === null) return <span className="text-muted">–</span>;
  if (typeof value === 'number') return <Quantity value={value} unit={unit ?? ''} plusMinus={plusMinus} />;
  return <>{value.includes('T') ? formatWallClock(value) : formatDay(value)}</>;
}
