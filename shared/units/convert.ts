/** Units of measured values, as the keyword `x-unit` of the schemas names them. */
export const UNITS = [
  'ft',
  'in',
  'ft3',
  'degF',
  'deg',
  'min',
  'd',
  'in-per-10ft',
  'in-per-ft',
  'ratio',
  'count',
  'px',
] as const;
export type Unit = (typeof UNITS)[number];

/** Exact: 1 ft = 0.3048 m and 1 in = 25.4 mm by definition (international foot; 16 CFR 500.19, NIST SP 811). */
export const M_PER_FT = 0.3048;
export const MM_PER_IN = 25.4;
export const IN_PER_FT = 12;
/** 0.3048³ m³ in litres. */
export const L_PER_FT3 = 28.316846592;

export const ftToM = (ft: number): number => ft * M_PER_FT;
export const mToFt = (m: number): number => m / M_PER_FT;
export const inToMm = (inches: number): number => inches * MM_PER_IN;
export const mmToIn = (mm: number): number => mm / MM_PER_IN;
export const ft3ToL = (ft3: number): number => ft3 * L_PER_FT3;
export const lToFt3 = (litres: number): number => litres / L_PER_FT3;
export const fToC = (degF: number): number => ((degF - 32) * 5) / 9;
export const cToF = (degC: number): number => (degC * 9) / 5 + 32;

type Metric = { readonly word: string; readonly digits: number; readonly convert: (value: number) => number };

/** Metric display of each unit that has one; a conversion of what is kept, never a second store. */
export const METRIC: Readonly<Partial<Record<Unit, Metric>>> = {
  ft: { word: 'm', digits: 3, convert: ftToM },
  in: { word: 'mm', digits: 0, convert: inToMm },
  ft3: { word: 'L', digits: 1, convert: ft3ToL },
  degF: { word: '°C', digits: 1, convert: fToC },
  'in-per-10ft': { word: 'mm per m', digits: 1, convert: (value) => inToMm(value) / ftToM(10) },
  'in-per-ft': { word: 'mm per m', digits: 1, convert: (value) => inToMm(value) / M_PER_FT },
};

export function isUnit(text: string): text is Unit {
  return UNITS.some((unit) => unit === text);
}
