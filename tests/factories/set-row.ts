import type { RowInput } from '#server/workbook/write-workbook.ts';
import { placeOf } from './place.ts';

/**
 * A set pole that meets every rule: 40 ft class 4 taped, 20 in bore, 6 ft deep in soil (6.0 ft due), poured with 9.5 ft³
 * over a void of 8.6701 ft³ (worked record WR-01: ratio 1.0957).
 */
export function setRow(structureNumber: string, values: RowInput = {}): RowInput {
  return {
    structureNumber,
    poleLengthFt: 40,
    poleClass: '4',
    poleMaterial: 'southern-pine',
    girthGroundLineIn: 35,
    girthButtIn: 38,
    boreTopIn: 20,
    boreDepthFt: 6,
    ground: 'soil',
    embedmentFt: 6,
    foamTopBelowGradeIn: 0,
    waterIn: 0,
    leanInPer10Ft: 0,
    boredAt: '2026-04-14T09:00',
    setAt: '2026-04-14T09:40',
    letGoAt: '2026-04-14T10:05',
    hardwareAt: '2026-04-14T11:00',
    loadAt: '2026-04-15T08:00',
    ...placeOf(structureNumber),
    accuracyFt: 5,
    locateTicket: 'LT-1',
    locateFrom: '2026-04-10',
    locateTo: '2026-04-24',
    ...values,
  };
}

/** One pour row at 10:00 of the work day: an 8 ft³ kit at 72 °F, of the lot given. */
export function pourRow(structureNumber: string, lot: string, values: RowInput = {}): RowInput {
  return {
    structureNumber,
    pourNumber: 1,
    pouredAt: '2026-04-14T10:00',
    product: 'EP-15',
    lot,
    kitFt3: 8,
    quantity: 1,
    componentATempF: 72,
    componentBTempF: 72,
    ...values,
  };
}

/** The two rows of the pour that fills `setRow`: kits of 8 and 1.5 ft³. */
export function pourRows(structureNumber: string, lot: string, values: RowInput = {}): RowInput[] {
  return [pourRow(structureNumber, lot, values), pourRow(structureNumber, lot, { kitFt3: 1.5, ...values })];
}

export const SET_VIEWS = ['bore-depth', 'kits', 'finish', 'plumb'] as const;
