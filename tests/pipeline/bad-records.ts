import { badSet as set, WHOLE, type BadRecord } from './bad-record.ts';
import { BAD_TIMES_AND_REPAIRS } from './bad-records-times.ts';

const SIZES: readonly BadRecord[] = [
  set('Z-01', {
    what: 'a bore of no width; the depth due is still known',
    values: { boreTopIn: 0 },
    finds: [
      { code: 'record-range', at: 'Set!boreTopIn', measured: 0, limit: 4, says: ['Bore at top', '18 1/2'] },
    ],
    figures: { voidFt3: null, fillRatio: null, dueFt: 6, placedFt3: 9.5 },
  }),
  set('Z-02', {
    what: 'a girth below zero; the embedment is judged all the same',
    values: { girthGroundLineIn: -35, embedmentFt: 5.9 },
    finds: [
      { code: 'record-range', at: 'Set!girthGroundLineIn', measured: -35, limit: 6 },
      { code: 'embedment-short', at: 'Set!embedmentFt', measured: 5.9, limit: 6 },
    ],
    figures: { voidFt3: null, leastAnnulusIn: null },
  }),
  set('Z-03', {
    // 35 / π = 11.1408 in, the butt 38 / π = 12.0958 in: (10 − 12.0958) / 2 = −1.0479 in.
    what: 'a pole wider than its bore',
    values: { boreTopIn: 10 },
    finds: [
      {
        code: 'annulus-narrow',
        at: 'Set!boreTopIn',
        limit: 2,
        says: ['wider than its bore by 2.1 in', 'reamed'],
      },
      {
        code: 'fill-excess',
        at: 'Set!boreDepthFt',
        severity: 'query',
        measured: null,
        says: ['no void at all'],
      },
    ],
    figures: { voidFt3: 0, fillRatio: null, leastAnnulusIn: -1.0479 },
  }),
  set('Z-04', {
    what: 'a butt below the bottom of its bore',
    values: { boreDepthFt: 5 },
    finds: [
      {
        code: 'bore-shallow',
        at: 'Set!boreDepthFt',
        measured: 5,
        limit: 5.9,
        says: ['deeper than its bore'],
      },
    ],
    figures: { dueFt: 6 },
  }),
  set('Z-05', {
    // Three feet of a 20 in bore below the butt: 3 · π · 20² / 4 / 144 = 6.5450; 8.6701 + 6.5450 = 15.2151; 9.5 / 15.2151 = 0.6244.
    what: 'a butt three feet above the bottom of its bore: the space below wants foam too',
    values: { boreDepthFt: 9 },
    finds: [{ code: 'fill-short', at: 'Set!boreDepthFt', limit: 1, says: ['15.22 ft³', 'Check the sizes'] }],
    figures: { voidFt3: 15.2151, fillRatio: 0.6244 },
  }),
  set('Z-06', {
    what: 'more water than the bore is deep',
    values: { waterIn: 100 },
    finds: [
      {
        code: 'water-deep',
        at: 'Set!waterIn',
        measured: 72,
        limit: 2,
        says: ['more than the bore is deep, 72 in', 'another unit'],
      },
    ],
    figures: WHOLE,
  }),
  set('Z-07', {
    // 130 ft: 13 + 2 = 15 ft due beyond the table.
    what: 'a pole longer than any table, taped: computed from its girths',
    values: {
      poleLengthFt: 130,
      poleClass: '2',
      embedmentFt: 15,
      boreDepthFt: 15,
      boreTopIn: 30,
      girthGroundLineIn: 60,
      girthButtIn: 66,
    },
    pours: [{ quantity: 6 }],
    planned: { poleLengthFt: 130, poleClass: '2' },
    finds: [],
    figures: { dueFt: 15, placedFt3: 48, leastAnnulusIn: 4.4958 },
  }),
  set('Z-08', {
    what: 'a pole longer than any table, not taped: what is missing is named',
    values: {
      poleLengthFt: 130,
      poleClass: '2',
      embedmentFt: 15,
      boreDepthFt: 15,
      girthGroundLineIn: null,
      girthButtIn: null,
    },
    planned: { poleLengthFt: 130, poleClass: '2' },
    finds: [
      { code: 'record-conditional', at: 'Set!girthGroundLineIn', says: ['class table has no such pole'] },
      { code: 'record-conditional', at: 'Set!girthButtIn', says: ['class table has no such pole'] },
    ],
    figures: { voidFt3: null, dueFt: 15 },
  }),
  set('Z-09', {
    what: 'a class that there is none of, on a taped pole: its sizes are known',
    values: { poleClass: '8' },
    finds: [{ code: 'record-code', at: 'Set!poleClass', measured: '8', says: ['H6, H5, H4'] }],
    figures: { ...WHOLE, leastAnnulusIn: 3.9521, waterWithPoleIn: 0 },
  }),
  set('Z-10', {
    what: 'a species that no table has, not taped',
    values: { poleMaterial: 'oak', girthGroundLineIn: null, girthButtIn: null },
    finds: [
      { code: 'record-code', at: 'Set!poleMaterial', measured: 'oak', says: ['southern-pine, douglas-fir'] },
    ],
    figures: { voidFt3: null, dueFt: 6 },
  }),
];

