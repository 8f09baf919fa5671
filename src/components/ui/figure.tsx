import { formatQuantity, unitWord } from '#shared/units/format-quantity.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';

type Props = { readonly value: number | null; readonly unit: string; readonly digits?: number };

/** A figure in a column whose head carries the unit. Not known: a dash, said in words. */
export function Figure({ value, unit, digits }: Props) {
  const metric = useUnitSystem() === 'metric';
  if (value === null)
    return (
      <span className="text-muted">
        <span aria-hidden="true">–</span>
        <span className="sr-only">not known</span>
      </span>
    );
  const word = unitWord(unit, { metric });
  const text = formatQuantity(value, unit, { metric, digits, fixed: true });
  return <>{word && text.endsWith(word) ? text.slice(0, -word.length).trim() : text}</>;
}
