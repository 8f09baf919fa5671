import { writeWorkbook, type RowInput } from '#server/workbook/write-workbook.ts';

export const VIEWS = ['bore-depth', 'kits', 'finish', 'plumb'];
export const numberOf = (index: number): string => `B-${String(index + 1).padStart(6, '0')}`;

/** A plain set pole; each tenth is set half a foot short, each fifteenth short of foam. Invented figures. */
function setRow(index: number): RowInput {
  return {
    structureNumber: numberOf(index),
    poleLengthFt: 40,
    poleClass: '4',
    poleMaterial: 'southern-pine',
    girthGroundLineIn: 35 + (index % 5) / 4,
    girthButtIn: 38 + (index % 5) / 4,
    boreTopIn: 20,
    boreBottomIn: 20 - (index % 3) / 2,
    boreDepthFt: 6,
    ground: 'soil',
    embedmentFt: index % 10 === 0 ? 5.5 : 6,
    foamTopBelowGradeIn: 0,
    waterIn: index % 4 === 0 ? 0.5 : 0,
    leanInPer10Ft: 0.25,
    boredAt: '2026-04-14T09:00',
    setAt: '2026-04-14T09:40',
    letGoAt: '2026-04-14T10:05',
    hardwareAt: '2026-04-14T11:00',
    loadAt: 'not-yet',
    latitude: 41.9 + (index % 100) / 1000,
    longitude: -94.7 - Math.floor(index / 100) / 1000,
    accuracyFt: 5,
    locateTicket: 'LT-1',
    locateFrom: '2026-04-10',
    locateTo: '2026-04-24',
  };
}

function pourRows(index: number): RowInput[] {
  const row = {
    structureNumber: numberOf(index),
    pourNumber: 1,
    pouredAt: '2026-04-14T10:00',
    product: 'EP-15',
    lot: 'LK-2291',
    quantity: 1,
    componentATempF: 72,
    componentBTempF: 72,
  };
  const main = { ...row, kitFt3: index % 15 === 0 ? 4 : 8 };
  return index % 5 === 0 ? [main, { ...row, kitFt3: 1.5 }] : [main];
}

export async function writeBenchWorkbook(file: string, lines: number, workOrder = 'BENCH'): Promise<void> {
  const indexes = Array.from({ length: lines }, (_, index) => index);
  await writeWorkbook(file, {
    workOrder,
    contractor: 'Brindle Line Constructors',
    foreman: 'A foreman',
    set: indexes.map(setRow),
    pours: indexes.flatMap(pourRows),
  });
}
