import { planRelevel } from './plan-relevel.ts';
import { planSet } from './plan-set.ts';
import { planStraighten } from './plan-straighten.ts';
import type { PlanTexts } from './plan-texts.ts';
import type { Plan, PlanContext } from './plan-types.ts';
import { readPlan } from './read-plan.ts';
import type { SayOptions } from './say-plan.ts';

/** The plan of one structure from what was typed. Total: never throws, whatever stands in the texts. */
export function planOne(texts: PlanTexts, context: PlanContext, options: SayOptions = {}): Plan {
  const reading = readPlan(texts);
  if (reading.kind === 'straighten') return planStraighten(reading, context, options);
  if (reading.kind === 'relevel') return planRelevel(reading, context, options);
  return planSet(reading, context, options);
}
