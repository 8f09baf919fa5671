import { METRIC, isUnit, type Unit } from './convert.ts';

type Style = {
  readonly word: string;
  readonly digits: number;
  /** Trailing zeros stay. */ readonly fixed?: boolean;
};

const STYLES: Readonly<Record<Unit, Style>> = {
  ft: { word: 'ft', digits: 2 },
  in: { word: 'in', digits: 2 },
  ft3: { word: 'ft³', digits: 2, fixed: true },
  degF: { word: '°F', digits: 1 },
  deg: { word: '°', digits: 6 },
  min: { word: 'min', digits: 1 },
  d: { word: 'd', digits: 0 },
  'in-per-10ft': { word: 'in per 10 ft', digits: 2 },
  'in-per-ft': { word: 'in per ft', digits: 3 },
  ratio: { word: '', digits: 2, fixed: true },
  count: { word: '', digits: 0 },
  px: { word: 'px', digits: 0 },
};

const MINUS = '\u2212';

/** A number with a true minus sign and thousands separators; trailing zeros dropped unless `fixed`. Not finite: a dash. */
export function formatNumber(
  value: number,
  { digits = 2, fixed = false }: { readonly digits?: number; readonly fixed?: boolean } = {},
): string {
  if (!Number.isFinite(value)) return '–';
  // A hair off a half (1.005 kept as 1.00499…) rounds as it reads.
  const rounded = Number(`${Math.round(Number(`${Math.abs(value).toPrecision(15)}e${digits}`))}e-${digits}`);
  const shown = Number.isFinite(rounded) ? rounded : Math.abs(value);
  const [whole = '0', fraction = ''] = shown.toFixed(digits).split('.');
  const kept = fixed ? fraction : fraction.replace(/0+$/, '');
  const text = whole.replace(/\B(?=(\d{3})+$)/g, ',') + (kept === '' ? '' : `.${kept}`);
  return value < 0 && shown !== 0 ? MINUS + text : text;
}

/** Words of a unit as printed after a number or in a column's title: `ft³`, `in per 10 ft`. Empty for bare numbers; an unknown unit as it stands. */
export function unitWord(unit: string, { metric = false }: { readonly metric?: boolean } = {}): string {
  if (!isUnit(unit)) return unit;
  return (metric ? METRIC[unit]?.word : undefined) ?? STYLES[unit].word;
}

export type QuantityOptions = {
  readonly metric?: boolean;
  readonly digits?: number;
  /** All digits, zeros too: figures under one another. Else as the unit has it. */
  readonly fixed?: boolean;
};

/** A value with its unit in the words of the trade, or in metric words where the unit has them. */
export function formatQuantity(value: number, unit: string, options: QuantityOptions = {}): string {
  const style: Style = isUnit(unit) ? STYLES[unit] : { word: unit, digits: 2 };
  const metric = options.metric === true && isUnit(unit) ? METRIC[unit] : undefined;
  const shown = metric === undefined ? value : metric.convert(value);
  const digits = options.digits ?? metric?.digits ?? style.digits;
  const number = formatNumber(shown, {
    digits,
    fixed: options.fixed ?? (metric === undefined && style.fixed === true),
  });
  const word = metric?.word ?? style.word;
  if (word === '') return number;
  return word === '°' ? `${number}°` : `${number} ${word}`;
}
