import type { RowInput } from '#server/workbook/write-workbook.ts';
import type { FindingRow } from '#shared/generated/api-types.ts';
import type { Kind } from '#shared/records/types.ts';
import { relevelRow, repairPours, straightenRow } from '#tests/factories/repair-rows.ts';
import { pourRow, pourRows, setRow } from '#tests/factories/set-row.ts';

export type Expected = Partial<
  Pick<FindingRow, 'measured' | 'limit' | 'margin' | 'unit' | 'cell' | 'severity' | 'field'>
>;
export type Line = {
  readonly values?: RowInput;
  readonly pours?: (structure: string) => readonly RowInput[];
  /** What the design list says of it otherwise. */
  readonly planned?: Readonly<Record<string, number>>;
};
export type RuleCase = {
  readonly code: string;
  /** *set* unless said. */
  readonly kind?: Kind;
  /** The finding belongs to the batch, not to the line. */
  readonly onBatch?: boolean;
  /** Breaks this rule alone. Numbers are worked out by hand beside it; ± 0.0001 on ratios. */
  readonly fails: Line & { readonly expected: Expected };
  /** Meets it by as little as can be written down. */
  readonly passes: Line;
};

export const LOT = 'LOT-1';
/** A second product of the owner, with its lot. */
export const OTHER_PRODUCT = 'EP-20';
export const OTHER_LOT = 'LOT-20';
export const EXPIRED_LOT = 'LOT-OLD';
export const HELD_LOT = 'LOT-HELD';
export const SCARCE_LOT = 'LOT-FEW';
/** Where a structure of another contractor is on record. */
export const TAKEN_PLACE = { latitude: 41, longitude: -98.7 };
/** The work order's area, as GeoJSON: 96 to 99° west, 40 to 43° north. */
export const AREA = {
  type: 'Polygon',
  coordinates: [
    [
      [-99, 40],
      [-96, 40],
      [-96, 43],
      [-99, 43],
      [-99, 40],
    ],
  ],
};
export const kits =
  (...sizes: number[]) =>
  (structure: string) =>
    sizes.map((kitFt3) => pourRow(structure, LOT, { kitFt3 }));

const ROW = { set: setRow, straighten: straightenRow, relevel: relevelRow };

export const rowOf = (structure: string, kind: Kind, line: Line): RowInput =>
  ROW[kind](structure, line.values);

export const poursOf = (structure: string, kind: Kind, line: Line): readonly RowInput[] => {
  if (line.pours) return line.pours(structure);
  return kind === 'set' ? pourRows(structure, LOT) : repairPours(structure, LOT, { kind });
};
