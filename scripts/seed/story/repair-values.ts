import type { Random } from '../photograph/random.ts';
import type { View } from '../photograph/scene.ts';
import { after } from './clock.ts';
import { type Values, placeValues, tenth } from './line-values.ts';
import type { PlannedStructure } from './work-orders.ts';

type Begun = { random: Random; beganAt: string; foreman: string };

/** A pole pulled plumb or a pad raised level as it should be: every rule of the demo standard is met. */
export function soundRepairValues(planned: PlannedStructure, begun: Begun): Values {
  const kind = planned.kind === 'straighten' ? straightened(planned, begun) : levelled(begun);
  const { random, beganAt, foreman } = begun;
  return {
    structureNumber: planned.structureNumber,
    ...kind,
    ...placeValues(planned, { random, openedAt: beganAt }),
    foreman,
  };
}

function straightened({ design }: PlannedStructure, { random, beganAt }: Begun): Values {
  const leanBefore = tenth(random.between(6, 9));
  const depthFt = tenth(random.between(4, 4.8));
  const releasedAt = after(beganAt, random.whole(34, 42));
  return {
    poleMaterial: design.poleMaterial,
    poleLengthFt: design.poleLengthFt,
    poleClass: design.poleClass,
    girthGroundLineIn: 35 + random.whole(0, 6) / 4,
    embedmentFt: 6,
    embedmentSource: 'brand',
    leanBeforeInPer10Ft: leanBefore,
    leanBeforeAzimuthDeg: random.whole(0, 71) * 5,
    leanAfterInPer10Ft: 0.2,
    springbackInPer10Ft: 0.3,
    // A pole that turns about the bottom of the gap opens it by its change of lean.
    gapAtGradeIn: tenth((leanBefore * depthFt) / 10),
    gapDepthFt: depthFt,
    waterIn: 0,
    pulledAt: beganAt,
    releasedAt,
    reattachedAt: after(releasedAt, random.whole(10, 20)),
  };
}

function levelled({ random, beganAt }: Begun): Values {
  const low = tenth(random.between(1.2, 1.6));
  const high = tenth(low + random.between(0.8, 1.2));
  return {
    padLengthIn: 44,
    padWidthIn: 42,
    openingLengthIn: 18,
    openingWidthIn: 12,
    // Settled towards the doors: one plane through all four corners.
    gap1In: high,
    gap2In: low,
    gap3In: low,
    gap4In: high,
    slopeBeforeAlongInPerFt: tenth((high - low) / 3.5),
    slopeBeforeAcrossInPerFt: 0.1,
    slopeAfterAlongInPerFt: 0.1,
    slopeAfterAcrossInPerFt: 0,
    raisedAt: beganAt,
    loweredAt: after(beganAt, random.whole(14, 20)),
    releasedAt: after(beganAt, random.whole(30, 40)),
  };
}

/** Wall clock of a view: within the times that the line states. */
export function takenAt(view: View, { values, pouredAt }: { values: Values; pouredAt: string }): string {
  const began = String(values['boredAt'] ?? values['pulledAt'] ?? values['raisedAt']);
  if (view === 'before') return after(began, -12);
  if (view === 'after' || view === 'level-after') return after(String(values['releasedAt']), 4);
  if (view === 'bore-depth') return after(began, 6);
  if (view === 'water') return after(began, 8);
  if (view === 'gap') return after(began, 1);
  const sincePour = { kits: -4, finish: 7, plumb: 10, rework: 6, brand: 10 };
  return after(pouredAt, sincePour[view]);
}
