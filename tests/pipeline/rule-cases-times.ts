import { pourRow } from '#tests/factories/set-row.ts';
import { kits, LOT, OTHER_LOT, OTHER_PRODUCT, type RuleCase } from './rule-case.ts';

/** Each as in rule-cases.ts: times, temperatures and locate tickets. */
export const TIME_CASES: readonly RuleCase[] = [
  {
    // Poured until 10:00, let go at 10:02: 2 min of 3.
    code: 'let-go-early',
    fails: {
      values: { letGoAt: '2026-04-14T10:02' },
      expected: { measured: 2, limit: 3, margin: -1, unit: 'min' },
    },
    passes: { values: { letGoAt: '2026-04-14T10:03' } },
  },
  {
    code: 'load-early',
    fails: {
      values: { loadAt: '2026-04-14T11:00', hardwareAt: '2026-04-14T10:20' },
      pours: (structure) => [
        pourRow(structure, LOT, { pouredAt: '2026-04-14T10:01' }),
        pourRow(structure, LOT, { pouredAt: '2026-04-14T10:01', kitFt3: 1.5 }),
      ],
      expected: { measured: 59, limit: 60, margin: -1, unit: 'min' },
    },
    passes: { values: { loadAt: '2026-04-14T11:00' } },
  },
  {
    code: 'release-early',
    kind: 'straighten',
    fails: {
      values: { releasedAt: '2026-04-14T10:14' },
      expected: { measured: 14, limit: 15, margin: -1, unit: 'min' },
    },
    passes: { values: { releasedAt: '2026-04-14T10:15' } },
  },
  {
    code: 'lowered-early',
    kind: 'relevel',
    fails: {
      values: { loweredAt: '2026-04-14T10:04' },
      expected: { measured: 4, limit: 5, margin: -1, unit: 'min' },
    },
    passes: { values: { loweredAt: '2026-04-14T10:05' } },
  },
  {
    // A year that no check of this program will see.
    code: 'clock-future',
    fails: {
      values: { loadAt: '2126-04-15T08:00' },
      expected: { measured: '2126-04-15T08:00', unit: 'min' },
    },
    passes: { values: { loadAt: '2026-04-14T11:00' } },
  },
  {
    // EP-15: 40 to 100 °F. At 39 °F waits are doubled, and 0.8 × (8 + 4) = 9.6 ft³ still fill the void.
    code: 'foam-cold',
    fails: {
      values: { letGoAt: '2026-04-14T10:06', hardwareAt: '2026-04-14T10:30' },
      pours: (structure) => [
        pourRow(structure, LOT, { componentATempF: 39 }),
        pourRow(structure, LOT, { kitFt3: 4 }),
      ],
      expected: { measured: 39, limit: 40, margin: -1, unit: 'degF' },
    },
    passes: {
      values: { letGoAt: '2026-04-14T10:06', hardwareAt: '2026-04-14T10:30' },
      pours: (structure) => [
        pourRow(structure, LOT, { componentATempF: 40 }),
        pourRow(structure, LOT, { kitFt3: 4 }),
      ],
    },
  },
  {
    code: 'foam-hot',
    fails: {
      pours: (structure) => [
        pourRow(structure, LOT, { componentBTempF: 101 }),
        pourRow(structure, LOT, { kitFt3: 1.5 }),
      ],
      expected: { measured: 101, limit: 100, margin: -1, unit: 'degF', field: 'componentBTempF' },
    },
    passes: {
      pours: (structure) => [
        pourRow(structure, LOT, { componentBTempF: 100 }),
        pourRow(structure, LOT, { kitFt3: 1.5 }),
      ],
    },
  },
  {
    code: 'locate-missing',
    fails: {
      values: { locateTicket: null },
      expected: { measured: null, limit: null, field: 'locateTicket' },
    },
    passes: {},
  },
  {
    // Bored on 2026-04-14, the day after the ticket's last.
    code: 'locate-lapsed',
    fails: {
      values: { locateTo: '2026-04-13' },
      expected: { measured: '2026-04-14', limit: '2026-04-13', margin: -1, unit: 'd' },
    },
    passes: { values: { locateTo: '2026-04-14' } },
  },
  {
    // 9.5 ft³ of one product and of another that the owner has too.
    code: 'product-mixed',
    fails: {
      pours: (structure) => [
        pourRow(structure, LOT),
        pourRow(structure, OTHER_LOT, { product: OTHER_PRODUCT, kitFt3: 1.5 }),
      ],
      expected: { measured: 2, limit: 1, margin: -1, unit: 'count', severity: 'query' },
    },
    passes: { pours: kits(8, 1.5) },
  },
];
