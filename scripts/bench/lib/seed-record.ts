import { numberOf } from './seed-spread.ts';

const VALUES = {
  poleLengthFt: 40,
  poleClass: '4',
  poleMaterial: 'southern-pine',
  girthGroundLineIn: 35.25,
  girthButtIn: 38.25,
  boreTopIn: 20,
  boreBottomIn: 19.5,
  boreDepthFt: 6,
  ground: 'soil',
  embedmentFt: 6,
  foamTopBelowGradeIn: 0,
  waterIn: 0.5,
  leanInPer10Ft: 0.25,
  boredAt: '2026-04-14T09:00',
  setAt: '2026-04-14T09:40',
  letGoAt: '2026-04-14T10:05',
  hardwareAt: '2026-04-14T11:00',
  loadAt: 'not-yet',
  accuracyFt: 5,
  locateTicket: 'LT-1',
  locateFrom: '2026-04-10',
  locateTo: '2026-04-24',
};
/** A record as it is kept: its values, the cells it was read from, and what was computed. Invented. */
export const valuesOf = (n: number): string => JSON.stringify({ structureNumber: numberOf(n), ...VALUES });
export const RAW = JSON.stringify(
  Object.fromEntries(
    Object.entries(VALUES).map(([key, value]) => [key, { address: 'AA100', raw: String(value) }]),
  ),
);
export const DERIVED = JSON.stringify({
  voidFt3: 8.4,
  placedFt3: 9.5,
  fillRatio: 1.13,
  fillRatioU: 0.08,
  worstReading: 'boreTopIn',
  dueFt: 6,
  waterWithPoleIn: 0.7,
  leastAnnulusIn: 3.9,
  poleTaped: true,
});
