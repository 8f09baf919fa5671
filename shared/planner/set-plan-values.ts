import { dueDepthFt } from '#shared/calc/due-depth.ts';
import type { FieldValues, Scalar } from '#shared/records/types.ts';
import type { Assumptions } from './assumptions.ts';
import type { PlanContext } from './plan-types.ts';
import type { PlanReading } from './read-plan.ts';

const POLE_WORDS = ['poleClass', 'poleMaterial', 'poleSection', 'buttEnd', 'ground'] as const;
const POLE_NUMBERS = [
  'poleLengthFt',
  'wallIn',
  'girthGroundLineIn',
  'diameterGroundLineIn',
  'girthButtIn',
  'diameterButtIn',
  'rockFromFt',
] as const;

/** What the design says of pole and ground, as a record carries it; blank fields are absent. */
export function poleValues({ numbers, words }: PlanReading): FieldValues {
  const values: Record<string, Scalar> = {};
  for (const key of POLE_WORDS) {
    const word = words.get(key);
    if (word !== undefined) values[key] = word;
  }
  for (const key of POLE_NUMBERS) {
    const number = numbers.get(key);
    if (number !== undefined) values[key] = number;
  }
  return values;
}

/** A planned *set* record with one bore: depth due there, and the depth planned (typed, or the one due). */
export function withBore(
  reading: PlanReading,
  {
    boreIn,
    assumptions,
    standard,
  }: Pick<PlanContext, 'standard'> & {
    readonly boreIn: number | null;
    readonly assumptions: Assumptions;
  },
): { readonly values: FieldValues; readonly dueFt: number | null; readonly depthFt: number | null } {
  const { numbers, words } = reading;
  const { taperIn, overDigFt } = assumptions;
  const values: Record<string, Scalar> = { ...poleValues(reading), foamTopBelowGradeIn: 0 };
  if (boreIn !== null) {
    values['boreTopIn'] = boreIn;
    if (taperIn > 0 && taperIn < boreIn) values['boreBottomIn'] = boreIn - taperIn;
  }
  const dueFt = dueDepthFt({ values, standard, designEmbedmentFt: numbers.get('designFt') ?? null });
  const depthFt = numbers.get('embedmentFt') ?? dueFt ?? numbers.get('designFt') ?? null;
  if (depthFt !== null) {
    values['embedmentFt'] = depthFt;
    values['boreDepthFt'] = depthFt + overDigFt;
  }
  const bed = words.get('bedMaterial') ?? 'none';
  if (overDigFt > 0 && bed !== 'none') {
    values['bedMaterial'] = bed;
    values['bedFt'] = overDigFt;
  }
  values['waterIn'] = numbers.get('waterIn') ?? 0;
  return { values, dueFt, depthFt };
}
