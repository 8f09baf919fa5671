import { expect, test } from 'vitest';
import { dueColumns, dueDepthFt } from '#shared/calc/due-depth.ts';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';

const rules = DEMO_STANDARD.dueDepth;

// Source: The Lineman's and Cableman's Handbook, section 11, setting depth table. Status: secondary transcription.
test.each([
  [25, 5, 3.5],
  [30, 5.5, 3.5],
  [35, 6, 4],
  [40, 6, 4],
  [45, 6.5, 4.5],
  [50, 7, 4.5],
  [55, 7.5, 5],
  [60, 8, 5],
])('%i ft pole: %d ft in soil, %d ft in rock', (lengthFt, soilFt, rockFt) => {
  expect(dueColumns(rules, lengthFt)).toMatchObject({ soilFt, rockFt });
});

// Source: the same handbook's rule, 10 % of length + 2 ft, at least 5 ft. Status: secondary transcription.
test.each([
  [25, 5],
  [30, 5],
  [35, 5.5],
  [40, 6],
  [45, 6.5],
  [50, 7],
  [55, 7.5],
  [60, 8],
])('rule of thumb for %i ft: %d ft', (lengthFt, soilFt) => {
  expect(dueColumns({ ...rules, table: [] }, lengthFt).soilFt).toBeCloseTo(soilFt, 12);
});

// Source: a utility line specification filed with a state commission, low side of a slope. Status: secondary transcription.
test('95 ft pole beyond the table: 11.5 ft', () => {
  expect(dueColumns(rules, 95).soilFt).toBeCloseTo(11.5, 12);
});

// Source: US Army signal subcourse SS0439A: a hole of 2 ft or more in solid rock takes the depth of firm ground. Status: read.
test.each([
  [24, 6],
  [23.9, 4],
])('40 ft pole in rock, %d in bore: %d ft', (boreTopIn, dueFt) => {
  const values = { poleLengthFt: 40, ground: 'rock', boreTopIn };
  expect(dueDepthFt({ values, standard: DEMO_STANDARD })).toBe(dueFt);
});

// Source: rural-utility practice: rock within 2 ft of the surface takes the rock depth below the soil, at most the soil depth. Status: recalled.
test.each([
  [0, 4.5],
  [1.5, 6],
  [2, 6.5],
  [2.1, 6.5],
])('45 ft pole, soil over rock from %d ft: %d ft', (rockFromFt, dueFt) => {
  const values = { poleLengthFt: 45, ground: 'soil-over-rock', rockFromFt, boreTopIn: 20 };
  expect(dueDepthFt({ values, standard: DEMO_STANDARD })).toBe(dueFt);
});
