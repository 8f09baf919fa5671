import { describe, expect, it } from 'vitest';
import type { Finding } from '#shared/findings/types.ts';
import { RULES } from './registry.ts';

const EMPTY: Finding = {
  code: '',
  severity: 'nonconformity',
  kind: 'set',
  structureNumber: 'S-1',
  occurrence: 1,
  sheet: 'Set',
  row: 4,
  cell: 'B4',
  field: null,
  measured: null,
  limit: null,
  margin: null,
  unit: null,
  uncertainty: null,
  params: {},
  ownerParams: {},
  fingerprint: '',
};

/** By hand: rule, what of the finding decides the sentence, and the words that must stand in it then. */
const CASES: readonly (readonly [code: string, finding: Partial<Finding>, words: string])[] = [
  ['already-on-record', { measured: 'S-1' }, 'as set, and'],
  ['already-on-record', { measured: 'S-1', params: { recordNumber: 'AB-7' } }, 'as set (AB-7), and'],
  ['already-on-record', { measured: 'S-1', ownerParams: { recordNumber: 'AB-8' } }, 'as set (AB-8), and'],
  // −1.25 in on each side: the pole is 2.5 in wider.
  ['annulus-narrow', { measured: -1.25, limit: 2 }, 'wider than its bore by 2.5 in'],
  ['annulus-narrow', { measured: 0, limit: 2 }, 'The least space between bore and pole'],
  ['annulus-narrow', { measured: 1, limit: 2, params: { taped: true } }, '1 in and at least'],
  ['annulus-narrow', { measured: 1, limit: 2, params: { taped: false } }, 'from the sizes of both'],
  ['annulus-narrow', { measured: 'not read', limit: 2 }, 'The least space between bore and pole'],
  ['bore-shallow', { measured: 5, params: { bedFt: 0, embedmentFt: 6 } }, 'cannot stand deeper'],
  ['bore-shallow', { measured: 6, params: { bedFt: 0.5, embedmentFt: 6 } }, 'the bed of'],
  [
    'clock-order',
    { measured: '2026-04-14T10:00', limit: '2026-04-14T10:20', margin: -20 },
    'is 20 min before',
  ],
  ['clock-order', { measured: '2026-04-14T10:00', limit: '2026-04-14T10:20' }, 'is – before'],
  ['crown-low', { measured: 3, limit: 0 }, 'it must reach grade'],
  ['crown-low', { measured: 3, limit: 1 }, 'no lower than'],
  ['done-twice', { measured: 2, params: { approved: true } }, 'already has an approved line'],
  ['done-twice', { measured: 2, params: { approved: false } }, 'stands 2 times'],
  ['fill-excess', { params: { placedFt3: 8 } }, 'leave no void at all'],
  ['fill-excess', { measured: 2, limit: 1.5, params: { placedFt3: 8, voidFt3: 4 } }, 'foam ran off'],
  [
    'kit-unknown',
    { measured: 'XX', limit: ['EP-15'] as never, params: { what: 'product' } },
    'not one of the owner',
  ],
  ['kit-unknown', { measured: 7, params: { what: 'kit', product: 'EP-15' } }, 'EP-15 has no kit of'],
  ['lean-left', { measured: 2, limit: 1, params: { rake: 0 } }, 'still leans'],
  ['lean-left', { measured: 2, limit: 1, params: { rake: 1 } }, 'from the rake of'],
  ['lean-unproved', { params: { when: 'before' } }, 'was left blank'],
  ['lean-unproved', { measured: 'not-measured', params: { when: 'before' } }, 'was not measured'],
  ['lift-early', { measured: -2, limit: 3, params: { pourNumber: 2 } }, 'ended 2 min before the pour'],
  ['lift-early', { measured: 0, limit: 3, params: { pourNumber: 2 } }, 'ended 0 min after'],
  ['lift-early', { measured: 2, limit: 3, params: { pourNumber: 2 } }, 'ended 2 min after'],
  ['lift-early', { measured: 'x', limit: 3, params: { pourNumber: 2 } }, 'after the one before it'],
  ['lot-held', { measured: 'held', params: { lot: 'L-1', since: null, later: false } }, 'was held when'],
  [
    'lot-held',
    { measured: 'held', params: { lot: 'L-1', since: '2026-04-01', later: false } },
    'held since 2026-04-01',
  ],
  ['lot-held', { measured: 'recalled', params: { since: null, later: true } }, 'after it was poured.'],
  [
    'lot-held',
    { measured: 'recalled', params: { since: '2026-05-01', later: true } },
    'poured (2026-05-01).',
  ],
  ['lot-overdrawn', { measured: 3, params: { lot: 'L-1' } }, 'the owner received. This'],
  [
    'lot-overdrawn',
    { measured: 3, ownerParams: { used: 12, received: 10 } },
    'received: 12 used, 10 received',
  ],
  ['not-on-order', { measured: 'S-1', kind: null }, 'it stands on'],
  ['not-on-order', { measured: 'S-1', kind: 'relevel' }, 'for the sheet Re-level'],
  ['photo-alike', { measured: 'a.jpg', params: { view: 'gap', bits: 3 } }, 'one of another structure'],
  [
    'photo-alike',
    { measured: 'a.jpg', params: { view: 'gap', bits: 3, other: 'S-9' } },
    'one of structure S-9',
  ],
  ['photo-reused', { measured: 'a.jpg', params: { view: 'gap' } }, 'for another structure too'],
  [
    'photo-reused',
    { params: { view: 'gap', other: 'S-9', otherBatch: '17-1' } },
    'structure S-9 in batch 17-1 too',
  ],
  ['plumb-out', { measured: 2, limit: 1, params: { rake: 0 } }, 'allowed.'],
  ['plumb-out', { measured: 2, limit: 1, params: { rake: 1, lean: 3 } }, 'from the rake of'],
  ['position-off', { limit: 15, params: { distanceFt: 20, accuracyFt: 0 } }, 'is allowed.'],
  ['position-off', { limit: 15, params: { distanceFt: 20, accuracyFt: 3 } }, 'of accuracy allowed for'],
  ['position-shared', { limit: 3, params: { distanceFt: 1 } }, 'that of another structure'],
  ['position-shared', { limit: 3, params: { distanceFt: 1, other: 'S-9' } }, 'that of structure S-9'],
  ['unproved', { params: { title: 'Water' } }, 'was left blank'],
  ['unproved', { measured: 'not-measured', params: { title: 'Water' } }, 'says "not measured"'],
  ['water-deep', { measured: 3, limit: 2, params: { waterIn: 3 } }, 'with the structure in the bore'],
  ['water-deep', { measured: 3, limit: 2, params: { waterIn: 1.5 } }, 'in the open bore stands'],
  [
    'water-deep',
    { measured: 72, limit: 2, params: { waterIn: 100, boreIn: 72 } },
    'more than the bore is deep',
  ],
  ['load-early', { measured: -5, limit: 60, params: { factor: 1 } }, '5 min before the last pour'],
  ['load-early', { measured: 0, limit: 60, params: { factor: 1 } }, '0 min after the last pour'],
  ['load-early', { measured: 50, limit: 60, params: { factor: 1 } }, '60 min is due.'],
  [
    'load-early',
    { measured: 50, limit: 75, params: { factor: 1.25, baseMin: 60, coldestF: 50 } },
    'lengthened for',
  ],
  ['load-early', { measured: 'x', limit: 60, params: { factor: 1 } }, 'after the last pour'],
];

