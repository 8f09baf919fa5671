import type { WorkedRecord } from './worked-record.ts';

/** *Straighten* and *re-level* records. Worked by numeric integration apart from the product; derived, not published. */
export const WORKED_REPAIRS: readonly WorkedRecord[] = [
  {
    id: 'WR-17',
    what: 'wedge',
    kind: 'straighten',
    values: { gapAtGradeIn: 4, gapDepthFt: 4.5, diameterGroundLineIn: 11 },
    pours: [[1.5, 1]],
    expected: { voidFt3: 0.6875, placedFt3: 1.5, fillRatio: 2.1818, poleTaped: true },
  },
  {
    id: 'WR-18',
    what: 'wedge with a gap left at depth',
    kind: 'straighten',
    values: { gapAtGradeIn: 5, gapAtDepthIn: 1.5, gapDepthFt: 4, gapWidthIn: 13 },
    pours: [[2.5, 1]],
    expected: { voidFt3: 1.1736, placedFt3: 2.5, fillRatio: 2.1302, poleTaped: true },
  },
  {
    id: 'WR-19',
    what: 'pad with cable opening',
    kind: 'relevel',
    values: {
      padLengthIn: 48,
      padWidthIn: 42,
      openingLengthIn: 24,
      openingWidthIn: 18,
      gap1In: 1,
      gap2In: 3,
      gap3In: 4,
      gap4In: 2,
    },
    pours: [[4, 1]],
    expected: { voidFt3: 2.2917, placedFt3: 4.0, fillRatio: 1.7455, planeTestIn: 0.0, poleTaped: null },
  },
  {
    id: 'WR-20',
    what: 'gaps that no flat pad can have',
    kind: 'relevel',
    values: { padLengthIn: 40, padWidthIn: 40, gap1In: 1, gap2In: 3, gap3In: 1, gap4In: 3 },
    pours: [[2.5, 1]],
    expected: { voidFt3: 1.8519, placedFt3: 2.5, fillRatio: 1.35, planeTestIn: 2.0, poleTaped: null },
  },
];