const POURS: readonly BadRecord[] = [
  set('Z-21', {
    what: 'no kits',
    values: {},
    pours: [{}, { kitFt3: 1.5, quantity: 0 }],
    finds: [{ code: 'record-range', at: 'Pours!quantity', measured: 0, limit: 1, says: ['from 1 to 200'] }],
    figures: { voidFt3: 8.6701, placedFt3: null, fillRatio: null },
  }),
  set('Z-22', {
    what: 'a thousand million kits',
    values: {},
    pours: [{ quantity: 1_000_000_000 }],
    finds: [{ code: 'record-range', at: 'Pours!quantity', measured: 1_000_000_000, limit: 200 }],
    figures: { voidFt3: 8.6701, placedFt3: null },
  }),
  set('Z-23', {
    // Two of 5 ft³ fill the void all the same: 10 / 8.6701 = 1.1534.
    what: 'a kit size that the product has not',
    values: {},
    pours: [{ kitFt3: 5, quantity: 2 }],
    finds: [
      { code: 'kit-unknown', at: 'Pours!kitFt3', measured: 5, limit: '1.5, 2.5, 4, 6, 8', says: ['label'] },
    ],
    figures: { voidFt3: 8.6701, placedFt3: 10, fillRatio: 1.1534 },
  }),
  set('Z-24', {
    // 22 °C = 71.6 °F, 21 °C = 69.8 °F. As written, 21 °F gives 0.8 of the yield and twice the waits: 12 · 0.8 = 9.6 ft³, let go after 8 min of 6.
    what: '°C in columns of °F: a query, with what it would be',
    values: { letGoAt: '2026-04-14T10:08' },
    pours: [
      { componentATempF: 22, componentBTempF: 21 },
      { kitFt3: 4, componentATempF: 22, componentBTempF: 21 },
    ],
    finds: [
      {
        code: 'foam-cold',
        at: 'Pours!componentATempF',
        severity: 'query',
        measured: 22,
        limit: 40,
        says: ['22 °C would be 71.6 °F'],
      },
      { code: 'foam-cold', at: 'Pours!componentATempF', severity: 'query' },
      {
        code: 'foam-cold',
        at: 'Pours!componentBTempF',
        severity: 'query',
        measured: 21,
        says: ['21 °C would be 69.8 °F'],
      },
      { code: 'foam-cold', at: 'Pours!componentBTempF', severity: 'query' },
    ],
    figures: { placedFt3: 9.6 },
  }),
  set('Z-25', {
    what: '°C written out: nothing is converted in silence',
    values: {},
    pours: [{ componentATempF: '22 °C' }],
    finds: [
      {
        code: 'record-unit',
        at: 'Pours!componentATempF',
        measured: '22 °C',
        says: ['Nothing is converted in silence'],
      },
    ],
    figures: { voidFt3: 8.6701, placedFt3: null },
  }),
];

export const BAD_RECORDS: readonly BadRecord[] = [...SIZES, ...POURS, ...BAD_TIMES_AND_REPAIRS];
