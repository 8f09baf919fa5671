import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import { classNames } from '#src/lib/class-names.ts';
import { formatQuantity, unitWord } from '#shared/units/format-quantity.ts';

type Props = {
  /** In `unit`, as kept. Null: not known, shown as a dash with its word. */
  readonly value: number | null | undefined;
  readonly unit: string;
  readonly digits?: number;
  /** Expanded uncertainty (k = 2), in `unit`. */
  readonly plusMinus?: number | null;
  /** A margin below zero fails: bold and in the colour of a nonconformity. */
  readonly margin?: boolean;
  readonly className?: string;
};

/** A number never stands without its unit; metric when the reader chose so. */
export function Quantity({ value, unit, digits, plusMinus, margin, className }: Props) {
  const metric = useUnitSystem() === 'metric';
  if (value === null || value === undefined) return <span className="text-muted">not known</span>;
  const text = formatQuantity(value, unit, { metric, digits });
  const failing = margin && value < 0;
  return (
    <span className={classNames('whitespace-nowrap', failing && 'font-semibold text-nonconform', className)}>
      {text}
      {plusMinus ? ` ± ${formatQuantity(plusMinus, unit, { metric, digits }).replace(/ .*/, '')}` : null}
    </span>
  );
}

/** The word of a unit in the chosen system, for the head of a column. */
export function useUnitWord(unit: string): string {
  const metric = useUnitSystem() === 'metric';
  return unitWord(unit, { metric });
}
