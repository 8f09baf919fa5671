import { pourRow } from '#tests/factories/set-row.ts';
import { EXPIRED_LOT, HELD_LOT, LOT, SCARCE_LOT, TAKEN_PLACE, type RuleCase } from './rule-case.ts';

const lots =
  (lot: string, kitFt3 = 8) =>
  (structure: string) => [pourRow(structure, lot, { kitFt3 }), pourRow(structure, LOT, { kitFt3: 1.5 })];

/** Each as in rule-cases.ts: what is seen only with what the owner knows beside the workbook. */
export const CONTEXT_CASES: readonly RuleCase[] = [
  {
    // Poured on 2026-04-14; the lot's last day was the day before.
    code: 'lot-expired',
    fails: {
      pours: lots(EXPIRED_LOT),
      expected: { measured: '2026-04-14', limit: '2026-04-13', margin: -1, unit: 'd' },
    },
    passes: {
      values: { boredAt: '2026-04-13T09:00', setAt: '2026-04-13T09:40' },
      pours: (structure) => [
        pourRow(structure, EXPIRED_LOT, { pouredAt: '2026-04-13T10:00' }),
        pourRow(structure, LOT, { pouredAt: '2026-04-13T10:00', kitFt3: 1.5 }),
      ],
    },
  },
  {
    // Held from 2026-04-12 to 2026-04-20.
    code: 'lot-held',
    fails: { pours: lots(HELD_LOT), expected: { measured: 'held', limit: 'in-use', margin: null } },
    passes: {
      values: { boredAt: '2026-04-11T09:00', setAt: '2026-04-11T09:40' },
      pours: (structure) => [
        pourRow(structure, HELD_LOT, { pouredAt: '2026-04-11T10:00' }),
        pourRow(structure, LOT, { pouredAt: '2026-04-11T10:00', kitFt3: 1.5 }),
      ],
    },
  },
  {
    // Two kits of 8 ft³ and one of 6 were received: the second of 6 is one too many.
    code: 'lot-overdrawn',
    onBatch: true,
    fails: {
      pours: (structure) => [pourRow(structure, SCARCE_LOT, { kitFt3: 6, quantity: 2 })],
      expected: { measured: 2, limit: null, margin: null, unit: 'count', severity: 'query' },
    },
    passes: { pours: lots(SCARCE_LOT) },
  },
  {
    // 0.001° of latitude at 41° north are 364.3501 ft (GeographicLib); less 5 ft of accuracy.
    code: 'position-off',
    fails: {
      values: { latitude: 41.001, longitude: -98.5 },
      planned: { latitude: 41, longitude: -98.5 },
      expected: { measured: 359.3501, limit: 15, margin: -344.3501, unit: 'ft', severity: 'query' },
    },
    passes: {
      values: { latitude: 41.00005, longitude: -98.6 },
      planned: { latitude: 41, longitude: -98.6 },
    },
  },
  {
    // Where another structure is on record, put there by another contractor, 5 ft of accuracy on either side.
    code: 'position-shared',
    fails: {
      values: TAKEN_PLACE,
      planned: TAKEN_PLACE,
      expected: { measured: 0, limit: 3, margin: -3, unit: 'ft', severity: 'query' },
    },
    passes: {
      values: { ...TAKEN_PLACE, longitude: -98.701 },
      planned: { ...TAKEN_PLACE, longitude: -98.701 },
    },
  },
  {
    code: 'position-outside',
    fails: {
      values: { latitude: 43.5, longitude: -97.5 },
      planned: { latitude: 43.5, longitude: -97.5 },
      expected: { measured: '43.5, -97.5', limit: null, margin: null, field: 'latitude' },
    },
    passes: {
      values: { latitude: 43, longitude: -97.5 },
      planned: { latitude: 43, longitude: -97.5 },
    },
  },
];
