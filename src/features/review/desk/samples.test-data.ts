import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';

/** A line of a batch for tests of the desk. */
export function sampleLine({
  undecided = 0,
  ...patch
}: Partial<RecordRow> & { readonly undecided?: number } = {}): RecordRow {
  return {
    id: 'l1',
    lineId: 'line-1',
    kind: 'set',
    structureNumber: '17-0417',
    occurrence: 1,
    sheet: 'Set',
    row: 9,
    state: 'undecided',
    values: { poleLengthFt: 40, poleClass: '4' },
    derived: {
      voidFt3: 6.4,
      placedFt3: 8,
      fillRatio: 1.25,
      fillRatioU: 0.15,
      dueFt: 6,
      waterWithPoleIn: null,
      leastAnnulusIn: 3,
      poleTaped: true,
      worstReading: null,
    },
    photos: [],
    counts: { nonconformity: undecided, query: 0, note: 0, undecided },
    standard: 3,
    workDay: '2026-04-14',
    decision: null,
    version: 0,
    can: ['decide'],
    ...patch,
  };
}

export function sampleFinding(patch: Partial<FindingRow> = {}): FindingRow {
  return {
    id: 'f1',
    recordId: 'l1',
    lineId: 'line-1',
    kind: 'set',
    code: 'embedment-short',
    title: 'Embedment short',
    severity: 'nonconformity',
    structureNumber: '17-0417',
    sheet: 'Set',
    row: 9,
    cell: 'H9',
    field: 'embedmentFt',
    measured: 5.8,
    limit: 6,
    margin: -0.2,
    unit: 'ft',
    uncertainty: null,
    params: {},
    message: 'The pole is set 5.8 ft deep; at least 6 ft is due.',
    remedy: 'Set it deeper.',
    answer: null,
    state: 'undecided',
    decision: null,
    concession: null,
    version: 0,
    can: ['decide', 'ask-concession'],
    ...patch,
  };
}
