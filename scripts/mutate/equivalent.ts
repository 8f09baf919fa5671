/** A flipped comparison that no input can tell from the one written, with the reason. */
export type Equivalent = {
  readonly file: string;
  /** The comparison as written, white space made single. */
  readonly code: string;
  readonly to: string;
  readonly why: string;
};

const NOTHING_THERE = 'A frustum of height 0 or size 0 has the volume 0 that the other branch gives.';
const SAME_DISTANCE = 'Half a turn east and half a turn west are of one length.';
const MORE_CANDIDATES =
  'More candidates are met; each is still judged by the bits in which it differs, and visiting one twice is allowed.';

/** Kept honest by the run: an entry whose comparison is gone, or whose mutant a test kills, fails it. */
export const EQUIVALENT: readonly Equivalent[] = [
  {
    file: 'shared/calc/bore-profile.ts',
    code: 'within <= toFt',
    to: '<',
    why: 'At the joint the shaft’s bottom is the bell’s top, and at the bottom the last part is taken all the same.',
  },
  {
    file: 'shared/calc/derive-relevel.ts',
    code: 'only === at',
    to: '!==',
    why: 'The void is linear in each gap with one slope: moving the three others moves it by the same for each reading.',
  },
  {
    file: 'shared/calc/fill.ts',
    code: 'voidFt3 > 0',
    to: '>=',
    why: 'P/0 is infinite or no number, and neither is let through.',
  },
  {
    file: 'shared/calc/geo-area.ts',
    code: 'x < ((x2 - x1) * (y - y1)) / (y2 - y1) + x1',
    to: '<=',
    why: 'x at the crossing lies on the edge, which is told before.',
  },
  {
    file: 'shared/calc/geodesic-distance.ts',
    code: 'difference > 180',
    to: '>=',
    why: SAME_DISTANCE,
  },
  {
    file: 'shared/calc/geodesic-distance.ts',
    code: 'difference < -180',
    to: '<=',
    why: SAME_DISTANCE,
  },
  {
    file: 'shared/calc/geodesic-distance.ts',
    code: 'cosSquaredAlpha > 1e-15',
    to: '>=',
    why: 'It comes as 1 − s² in steps of 1.1e-16: 1e-15 is none of them.',
  },
  {
    file: 'shared/calc/geodesic-distance.ts',
    code: 'round < ROUNDS',
    to: '<=',
    why: 'The iteration settles within some ten rounds or swings without end; a round more or less decides nothing.',
  },
  {
    file: 'shared/calc/geodesic-distance.ts',
    code: 'Math.abs(next - lambda) < CLOSE',
    to: '<=',
    why: 'One more round from 1e-13 rad changes the length by less than a micrometre.',
  },
  {
    file: 'shared/calc/interpolate.ts',
    code: 'x <= before[0]',
    to: '<',
    why: 'At the first point the loop gives that point’s y.',
  },
  { file: 'shared/calc/pole-profile.ts', code: 'to > from', to: '>=', why: NOTHING_THERE },
  { file: 'shared/calc/pole-profile.ts', code: 'i1 <= 0', to: '<', why: NOTHING_THERE },
  { file: 'shared/calc/pole-profile.ts', code: 'i2 <= 0', to: '<', why: NOTHING_THERE },
  {
    file: 'shared/calc/pole-profile.ts',
    code: 'i1 >= 0',
    to: '>',
    why: 'A cone whose point is at its end is cut to its own length.',
  },
  {
    file: 'shared/calc/pole-profile.ts',
    code: 'i2 >= 0',
    to: '>',
    why: 'A cone whose point is at its end is cut to its own length.',
  },
  {
    file: 'shared/rules/near-hashes.ts',
    code: 'from >= HALF',
    to: '>',
    why: 'A piece that begins at bit 32 takes nothing of the upper half: the mask drops what was shifted past it.',
  },
  {
    file: 'shared/rules/near-hashes.ts',
    code: 'Math.floor(greatest / pieces.length) > 0',
    to: '>=',
    why: MORE_CANDIDATES,
  },
  {
    file: 'shared/rules/near-hashes.ts',
    code: 'bit < (oneOff ? to - from : 0)',
    to: '<=',
    why: MORE_CANDIDATES,
  },
  {
    file: 'shared/rules/photo-elsewhen/rule.ts',
    code: 'at < fromMs',
    to: '<=',
    why: 'At the first moment it is 0 off either end, which is within any window.',
  },
  {
    file: 'shared/calc/kit-plan.ts',
    code: 'sum <= last',
    to: '<',
    why: 'Among the sums before the last is a multiple of the largest kit; no set with more foam needs fewer.',
  },
  {
    file: 'shared/calc/kit-plan.ts',
    code: 'rest + 1 < best',
    to: '<=',
    why: 'An equal count is written over itself.',
  },
  {
    file: 'shared/calc/kit-plan.ts',
    code: 'wanted > 0',
    to: '>=',
    why: 'Where one kit is wanted the kit of just that size stands first, the larger ones being too large.',
  },
  {
    file: 'shared/calc/kit-plan.ts',
    code: 'grain > 0',
    to: '>=',
    why: 'A kit of size 0 leads to no sum: what is left without it is the same sum.',
  },
  {
    file: 'shared/calc/strength-at.ts',
    code: '(pour.pourNumber ?? 0) > (last.pourNumber ?? 0)',
    to: '>=',
    why: 'Rows of one number at one time are one pour: either of them names it.',
  },
  {
    file: 'shared/calc/strength-share.ts',
    code: 't <= point.minutes',
    to: '<',
    why: 'At a point the curves on both sides of it give its share.',
  },
  {
    file: 'shared/rules/nearest-structure.ts',
    code: 'reachFt > 0',
    to: '>=',
    why: 'Without any reach the cells have no numbers, and nothing is met in them.',
  },
  {
    file: 'shared/calc/water-with-pole.ts',
    code: 'openIn > 0',
    to: '>=',
    why: 'No water is no volume, which stands at 0.',
  },
];
