import { kitAnswer } from './range-kits.ts';
import { planSet } from './plan-set.ts';
import type { KitAnswer, PlanContext } from './plan-types.ts';
import type { PlanReading } from './read-plan.ts';

export type RockAnswer = {
  /** `soil`, `rock` from grade, or the depth in ft at which rock begins. */
  readonly met: 'soil' | 'rock' | number;
  readonly dueFt: number | null;
  readonly boreIn: number | null;
  readonly voidFt3: number | null;
  readonly kits: KitAnswer | null;
};

const FROM_FT = [1, 2, 3, 4] as const;

function met(reading: PlanReading, at: RockAnswer['met']): PlanReading {
  const words = new Map(reading.words);
  const numbers = new Map(reading.numbers);
  // What is asked is the depth due there, not the depth typed for the ground that was expected.
  numbers.delete('embedmentFt');
  words.set('ground', typeof at === 'number' ? 'soil-over-rock' : at);
  if (typeof at === 'number') numbers.set('rockFromFt', at);
  return { ...reading, words, numbers };
}

/** What the pole of a plan comes to when the auger meets rock: depth due, void and kits, by the standard's rule for rock. */
export function rockWhatIfs(reading: PlanReading, context: PlanContext): readonly RockAnswer[] {
  return (['soil', ...FROM_FT, 'rock'] as const).map((at) => {
    const { dueFt, boreIn, voidFt3, assumptions } = planSet(met(reading, at), context);
    const likely = dueFt === null ? null : (voidFt3?.likely ?? null);
    const kits = likely === null ? null : kitAnswer(likely, assumptions, context);
    return { met: at, dueFt, boreIn, voidFt3: likely, kits };
  });
}
