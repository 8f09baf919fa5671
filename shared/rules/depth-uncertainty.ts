import type { LineView } from './types.ts';

const IN_PER_FT = 12;
const COVERAGE = 2;

/** Expanded uncertainty (k = 2) of a depth read with the owner's tape, in ft; null when the standard gives none. */
export const depthUncertaintyFt = (line: LineView): number | null => {
  const u = line.standard.body.uncertainty.depthIn;
  return Number.isFinite(u) ? (COVERAGE * u) / IN_PER_FT : null;
};
