import {
  SHEET_OF_KIND,
  type FieldValues,
  type Kind,
  type SourceBatch,
  type SourceRow,
} from '#shared/records/types.ts';

/** Batches as the reader hands them on, for tests: every line clean on the demo standard unless a test changes a value. */

/** Record WR-01 of the worked records: void 8.6701 ft³, placed 9.5 ft³, fill ratio 1.0957, least annulus 3.952 in, 6 ft due. */
const SET: FieldValues = {
  structureNumber: 'S-1',
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
  hardwareAt: '2026-04-14T10:40',
  loadAt: 'not-yet',
  latitude: 35.1,
  longitude: -97.4,
  locateTicket: 'T-1',
  locateFrom: '2026-04-10',
  locateTo: '2026-04-24',
};

/** WR-17: void 0.6875 ft³; 1.5 ft³ is one smallest kit. */
const STRAIGHTEN: FieldValues = {
  structureNumber: 'S-2',
  poleMaterial: 'southern-pine',
  diameterGroundLineIn: 11,
  embedmentFt: 6,
  leanBeforeInPer10Ft: 6,
  leanBeforeAzimuthDeg: 90,
  leanAfterInPer10Ft: 0.2,
  gapAtGradeIn: 4,
  gapDepthFt: 4.5,
  waterIn: 0,
  pulledAt: '2026-04-14T11:00',
  releasedAt: '2026-04-14T11:40',
  reattachedAt: '2026-04-14T12:00',
  latitude: 35.2,
  longitude: -97.4,
  locateTicket: 'T-1',
  locateFrom: '2026-04-10',
  locateTo: '2026-04-24',
};

/** WR-20's sizes with gaps of a flat pad, 2 in each: void 40 · 40 · 2 / 1728 = 1.8519 ft³. */
const RELEVEL: FieldValues = {
  structureNumber: 'P-1',
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
  raisedAt: '2026-04-14T13:00',
  loweredAt: '2026-04-14T13:40',
  releasedAt: '2026-04-14T14:00',
  latitude: 35.3,
  longitude: -97.4,
  locateTicket: 'T-1',
  locateFrom: '2026-04-10',
  locateTo: '2026-04-24',
};

const POUR: FieldValues = {
  pourNumber: 1,
  product: 'EP-15',
  lot: 'L-100',
  quantity: 1,
  componentATempF: 72,
  componentBTempF: 72,
};

export const CLEAN_LINES: Readonly<Record<Kind, FieldValues>> = {
  set: SET,
  straighten: STRAIGHTEN,
  relevel: RELEVEL,
};

/** Pours that fill each clean line. */
export const CLEAN_POURS: Readonly<Record<Kind, readonly FieldValues[]>> = {
  set: [
    { ...POUR, structureNumber: 'S-1', pouredAt: '2026-04-14T10:00', kitFt3: 8 },
    { ...POUR, structureNumber: 'S-1', pouredAt: '2026-04-14T10:00', kitFt3: 1.5 },
  ],
  straighten: [{ ...POUR, structureNumber: 'S-2', pouredAt: '2026-04-14T11:20', kitFt3: 1.5 }],
  relevel: [{ ...POUR, structureNumber: 'P-1', pouredAt: '2026-04-14T13:10', kitFt3: 2.5 }],
};

const BATCH: FieldValues = {
  workOrder: 'W-1',
  contractor: 'Brindle',
  foreman: 'A. Foreman',
  templateVersion: '2',
};

/** Column letters by place: A, B … Z, AA. */
const letters = (index: number): string =>
  index < 26
    ? String.fromCharCode(65 + index)
    : `${letters(Math.floor(index / 26) - 1)}${letters(index % 26)}`;

/** A row as the reader makes it: blanks absent, a cell for each value, columns in the order of the keys given. */
export const rowOf = (sheet: string, row: number, values: FieldValues): SourceRow => {
  const given = Object.entries(values).filter(([, value]) => value !== null);
  return {
    sheet,
    row,
    values: Object.fromEntries(given),
    cells: Object.fromEntries(
      Object.keys(values).flatMap((field, index) =>
        values[field] === null
          ? []
          : [[field, { address: `${letters(index)}${row}`, raw: String(values[field]) }]],
      ),
    ),
    problems: [],
  };
};

export type BatchParts = {
  readonly lines: readonly { readonly kind: Kind; readonly values: FieldValues }[];
  readonly pours?: readonly FieldValues[];
  readonly events?: readonly FieldValues[];
  readonly photos?: readonly FieldValues[];
  readonly batch?: FieldValues;
};

export const batchOf = ({
  lines,
  pours = [],
  events = [],
  photos = [],
  batch = BATCH,
}: BatchParts): SourceBatch => ({
  batch: rowOf('Batch', 1, batch),
  lines: lines.map(({ kind, values }, index) => ({
    ...rowOf(SHEET_OF_KIND[kind], index + 4, values),
    kind,
    structureNumber: String(values['structureNumber'] ?? ''),
  })),
  pours: pours.map((values, index) => rowOf('Pours', index + 4, values)),
  events: events.map((values, index) => rowOf('Events', index + 4, values)),
  photos: photos.map((values, index) => rowOf('Photos', index + 4, values)),
  notices: [],
  templateVersion: '2',
});

/** One clean line of each kind that is named, with its pours, after the given changes (null blanks a field). */
export const cleanBatch = (changes: Partial<Readonly<Record<Kind, FieldValues>>>): SourceBatch => {
  const kinds = Object.keys(changes) as Kind[];
  return batchOf({
    lines: kinds.map((kind) => ({ kind, values: { ...CLEAN_LINES[kind], ...changes[kind] } })),
    pours: kinds.flatMap((kind) => CLEAN_POURS[kind]),
  });
};
