import { orderList } from '#shared/calc/kit-plan.ts';
import { planOne } from './plan-one.ts';
import { sharedTexts, type PlanTexts } from './plan-texts.ts';
import type { Plan, PlanContext } from './plan-types.ts';
import type { SayOptions } from './say-plan.ts';

/** A structure of a work order's design list, as far as the planner reads it. */
export type DesignStructure = {
  readonly id: string;
  readonly structureNumber: string;
  readonly kind: 'set' | 'straighten' | 'relevel';
  readonly design: {
    readonly poleLengthFt: number | null;
    readonly poleClass: string | null;
    readonly poleMaterial: string | null;
    readonly ground: string | null;
    readonly embedmentFt: number | null;
  };
};

export type OrderRow<S extends DesignStructure = DesignStructure> = {
  readonly structure: S;
  readonly plan: Plan;
};

export type OrderLine = { readonly kitFt3: number; readonly planned: number; readonly spares: number };

export type OrderPlan<S extends DesignStructure = DesignStructure> = {
  readonly rows: readonly OrderRow<S>[];
  /** Structures whose kits cannot be told yet. */
  readonly unplanned: number;
  readonly voidFt3: number;
  readonly needFt3: number;
  readonly surplusFt3: number;
  readonly lines: readonly OrderLine[];
};

/** What a design list says of one structure, as if it had been typed; what it leaves blank is blank. */
export function designTexts({ kind, structureNumber, design }: DesignStructure): PlanTexts {
  const texts: Record<string, string> = { kind, name: structureNumber };
  const write = (key: string, value: string | number | null) => {
    if (value !== null) texts[key] = String(value);
  };
  if (kind !== 'relevel') {
    write('poleLengthFt', design.poleLengthFt);
    write('poleClass', design.poleClass);
    write('poleMaterial', design.poleMaterial);
  }
  if (kind === 'set') {
    write('ground', design.ground);
    write('designFt', design.embedmentFt);
  }
  if (kind === 'straighten') write('embedmentFt', design.embedmentFt);
  return texts;
}

/** Plans one structure after the other, each design once: a page may plan some, answer a key, and go on. */
export function orderPlanner<S extends DesignStructure>(
  texts: PlanTexts,
  { context, options = {} }: { readonly context: PlanContext; readonly options?: SayOptions },
): (structure: S) => OrderRow<S> {
  const shared = sharedTexts(texts);
  const known = new Map<string, Plan>();
  return (structure) => {
    const { name: _name, ...design } = designTexts(structure);
    const key = JSON.stringify(design);
    let plan = known.get(key);
    if (plan === undefined) {
      plan = planOne({ ...shared, ...design }, context, options);
      known.set(key, plan);
    }
    return { structure, plan };
  };
}

/** The kits of all structures planned. */
export function sumOrder<S extends DesignStructure>(rows: readonly OrderRow<S>[]): OrderPlan<S> {
  let [voidFt3, needFt3, surplusFt3, unplanned] = [0, 0, 0, 0];
  for (const { plan } of rows) {
    const answer = plan.kits.likely;
    if (answer === null) unplanned += 1;
    voidFt3 += plan.voidFt3?.likely ?? 0;
    needFt3 += answer?.needFt3 ?? 0;
    surplusFt3 += answer?.surplusFt3 ?? 0;
  }
  const plans = rows.flatMap(({ plan }) => plan.kits.likely ?? []);
  const spareShare = rows[0]?.plan.assumptions.spareShare ?? 0;
  return { rows, unplanned, voidFt3, needFt3, surplusFt3, lines: orderList(plans, spareShare) };
}

/** The plan of every structure given, and the kits of all of them. */
export function planOrder<S extends DesignStructure>(
  structures: readonly S[],
  texts: PlanTexts,
  about: { readonly context: PlanContext; readonly options?: SayOptions },
): OrderPlan<S> {
  return sumOrder(structures.map(orderPlanner<S>(texts, about)));
}
