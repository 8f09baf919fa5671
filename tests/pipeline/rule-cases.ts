import type { RowInput } from '#server/workbook/write-workbook.ts';
import { pourRow } from '#tests/factories/set-row.ts';
import { kits, LOT, type RuleCase } from './rule-case.ts';

/** A 12 in pole as a cylinder in an 18 in bore, 6 ft deep: void 5.8905 ft³ (worked record WR-08). */
const CYLINDER = {
  boreTopIn: 18,
  girthGroundLineIn: null,
  girthButtIn: null,
  diameterGroundLineIn: 12,
  diameterButtIn: 12,
};

/** The line that is not changed: embedment 6.0 ft of 6.0 due; fill 9.5 / 8.6701 = 1.0957 (worked record WR-01). */
export const RULE_CASES: readonly RuleCase[] = [
  {
    // 40 ft in soil: 6.0 ft due. 5.9 − 6.0 = −0.1.
    code: 'embedment-short',
    fails: { values: { embedmentFt: 5.9 }, expected: { measured: 5.9, limit: 6, margin: -0.1, unit: 'ft' } },
    passes: { values: { embedmentFt: 6 } },
  },
  {
    // At most 6.0 + 1.5 = 7.5 ft. 7.5 − 7.6 = −0.1. The void grows to some 11 ft³: kits of 8 and 4.
    code: 'embedment-deep',
    fails: {
      values: { embedmentFt: 7.6, boreDepthFt: 7.6 },
      pours: kits(8, 4),
      expected: { measured: 7.6, limit: 7.5, margin: -0.1, unit: 'ft', severity: 'query' },
    },
    passes: { values: { embedmentFt: 7.5, boreDepthFt: 7.5 }, pours: kits(8, 4) },
  },
  {
    // At least 6.0 + no bed − 0.1 = 5.9 ft. 5.8 − 5.9 = −0.1.
    code: 'bore-shallow',
    fails: {
      values: { boreDepthFt: 5.8 },
      expected: { measured: 5.8, limit: 5.9, margin: -0.1, unit: 'ft' },
    },
    passes: { values: { boreDepthFt: 5.9 } },
  },
  {
    // At least 2 in. 1.9 − 2 = −0.1.
    code: 'annulus-narrow',
    fails: { values: { leastGapIn: 1.9 }, expected: { measured: 1.9, limit: 2, margin: -0.1, unit: 'in' } },
    passes: { values: { leastGapIn: 2 } },
  },
  {
    // 8 / 8.6701 = 0.9227; 0.9227 − 1 = −0.0773. With a further 1.5 ft³: 1.0957.
    code: 'fill-short',
    fails: { pours: kits(8), expected: { measured: 0.9227, limit: 1, margin: -0.0773, unit: 'ratio' } },
    passes: { pours: kits(8, 1.5) },
  },
  {
    // 14 / 8.6701 = 1.6147; 1.5 − 1.6147 = −0.1147, and the surplus of 5.33 ft³ is over the smallest kit.
    // 12.5 / 8.6701 = 1.4417.
    code: 'fill-excess',
    fails: {
      pours: kits(8, 6),
      expected: { measured: 1.6147, limit: 1.5, margin: -0.1147, unit: 'ratio', severity: 'query' },
    },
    passes: { pours: kits(8, 2.5, 2.5) },
  },
  {
    // No lower than grade: 0 − 0.5 = −0.5.
    code: 'crown-low',
    fails: {
      values: { foamTopBelowGradeIn: 0.5 },
      expected: { measured: 0.5, limit: 0, margin: -0.5, unit: 'in', severity: 'query' },
    },
    passes: { values: { foamTopBelowGradeIn: 0 } },
  },
  {
    // 18² / (18² − 12²) = 1.8 times as deep with the pole in: 1.2 in → 2.16 in; 2 − 2.16 = −0.16. 1.1 in → 1.98 in.
    code: 'water-deep',
    fails: {
      values: { ...CYLINDER, waterIn: 1.2 },
      pours: kits(6),
      expected: { measured: 2.16, limit: 2, margin: -0.16, unit: 'in' },
    },
    passes: { values: { ...CYLINDER, waterIn: 1.1 }, pours: kits(6) },
  },
  {
    // Poured until 10:00, first work at 10:14: 14 min of 15 at 72 °F.
    code: 'hardware-early',
    fails: {
      values: { hardwareAt: '2026-04-14T10:14' },
      expected: { measured: 14, limit: 15, margin: -1, unit: 'min', field: 'hardwareAt' },
    },
    passes: { values: { hardwareAt: '2026-04-14T10:15' } },
  },
  {
    // The second pour 2 min after the first, of 3.
    code: 'lift-early',
    fails: {
      pours: (structure) => lift(structure, '2026-04-14T10:02'),
      expected: { measured: 2, limit: 3, margin: -1, unit: 'min' },
    },
    passes: {
      values: { letGoAt: '2026-04-14T10:06' },
      pours: (structure) => lift(structure, '2026-04-14T10:03'),
    },
  },
  {
    // Set at 08:30, half an hour before it was bored.
    code: 'clock-order',
    fails: {
      values: { setAt: '2026-04-14T08:30' },
      expected: { measured: '2026-04-14T08:30', limit: '2026-04-14T09:00', margin: -30, unit: 'min' },
    },
    passes: { values: { setAt: '2026-04-14T09:00' } },
  },
  {
    // Chicago, 2026-03-08: clocks went from 02:00 to 03:00 (second Sunday of March, 15 U.S.C. 260a).
    code: 'clock-unreal',
    fails: {
      values: { boredAt: '2026-03-08T02:30', locateFrom: '2026-03-01' },
      expected: { measured: '2026-03-08T02:30', limit: null, margin: null, field: 'boredAt' },
    },
    passes: { values: { boredAt: '2026-03-08T03:00', locateFrom: '2026-03-01' } },
  },
  {
    code: 'pour-none',
    fails: { pours: () => [], expected: { measured: 0, limit: 1, margin: -1, unit: 'count' } },
    passes: {},
  },
  {
    // Kits of EP-15 are 1.5, 2.5, 4, 6 and 8 ft³. 8 + 3 ft³ still fill the void.
    code: 'kit-unknown',
    fails: {
      pours: kits(8, 3),
      expected: { measured: 3, limit: '1.5, 2.5, 4, 6, 8', margin: null, unit: 'ft3' },
    },
    passes: { pours: kits(8, 2.5) },
  },
  {
    code: 'lot-unknown',
    fails: {
      pours: (structure) => [pourRow(structure, LOT), pourRow(structure, 'NO-SUCH-LOT', { kitFt3: 1.5 })],
      expected: { measured: 'NO-SUCH-LOT', limit: null, margin: null },
    },
    passes: {},
  },
  {
    // Nothing is written of the first work; "not by us" is a value.
    code: 'unproved',
    fails: {
      values: { hardwareAt: null },
      expected: { measured: null, limit: null, margin: null, field: 'hardwareAt', severity: 'query' },
    },
    passes: { values: { hardwareAt: 'not-by-us' } },
  },
  {
    code: 'record-missing',
    fails: { values: { leanInPer10Ft: null }, expected: { field: 'leanInPer10Ft', margin: null } },
    passes: { values: { accuracyFt: null } },
  },
  {
    code: 'record-unreadable',
    fails: {
      values: { leanInPer10Ft: '1.200,5' },
      expected: { field: 'leanInPer10Ft', measured: '1.200,5', margin: null },
    },
    passes: { values: { leanInPer10Ft: ' 0.2 ' } },
  },
  {
    code: 'record-unit',
    fails: {
      values: { accuracyFt: '16 in' },
      expected: { field: 'accuracyFt', measured: '16 in', margin: null },
    },
    passes: { values: { accuracyFt: '16 ft' } },
  },
  {
    code: 'record-code',
    fails: { values: { structureUse: 'corner' }, expected: { field: 'structureUse', measured: 'corner' } },
    passes: { values: { structureUse: 'Dead-end' } },
  },
  {
    // A brand is looked for from 10 ft below grade to 30 ft above it: 30 − 31 = −1.
    code: 'record-range',
    fails: {
      values: { brandHeightFt: 31 },
      expected: { field: 'brandHeightFt', measured: 31, limit: 30, margin: -1, unit: 'ft' },
    },
    passes: { values: { brandHeightFt: 30 } },
  },
];

function lift(structure: string, pouredAt: string): RowInput[] {
  return [pourRow(structure, LOT), pourRow(structure, LOT, { pourNumber: 2, pouredAt, kitFt3: 1.5 })];
}
