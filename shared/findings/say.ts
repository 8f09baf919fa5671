import type { Scalar } from '#shared/records/types.ts';
import { formatQuantity } from '#shared/units/format-quantity.ts';

const CLOCK = /^(\d{4}-\d{2}-\d{2})T(\d{2}:\d{2})/;
/** What a person typed is quoted in a sentence; past this it says nothing more. */
const LONGEST = 80;

const shorten = (text: string): string => (text.length > LONGEST ? `${text.slice(0, LONGEST)}…` : text);

/** A value of a finding as it stands in a sentence: numbers with their unit, wall-clock times, words. A dash for nothing. */
export const say = (value: Scalar | readonly Scalar[] | undefined, unit: string | null): string => {
  if (value === undefined || value === null || value === '') return '–';
  if (typeof value === 'number')
    return formatQuantity(value, unit ?? 'count', unit === null ? { digits: 4 } : {});
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value !== 'string') return value.map((one) => say(one, unit)).join(', ');
  const clock = unit === 'clock' ? CLOCK.exec(value) : null;
  return clock ? `${clock[1]} ${clock[2]}` : shorten(value);
};
