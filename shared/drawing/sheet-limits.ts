import type { Standard } from '#shared/standard/types.ts';
import type { SheetLimits } from './sheet-types.ts';

/** Limits that stand on the drawing beside what was measured. A rule that is off sets none. */
export function sheetLimits({ rules }: Pick<Standard, 'rules'>): SheetLimits {
  const annulus = rules['annulus-narrow'];
  const water = rules['water-deep'];
  const fill = rules['fill-short'];
  const lean = rules['lean-left'];
  const slope = rules['pad-slope'];
  return {
    ...(annulus.on ? { annulusLeastIn: annulus.params.leastGapIn } : {}),
    ...(water.on ? { waterMostIn: water.params.limitIn } : {}),
    ...(fill.on ? { fillLeast: fill.params.leastRatio } : {}),
    ...(lean.on ? { leanMostInPer10Ft: lean.params.limitInPer10Ft } : {}),
    ...(slope.on ? { slopeMostInPerFt: slope.params.limitInPerFt } : {}),
  };
}
