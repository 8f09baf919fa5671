import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import { METRIC } from '#shared/units/convert.ts';
import { formatNumber } from '#shared/units/format-quantity.ts';

/** A length in feet under a head that says its unit; metric when the reader chose so. */
export function StructureFigure({ value, digits }: { value: number | null; digits: number }) {
  const metric = useUnitSystem() === 'metric' ? METRIC.ft : undefined;
  if (value === null) return <span className="text-muted">–</span>;
  return metric
    ? formatNumber(metric.convert(value), { digits: metric.digits, fixed: true })
    : formatNumber(value, { digits, fixed: true });
}
