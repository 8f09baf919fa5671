import type { StoryBatch } from './batches.ts';

/** Batches that mix kinds of work: poles that leaned, pads that settled, and a new pole beside them. */
export const REPAIR_BATCHES: readonly StoryBatch[] = [
  {
    key: 'repairs on record',
    workOrder: '17',
    state: 'on-record',
    lines: [
      {
        structureNumber: '17-0432',
        boredAt: '2026-05-21T08:15',
        lot: 'LK-2291',
        // ½ · (7.5 + 1.5) · 11.5 · 4.8 / 144 = 1.725 ft³: one kit was short, a second one filled it a week later.
        values: {
          leanBeforeInPer10Ft: 11,
          leanBeforeAzimuthDeg: 215,
          gapAtGradeIn: 7.5,
          gapAtDepthIn: 1.5,
          gapDepthFt: 4.8,
          gapWidthIn: 11.5,
        },
        kitsFt3: [1.5],
        rework: { pouredAt: '2026-05-28T13:40', kitFt3: 1.5, quantity: 1, lot: 'LK-2291' },
      },
      {
        structureNumber: '17-0440',
        boredAt: '2026-05-21T10:30',
        lot: 'LK-2291',
        values: { slopeAfterAlongInPerFt: 0.3 },
      },
    ],
    decisions: {
      '17-0440 pad-slope': {
        decision: 'concession',
        asked: 'The conduits hold the pad: it comes no further without pulling on the cables.',
        granted: {
          reason: 'Water still runs off the doors, and the cables have their slack.',
          condition: 'Measure the slope again after the first winter.',
        },
      },
    },
    transmittal: 'Fallow Road tie line, repairs of May',
  },
  {
    key: 'three kinds under review',
    workOrder: '17',
    state: 'in-review',
    lines: [
      { structureNumber: '17-0410', boredAt: '2026-05-27T07:50', lot: 'LK-2291' },
      {
        structureNumber: '17-0433',
        boredAt: '2026-05-27T09:20',
        lot: 'LK-2291',
        values: { leanAfterInPer10Ft: 1.4, leanAfterAzimuthDeg: 90, leanBeforeAzimuthDeg: 90 },
      },
      {
        structureNumber: '17-0441',
        boredAt: '2026-05-27T11:10',
        lot: 'LK-2291',
        // (44 · 42 − 18 · 12) · (2.4 + 1.1 + 2.4 + 2.4) / 4 / 1728 = 1.9597 ft³; |2.4 + 2.4 − 1.1 − 2.4| / 2 = 0.65 in off a plane.
        values: { gap1In: 2.4, gap2In: 1.1, gap3In: 2.4, gap4In: 2.4 },
        kitsFt3: [1.5],
        rework: { pouredAt: '2026-06-03T09:05', kitFt3: 1.5, quantity: 1, lot: 'LK-2337' },
      },
    ],
    answers: {
      '17-0441 gap-plane': 'The rear left corner sits on an old footing; all four were taped twice.',
    },
    undecided: ['17-0433', '17-0441'],
  },
];
