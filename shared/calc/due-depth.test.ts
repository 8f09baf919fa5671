import { describe, expect, test } from 'vitest';
import { dueDepthFt } from './due-depth.ts';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';

const due = (values: Record<string, string | number>, designEmbedmentFt: number | null = null) =>
  dueDepthFt({ values, standard: DEMO_STANDARD, designEmbedmentFt });

describe('depth due', () => {
  test.each([
    ['a length between two rows takes the longer', { poleLengthFt: 41, ground: 'soil' }, 6.5],
    ['a length below the table takes its first row', { poleLengthFt: 20, ground: 'soil' }, 5],
    ['beyond the table, 10 % and 2 ft', { poleLengthFt: 70, ground: 'soil' }, 9],
    ['beyond the table in rock, 2.5 ft less', { poleLengthFt: 70, ground: 'rock', boreTopIn: 20 }, 6.5],
    [
      'the least diameter decides on a wide bore',
      { poleLengthFt: 40, ground: 'rock', boreTopIn: 30, boreBottomIn: 20 },
      4,
    ],
    [
      'the bell does not',
      { poleLengthFt: 40, ground: 'rock', boreTopIn: 20, bellIn: 36, bellHeightFt: 1 },
      4,
    ],
    [
      'a wide bore over rock takes the soil column',
      { poleLengthFt: 45, ground: 'soil-over-rock', rockFromFt: 1, boreTopIn: 26 },
      6.5,
    ],
  ])('%s', (_what, values, depth) => {
    expect(due(values)).toBeCloseTo(depth, 12);
  });

  test.each([
    ['length', { ground: 'soil' }],
    ['ground', { poleLengthFt: 40 }],
    ['a known ground', { poleLengthFt: 40, ground: 'swamp' }],
    ['bore in rock', { poleLengthFt: 40, ground: 'rock' }],
    ['depth of the rock', { poleLengthFt: 40, ground: 'soil-over-rock', boreTopIn: 20 }],
  ])('is not known without %s', (_what, values) => {
    expect(due(values, 9)).toBeNull();
  });

  test('by share of soil, where the standard says so: 4.5 + 2 · 3.25/6.5', () => {
    const standard = {
      ...DEMO_STANDARD,
      dueDepth: { ...DEMO_STANDARD.dueDepth, overRock: 'by-share' as const },
    };
    const values = { poleLengthFt: 45, ground: 'soil-over-rock', rockFromFt: 3.25, boreTopIn: 20 };
    expect(dueDepthFt({ values, standard })).toBeCloseTo(5.5, 12);
    expect(dueDepthFt({ values: { ...values, rockFromFt: 9 }, standard })).toBeCloseTo(6.5, 12);
  });
});
