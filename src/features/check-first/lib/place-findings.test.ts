import { describe, expect, it } from 'vitest';
import type { ShownFinding } from '#shared/check/shown-finding.ts';
import { placeFindings } from './place-findings.ts';

const DERIVED = {
  voidFt3: null,
  placedFt3: null,
  fillRatio: null,
  fillRatioU: null,
  dueFt: null,
  waterWithPoleIn: null,
  leastAnnulusIn: null,
  poleTaped: null,
  worstReading: null,
};

const finding = (given: Partial<ShownFinding>): ShownFinding => ({
  code: 'water-deep',
  severity: 'nonconformity',
  kind: 'set',
  structureNumber: 'L-1',
  occurrence: 1,
  sheet: 'Set',
  row: 4,
  cell: 'AF4',
  field: 'waterIn',
  measured: 3,
  limit: 2,
  margin: -1,
  unit: 'in',
  uncertainty: null,
  params: {},
  fingerprint: 'f',
  title: 'Water deep',
  message: 'Too deep.',
  remedy: 'Bail it.',
  ...given,
});

const placed = (findings: readonly ShownFinding[]) =>
  placeFindings(
    {
      type: 'typed',
      turn: 1,
      notRun: [],
      loose: findings.filter(({ kind }) => kind === null),
      line: {
        kind: 'set',
        structureNumber: 'L-1',
        occurrence: 1,
        sheet: 'Set',
        row: 4,
        values: {},
        derived: DERIVED,
        workDay: null,
        standardNumber: 1,
        pours: [],
        findings: findings.filter(({ kind }) => kind !== null),
      },
    },
    {
      draft: { kind: 'set', values: { waterIn: '3' }, pours: [{ quantity: '0' }, {}] },
      fields: new Set(['waterIn', 'hardwareAt']),
    },
  ).map(({ input, blank }) => ({ input, blank }));

describe('where a finding on a typed line belongs', () => {
  it('is its field, or its row of pours by the row of the sheet', () => {
    expect(placed([finding({}), finding({ sheet: 'Pours', row: 4, field: 'quantity' })])).toEqual([
      { input: 'line-waterIn', blank: false },
      { input: 'pour-0-quantity', blank: false },
    ]);
  });

  it('is still to be filled in where nothing was typed, whatever rule says so', () => {
    expect(
      placed([
        finding({ code: 'unproved', field: 'hardwareAt' }),
        finding({ code: 'record-missing', sheet: 'Pours', row: 5, field: 'lot' }),
      ]),
    ).toEqual([
      { input: 'line-hardwareAt', blank: true },
      { input: 'pour-1-lot', blank: true },
    ]);
  });

  it('leaves out the sheets that a typed line has none of, and keeps what has no field', () => {
    expect(
      placed([finding({ kind: null, sheet: 'Batch', field: 'foreman' }), finding({ field: null })]),
    ).toEqual([{ input: null, blank: false }]);
  });

  it('says nothing of a pour without a line: the pours of a typed line are its own', () => {
    expect(
      placed([
        finding({ kind: null, code: 'pour-orphan', sheet: 'Pours', row: 4, field: 'structureNumber' }),
      ]),
    ).toEqual([]);
  });
});
