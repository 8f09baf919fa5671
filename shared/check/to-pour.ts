import type { CleanRow } from '#shared/records/clean-row.ts';
import type { FieldValues } from '#shared/records/types.ts';
import type { Pour } from '#shared/rules/types.ts';
import type { Clock } from './instants.ts';

const numberIn = (values: FieldValues, field: string): number | null => {
  const value = values[field];
  return typeof value === 'number' ? value : null;
};

const textIn = (values: FieldValues, field: string): string | null => {
  const value = values[field];
  return typeof value === 'string' ? value : null;
};

/** A row of the Pours sheet as rules and computations read it. */
export const toPour = ({ source, values, broken }: CleanRow, clock: Clock): Pour => ({
  source: { ...source, values },
  pourNumber: numberIn(values, 'pourNumber'),
  event: numberIn(values, 'event') ?? 1,
  pouredAt: textIn(values, 'pouredAt'),
  pouredAtMs: clock.at(values['pouredAt']),
  product: textIn(values, 'product'),
  lot: textIn(values, 'lot'),
  kitFt3: numberIn(values, 'kitFt3'),
  quantity: numberIn(values, 'quantity'),
  wastedQuantity: numberIn(values, 'wastedQuantity') ?? 0,
  componentATempF: numberIn(values, 'componentATempF'),
  componentBTempF: numberIn(values, 'componentBTempF'),
  broken,
});
