import { METRIC, type Unit } from '#shared/units/convert.ts';
import { formatNumber, unitWord } from '#shared/units/format-quantity.ts';

/** Decimals on a drawing are fixed, so that readings compare: feet to a hundredth, inches to a tenth. */
const DIGITS: Partial<Record<Unit, number>> = { ft: 2, in: 1, ft3: 1, 'in-per-10ft': 1, 'in-per-ft': 2 };
const METRIC_DIGITS: Partial<Record<Unit, number>> = {
  ft: 2,
  in: 0,
  ft3: 0,
  'in-per-10ft': 0,
  'in-per-ft': 0,
};

/** `5.80 ft`, or `1.77 m`; number and unit are never broken apart. */
export function dimensionText(value: number, unit: Unit, metric: boolean): string {
  const to = metric ? METRIC[unit] : undefined;
  const digits = (to ? METRIC_DIGITS[unit] : DIGITS[unit]) ?? 1;
  const number = formatNumber(to ? to.convert(value) : value, { digits, fixed: true });
  const word = unitWord(unit, { metric });
  return word === '' ? number : `${number}\u00a0${word.replaceAll(' ', '\u00a0')}`;
}

/** `22.0 × 24.0 in`: a bore that is out of round. */
export function crossText([a, b]: readonly [number, number], metric: boolean): string {
  const first = dimensionText(a, 'in', metric).split('\u00a0')[0] ?? '';
  return a === b ? dimensionText(a, 'in', metric) : `${first} × ${dimensionText(b, 'in', metric)}`;
}
