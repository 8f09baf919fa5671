import { pourRow } from '#tests/factories/set-row.ts';
import { EXPIRED_LOT, HELD_LOT, LOT, SCARCE_LOT, type RuleCase } from './rule-case.ts';

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
];
