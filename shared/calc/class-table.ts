import { numberOf, textOf } from './values.ts';
import type { FieldValues } from '#shared/records/types.ts';

/** Minimum girths of one class and length of a species group, inches. */
export type ClassTableEntry = { readonly girthAt6FtIn: number; readonly girthTopIn: number };

type Girths = Readonly<Record<string, number>>;

/** Minimum girth at the top by class, all species and lengths. ANSI O5.1 (2022), table 8; secondary transcription. */
const TOP: Girths = {
  H6: 39,
  H5: 37,
  H4: 35,
  H3: 33,
  H2: 31,
  H1: 29,
  '1': 27,
  '2': 25,
  '3': 23,
  '4': 21,
  '5': 19,
  '6': 17,
  '7': 15,
  '9': 15,
  '10': 12,
};

/**
 * Minimum girth 6 ft from the butt by length and class, southern pine and Douglas-fir.
 * 25 to 70 ft: ANSI O5.1 (2022), table 8; secondary transcription. 20 and 75 to 95 ft: derived from the tree diameters of the Southern
 * Regional Extension Forestry handbook (girth = diameter × 0.88 π, nearest 0.5 in). 65 ft classes 2 and 3: sources differ by 0.5 in.
 */
const PINE_AND_FIR: Readonly<Record<string, Girths>> = {
  '20': { '1': 31, '2': 29, '3': 27, '4': 25, '5': 23, '6': 21, '7': 19.5 },
  '25': { H2: 38, H1: 36, '1': 33.5, '2': 31.5, '3': 29.5, '4': 27.5, '5': 25.5, '6': 23, '7': 21.5 },
  '30': { H2: 41, H1: 38.5, '1': 36.5, '2': 34, '3': 32, '4': 29.5, '5': 27.5, '6': 25, '7': 23.5 },
  '35': { H2: 43.5, H1: 41.5, '1': 39, '2': 36.5, '3': 34, '4': 31.5, '5': 29, '6': 27, '7': 25 },
  '40': { H2: 46, H1: 43.5, '1': 41, '2': 38.5, '3': 36, '4': 33.5, '5': 31, '6': 28.5 },
  '45': { H2: 48.5, H1: 45.5, '1': 43, '2': 40.5, '3': 37.5, '4': 35, '5': 32.5, '6': 30 },
  '50': { H2: 50.5, H1: 47.5, '1': 45, '2': 42, '3': 39, '4': 36.5, '5': 34 },
  '55': { H2: 52, H1: 49.5, '1': 46.5, '2': 43.5, '3': 40.5, '4': 38 },
  '60': { H2: 54, H1: 51, '1': 48, '2': 45, '3': 42, '4': 39 },
  '65': { H2: 55.5, H1: 52.5, '1': 49.5, '2': 46.5, '3': 43.5, '4': 40.5 },
  '70': { H2: 57, H1: 54, '1': 51, '2': 48, '3': 45, '4': 41.5 },
  '75': { '1': 52.5, '2': 49, '3': 46, '4': 43 },
  '80': { '1': 54, '2': 50.5, '3': 47, '4': 44 },
  '85': { '1': 55, '2': 51.5, '3': 48 },
  '90': { '1': 56, '2': 53, '3': 49 },
  '95': { '1': 57, '2': 54, '3': 50 },
};

/** Western redcedar and ponderosa pine: recalled, not verified (45 ft class 4 confirmed by a public wood-pole configuration table). */
const CEDAR_AND_PONDEROSA: Readonly<Record<string, Girths>> = {
  '35': { '1': 42.5, '2': 40, '3': 37.5, '4': 34.5, '5': 32, '6': 30, '7': 27.5 },
  '40': { '1': 45, '2': 42.5, '3': 39.5, '4': 36.5, '5': 34, '6': 31.5 },
  '45': { '1': 47.5, '2': 44.5, '3': 41.5, '4': 38.5, '5': 36, '6': 33 },
  '50': { '1': 49.5, '2': 46.5, '3': 43.5, '4': 40, '5': 37.5 },
};

/** Red, jack and lodgepole pine; northern white cedar: one cell each, read from the same configuration table. */
const RED_PINE: Readonly<Record<string, Girths>> = { '45': { '4': 37 } };
const WHITE_CEDAR: Readonly<Record<string, Girths>> = { '45': { '4': 44 } };

const GROUPS: Readonly<Record<string, Readonly<Record<string, Girths>>>> = {
  'southern-pine': PINE_AND_FIR,
  'douglas-fir': PINE_AND_FIR,
  'western-redcedar': CEDAR_AND_PONDEROSA,
  'ponderosa-pine': CEDAR_AND_PONDEROSA,
  'red-pine': RED_PINE,
  'jack-pine': RED_PINE,
  'lodgepole-pine': RED_PINE,
  'northern-white-cedar': WHITE_CEDAR,
};

export type ClassTableKey = {
  readonly material: string;
  readonly lengthFt: number;
  readonly poleClass: string;
};

/** Minimum girths of a wood pole; null where the table lacks species, length or class: such a pole must be taped. */
export function classTable({ material, lengthFt, poleClass }: ClassTableKey): ClassTableEntry | null {
  const rows = Object.hasOwn(GROUPS, material) ? GROUPS[material] : undefined;
  const key = String(lengthFt);
  const row = rows !== undefined && Object.hasOwn(rows, key) ? rows[key] : undefined;
  if (row === undefined || !Object.hasOwn(row, poleClass)) return null;
  const girthAt6FtIn = row[poleClass];
  const girthTopIn = TOP[poleClass];
  return girthAt6FtIn === undefined || girthTopIn === undefined ? null : { girthAt6FtIn, girthTopIn };
}

/** The table's entry for a record's pole; null as above, and for a section that is not round. */
export function classTableOf(values: FieldValues): ClassTableEntry | null {
  const material = textOf(values, 'poleMaterial');
  const lengthFt = numberOf(values, 'poleLengthFt');
  const poleClass = textOf(values, 'poleClass');
  if (material === null || lengthFt === null || poleClass === null) return null;
  if ((textOf(values, 'poleSection') ?? 'round') !== 'round') return null;
  return classTable({ material, lengthFt, poleClass });
}