const ruleOf = (code: string) => RULES.find((rule) => rule.code === code);

describe('sentences that say one thing or another', () => {
  it.each(CASES)('%s: %j', (code, finding, words) => {
    expect(ruleOf(code)?.message({ ...EMPTY, code, ...finding })).toContain(words);
  });

  it('says no more than the lean where the design asks for no rake', () => {
    const said = ruleOf('plumb-out')?.message({ ...EMPTY, measured: 2, limit: 1, params: { rake: 0 } });
    expect(said).not.toContain('rake');
  });
});

// 10 °C = 50 °F and 25 °C = 77 °F: the ends of the band count as in it.
it.each([
  ['the lower end', 10, true],
  ['the upper end', 25, true],
  ['colder than the band', 9, false],
  ['warmer than the band', 26, false],
  ['no number', 'x', false],
])('foam-cold tells what a reading would be in °C: %s', (_what, measured, told) => {
  const finding = { ...EMPTY, measured, limit: 40, params: { lowF: 50, highF: 77 } };
  expect(ruleOf('foam-cold')?.remedy(finding).includes('°C would be')).toBe(told);
});

describe('what to do about it', () => {
  it.each([
    ['clock-unreal', { problem: 'overlap' }, 'outside the repeated hour'],
    ['clock-unreal', { problem: 'gap' }, 'Correct the time'],
    ['kit-unknown', { what: 'product' }, 'Write the product'],
    ['kit-unknown', { what: 'kit' }, 'Write the kit size'],
    ['water-deep', { waterIn: 3 }, 'bailed before foam is poured'],
    ['water-deep', { waterIn: 100, boreIn: 72 }, 'Correct the depth of water or of the bore'],
  ])('%s: %j', (code, params, words) => {
    expect(ruleOf(code)?.remedy({ ...EMPTY, code, params })).toContain(words);
  });
});
