import { greatestAnnulusIn, leastAnnulusIn } from '#shared/calc/annulus.ts';
import { poleSizes } from '#shared/calc/pole-sizes.ts';
import { assumptionsOf } from './assumptions.ts';
import { chooseBore } from './choose-bore.ts';
import type { Plan, PlanContext } from './plan-types.ts';
import { rangeKits } from './range-kits.ts';
import type { PlanReading } from './read-plan.ts';
import type { SayOptions } from './say-plan.ts';
import { boreFaults, foamNotes, groundFaults, poleFaults, setNotes } from './set-notes.ts';
import { withBore } from './set-plan-values.ts';
import { setVoidRange } from './void-range.ts';
import { waterAnswer } from './water-answer.ts';

/** The plan of a pole to be set. Total: what cannot be computed is null and a fault says why. */
export function planSet(reading: PlanReading, context: PlanContext, options: SayOptions = {}): Plan {
  const { standard } = context;
  const assumptions = assumptionsOf(reading, context);
  const choice = chooseBore(reading, { assumptions, standard });
  const { boreIn } = choice;
  const { values, dueFt, depthFt } = withBore(reading, { boreIn, assumptions, standard });
  const unread = new Set(reading.faults.map(({ field }) => field));
  const blank = (key: string) => !unread.has(key);
  const wrong = boreFaults(values, choice, assumptions);
  const leastIn = leastAnnulusIn(values);
  const greatestIn = greatestAnnulusIn(values);
  // A pole that does not go into its bore leaves no void to fill.
  const voidFt3 = wrong.length > 0 ? null : setVoidRange(values, assumptions, standard);
  const taped = poleSizes(values)?.taped ?? null;
  const depths = depthFt === null ? [] : depthFaults(reading, depthFt);
  return {
    kind: 'set',
    values,
    assumptions,
    dueFt,
    depthFt,
    boreIn,
    leastAnnulusIn: leastIn,
    greatestAnnulusIn: greatestIn,
    poleTaped: taped,
    voidFt3,
    kits: rangeKits(voidFt3, assumptions, context),
    waterWithPoleIn: waterAnswer(values, reading.numbers.get('waterIn') ?? 0, standard).withPoleIn,
    faults: [
      ...reading.faults,
      ...poleFaults(values, blank),
      ...groundFaults(values, blank),
      ...wrong,
      ...depths,
    ],
    notes: [
      ...setNotes({ choice, leastIn, greatestIn, dueFt, depthFt, taped }, context, options),
      ...foamNotes(assumptions, context, options),
    ],
  };
}

/** Water that would stand over the bore, and a depth that leaves no pole above ground. */
function depthFaults({ numbers }: PlanReading, depthFt: number) {
  const lengthFt = numbers.get('poleLengthFt');
  const waterIn = numbers.get('waterIn') ?? 0;
  const boreFt = depthFt + (numbers.get('overDigFt') ?? 0);
  return [
    ...(lengthFt !== undefined && depthFt >= lengthFt
      ? [{ field: 'embedmentFt', text: 'Deeper than the pole is long.' }]
      : []),
    ...(waterIn > boreFt * 12 ? [{ field: 'waterIn', text: 'Deeper than the bore.' }] : []),
  ];
}
