import { startTransition, useEffect, useState } from 'react';
import type { PlannedStructure } from '#shared/generated/api-types.ts';
import { orderPlanner, sumOrder, type OrderPlan, type OrderRow } from '#shared/planner/plan-order.ts';
import type { PlanTexts } from '#shared/planner/plan-texts.ts';
import type { PlanContext } from '#shared/planner/plan-types.ts';

/** Planned without a pause for so long; then a key that waits is answered first. */
const SLICE_MS = 6;
const EMPTY: OrderPlan<PlannedStructure> = sumOrder([]);

type Asked = {
  readonly structures: readonly PlannedStructure[];
  readonly texts: PlanTexts;
  readonly context: PlanContext;
  readonly metric: boolean;
};

/** The plan of an order, made in slices: however long the order is, typing is answered at once. The plan before stands meanwhile. */
export function useOrderPlan({ structures, texts, context, metric }: Asked): {
  readonly plan: OrderPlan<PlannedStructure>;
  readonly busy: boolean;
} {
  const [made, setMade] = useState<{ plan: OrderPlan<PlannedStructure>; of: PlanTexts | null }>({
    plan: EMPTY,
    of: null,
  });
  useEffect(() => {
    const planOf = orderPlanner<PlannedStructure>(texts, { context, options: { metric } });
    const rows: OrderRow<PlannedStructure>[] = [];
    let timer: ReturnType<typeof setTimeout> | undefined;
    const slice = () => {
      const begun = performance.now();
      for (const structure of structures.slice(rows.length)) {
        rows.push(planOf(structure));
        if (performance.now() - begun > SLICE_MS) break;
      }
      if (rows.length < structures.length) timer = setTimeout(slice, 0);
      else startTransition(() => setMade({ plan: sumOrder(rows), of: texts }));
    };
    timer = setTimeout(slice, 0);
    return () => clearTimeout(timer);
  }, [structures, texts, context, metric]);
  return { plan: made.plan, busy: made.of !== texts };
}
