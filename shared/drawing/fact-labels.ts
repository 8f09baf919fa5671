import type { Derived } from '#shared/records/types.ts';
import { formatNumber, formatQuantity } from '#shared/units/format-quantity.ts';
import { dimensionText } from './dimension-text.ts';
import type { ColumnLabel } from './label-column.ts';
import type { SheetPurpose } from './sheet-types.ts';

/** A label of what the record says without a finding; it gives way where the column is full. */
export const factLabel = (id: string, title: string, detail: string): ColumnLabel => ({
  id,
  title,
  detail,
  tone: 'ink',
  finding: null,
  optional: true,
});

/** Foam in the words of the sheet's purpose: placed where it records, to be placed where it plans. */
export const foamTitle = (placedFt3: number, purpose: SheetPurpose, metric: boolean): string =>
  `Foam ${dimensionText(placedFt3, 'ft3', metric)} ${purpose === 'plan' ? 'to be placed' : 'placed'}`;

/** The same in a sentence; none where a figure is not known. */
export const foamPlacedSentence = (
  { placedFt3, voidFt3, fillRatio }: Derived,
  { purpose, metric }: { readonly purpose: SheetPurpose; readonly metric: boolean },
): string | false =>
  placedFt3 !== null &&
  voidFt3 !== null &&
  fillRatio !== null &&
  `${dimensionText(placedFt3, 'ft3', metric)} of foam ${purpose === 'plan' ? 'are to be' : 'were'} placed in a void of ${dimensionText(voidFt3, 'ft3', metric)}: a fill ratio of ${formatNumber(fillRatio, { fixed: true })}.`;

/** What was placed, and its ratio to the void with its expanded uncertainty; nothing where a figure is not known. */
export const foamFact = (
  { placedFt3, voidFt3, fillRatio, fillRatioU }: Derived,
  { purpose, metric }: { readonly purpose: SheetPurpose; readonly metric: boolean },
): readonly ColumnLabel[] => {
  if (placedFt3 === null || voidFt3 === null || fillRatio === null) return [];
  const u = fillRatioU === null ? '' : ` ± ${formatNumber(fillRatioU, { fixed: true })}`;
  const of = formatQuantity(voidFt3, 'ft3', { metric });
  return [
    factLabel(
      'foam',
      foamTitle(placedFt3, purpose, metric),
      `fill ratio ${formatNumber(fillRatio, { fixed: true })}${u} of void ${of}`,
    ),
  ];
};
