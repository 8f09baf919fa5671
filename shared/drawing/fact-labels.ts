import type { Derived } from '#shared/records/types.ts';
import { formatNumber, formatQuantity } from '#shared/units/format-quantity.ts';
import { dimensionText } from './dimension-text.ts';
import type { ColumnLabel } from './label-column.ts';

/** A label of what the record says without a finding; it gives way where the column is full. */
export const factLabel = (id: string, title: string, detail: string): ColumnLabel => ({
  id,
  title,
  detail,
  tone: 'ink',
  finding: null,
  optional: true,
});

/** What was placed, and its ratio to the void with its expanded uncertainty; nothing where a figure is not known. */
export const foamFact = (
  { placedFt3, voidFt3, fillRatio, fillRatioU }: Derived,
  metric: boolean,
): readonly ColumnLabel[] => {
  if (placedFt3 === null || voidFt3 === null || fillRatio === null) return [];
  const u = fillRatioU === null ? '' : ` ± ${formatNumber(fillRatioU, { fixed: true })}`;
  const of = formatQuantity(voidFt3, 'ft3', { metric });
  return [
    factLabel(
      'foam',
      `Foam ${dimensionText(placedFt3, 'ft3', metric)} placed`,
      `fill ratio ${formatNumber(fillRatio, { fixed: true })}${u} of void ${of}`,
    ),
  ];
};
