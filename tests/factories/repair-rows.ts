import type { RowInput } from '#server/workbook/write-workbook.ts';
import { placeOf } from './place.ts';
import { pourRow } from './set-row.ts';

const PLACE: RowInput = {
  accuracyFt: 5,
  locateTicket: 'LT-1',
  locateFrom: '2026-04-10',
  locateTo: '2026-04-24',
};

/** A pole pulled plumb that meets every rule: void 0.6875 ft³ (worked record WR-17), one kit of 1.5 ft³. */
export function straightenRow(structureNumber: string, values: RowInput = {}): RowInput {
  return {
    structureNumber,
    poleMaterial: 'southern-pine',
    diameterGroundLineIn: 11,
    embedmentFt: 6,
    leanBeforeInPer10Ft: 6,
    leanBeforeAzimuthDeg: 90,
    leanAfterInPer10Ft: 0.2,
    gapAtGradeIn: 4,
    gapDepthFt: 4.5,
    waterIn: 0,
    pulledAt: '2026-04-14T09:30',
    releasedAt: '2026-04-14T10:20',
    reattachedAt: '2026-04-14T11:00',
    ...placeOf(structureNumber),
    ...PLACE,
    ...values,
  };
}

/** A pad raised level that meets every rule: 40 × 40 in, 2 in at each corner: 40 · 40 · 2 / 1728 = 1.8519 ft³, one kit of 2.5 ft³. */
export function relevelRow(structureNumber: string, values: RowInput = {}): RowInput {
  return {
    structureNumber,
    padLengthIn: 40,
    padWidthIn: 40,
    gap1In: 2,
    gap2In: 2,
    gap3In: 2,
    gap4In: 2,
    slopeBeforeAlongInPerFt: 0.6,
    slopeBeforeAcrossInPerFt: 0,
    slopeAfterAlongInPerFt: 0,
    slopeAfterAcrossInPerFt: 0,
    raisedAt: '2026-04-14T09:30',
    loweredAt: '2026-04-14T10:10',
    releasedAt: '2026-04-14T10:30',
    ...placeOf(structureNumber),
    ...PLACE,
    ...values,
  };
}

/** The pour at 10:00 that fills `straightenRow` or `relevelRow`. */
export const repairPours = (
  structureNumber: string,
  lot: string,
  { kind, ...values }: RowInput & { readonly kind: 'straighten' | 'relevel' },
): RowInput[] => [pourRow(structureNumber, lot, { kitFt3: kind === 'straighten' ? 1.5 : 2.5, ...values })];
