import { badSet as set, WHOLE, type BadRecord } from './bad-record.ts';

const TIMES: readonly BadRecord[] = [
  set('Z-31', {
    what: 'work past midnight, each time with its day: nothing is found',
    values: {
      boredAt: '2026-04-14T22:30',
      setAt: '2026-04-14T23:20',
      letGoAt: '2026-04-14T23:56',
      hardwareAt: '2026-04-15T00:20',
      loadAt: '2026-04-15T01:10',
    },
    pours: [{ pouredAt: '2026-04-14T23:50' }, { pouredAt: '2026-04-14T23:50', kitFt3: 1.5 }],
    finds: [],
    figures: WHOLE,
  }),
  set('Z-32', {
    // 23:56 to 00:20 of the same day: 1416 min too early; 23:50 to 00:20: 1410 min before the pour.
    what: 'work past midnight with the day of before',
    values: {
      boredAt: '2026-04-14T22:30',
      setAt: '2026-04-14T23:20',
      letGoAt: '2026-04-14T23:56',
      hardwareAt: '2026-04-14T00:20',
      loadAt: 'not-yet',
    },
    pours: [{ pouredAt: '2026-04-14T23:50' }, { pouredAt: '2026-04-14T23:50', kitFt3: 1.5 }],
    finds: [
      {
        code: 'clock-order',
        at: 'Set!hardwareAt',
        measured: '2026-04-14T00:20',
        says: ['1,416 min before', 'its day too'],
      },
      { code: 'hardware-early', at: 'Set!hardwareAt', measured: -1410, limit: 15 },
    ],
  }),
  set('Z-33', {
    what: 'ten past twenty-four',
    values: { hardwareAt: '2026-04-14 24:10' },
    finds: [
      {
        code: 'record-unreadable',
        at: 'Set!hardwareAt',
        measured: '2026-04-14 24:10',
        says: ['no date and time'],
      },
    ],
    figures: WHOLE,
  }),
  set('Z-34', {
    what: 'a time without its day',
    values: { hardwareAt: '10:30' },
    finds: [{ code: 'record-unreadable', at: 'Set!hardwareAt', says: ['a time without its date'] }],
    figures: WHOLE,
  }),
  set('Z-35', {
    // Poured at 10:00 on the 14th, loaded at 11:30 on the 13th: 1350 min before.
    what: 'loaded the day before',
    values: { loadAt: '2026-04-13T11:30' },
    finds: [
      {
        code: 'clock-order',
        at: 'Set!loadAt',
        measured: '2026-04-13T11:30',
        limit: '2026-04-14T11:00',
        says: ['its day too'],
      },
      { code: 'load-early', at: 'Set!loadAt', measured: -1350, limit: 60 },
    ],
    figures: WHOLE,
  }),
  set('Z-36', {
    what: 'loaded three days after: nothing is found',
    values: { loadAt: '2026-04-17T07:30' },
    finds: [],
    figures: WHOLE,
  }),
];

const REPAIRS: readonly BadRecord[] = [
  {
    what: 'a gap below zero; the lean is judged all the same',
    kind: 'straighten',
    structure: 'Z-41',
    values: { gapAtGradeIn: -4, leanAfterInPer10Ft: 1.4, leanAfterAzimuthDeg: 90 },
    finds: [
      { code: 'record-range', at: 'Straighten!gapAtGradeIn', measured: -4, limit: 0 },
      { code: 'lean-left', at: 'Straighten!leanAfterInPer10Ft', measured: 1.4, limit: 1 },
    ],
    figures: { voidFt3: null },
  },
  {
    what: 'a pole of no width',
    kind: 'straighten',
    structure: 'Z-42',
    values: { diameterGroundLineIn: 0 },
    finds: [{ code: 'record-range', at: 'Straighten!diameterGroundLineIn', measured: 0, limit: 2 }],
    figures: { voidFt3: null, placedFt3: 1.5 },
  },
  {
    what: 'a straightened pole that no table has, not taped',
    kind: 'straighten',
    structure: 'Z-43',
    values: { diameterGroundLineIn: null, poleLengthFt: 130, poleClass: '2' },
    planned: { poleLengthFt: 130, poleClass: '2' },
    finds: [
      {
        code: 'record-conditional',
        at: 'Straighten!girthGroundLineIn',
        says: ['class table has no such pole'],
      },
    ],
    figures: { voidFt3: null },
  },
  {
    what: 'a pad of no length; its slope is judged all the same',
    kind: 'relevel',
    structure: 'Z-44',
    values: { padLengthIn: 0, slopeAfterAlongInPerFt: 0.3 },
    finds: [
      { code: 'record-range', at: 'Re-level!padLengthIn', measured: 0, limit: 6 },
      { code: 'pad-slope', at: 'Re-level!slopeAfterAlongInPerFt', measured: 0.3, limit: 0.25 },
    ],
    figures: { voidFt3: null },
  },
  {
    what: 'an opening larger than its pad',
    kind: 'relevel',
    structure: 'Z-45',
    values: { openingLengthIn: 50, openingWidthIn: 12 },
    finds: [
      {
        code: 'record-range',
        at: 'Re-level!openingLengthIn',
        measured: 50,
        limit: 40,
        says: ['written beside it'],
      },
    ],
    figures: { voidFt3: null },
  },
  {
    what: 'foam under a pad without a gap: told in the words of a pad',
    kind: 'relevel',
    structure: 'Z-46',
    values: { gap1In: 0, gap2In: 0, gap3In: 0, gap4In: 0 },
    finds: [
      {
        code: 'fill-excess',
        at: 'Re-level!gap1In',
        severity: 'query',
        says: ['the gaps, the pad and its opening'],
      },
    ],
    figures: { voidFt3: 0, fillRatio: null },
  },
];

export const BAD_TIMES_AND_REPAIRS: readonly BadRecord[] = [...TIMES, ...REPAIRS];
