import type { SheetPour, SheetRecord } from '#shared/drawing/sheet-types.ts';
import { kitCounts } from '#shared/planner/kits-text.ts';
import type { Plan } from '#shared/planner/plan-types.ts';

/** A plan as the drawing takes a record: the kits chosen are what would be placed. */
export function planRecord(plan: Plan, name: string): SheetRecord {
  const answer = plan.kits.likely;
  const voidFt3 = plan.voidFt3?.likely ?? null;
  const pours: SheetPour[] = kitCounts(answer?.kits ?? []).map(({ kitFt3, count }) => ({
    pourNumber: 1,
    event: 1,
    kitFt3,
    quantity: count,
    wastedQuantity: 0,
  }));
  return {
    kind: plan.kind,
    structureNumber: name === '' ? 'as planned' : name,
    values: plan.values,
    derived: {
      voidFt3,
      placedFt3: answer?.placedFt3 ?? null,
      fillRatio: answer && voidFt3 ? answer.placedFt3 / voidFt3 : null,
      fillRatioU: null,
      dueFt: plan.dueFt,
      waterWithPoleIn: plan.waterWithPoleIn,
      leastAnnulusIn: plan.leastAnnulusIn,
      poleTaped: plan.poleTaped,
      worstReading: null,
    },
    pours,
  };
}
