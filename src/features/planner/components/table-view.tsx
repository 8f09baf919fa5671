import { useDeferredValue, useMemo } from 'react';
import { assumedTexts } from '../lib/assumed-texts.ts';
import { downloadCsv } from '../lib/download-text.ts';
import { PlanFormProvider, type PlanForm } from '../lib/plan-form.ts';
import { DepthTableSheet } from './depth-table-sheet.tsx';
import { FoamFields } from './foam-fields.tsx';
import { FormSection } from './form-section.tsx';
import { PlanInput } from './plan-input.tsx';
import { PoleFields } from './pole-fields.tsx';
import { BoreFields } from './set-fields.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { assumptionsOf } from '#shared/planner/assumptions.ts';
import { depthTable, depthTableCsv } from '#shared/planner/depth-table.ts';
import { planOne } from '#shared/planner/plan-one.ts';
import type { PlanTexts } from '#shared/planner/plan-texts.ts';
import type { PlanContext } from '#shared/planner/plan-types.ts';
import { readPlan } from '#shared/planner/read-plan.ts';
import { tableHead } from '#shared/planner/table-head.ts';
import type { Product } from '#shared/standard/types.ts';

type Props = {
  readonly texts: PlanTexts;
  readonly type: PlanForm['type'];
  readonly settle: PlanForm['settle'];
  readonly context: PlanContext;
  readonly products: readonly Product[];
};

/** One pole in every bore at every depth, on a page for the truck. */
export function TableView({ texts, type, settle, context, products }: Props) {
  const asSet = useMemo(() => ({ ...texts, kind: 'set' }), [texts]);
  const plan = useMemo(() => planOne(asSet, context), [asSet, context]);
  const later = useDeferredValue(asSet);
  const reading = useMemo(() => readPlan(later), [later]);
  const table = useMemo(() => depthTable(reading, context), [reading, context]);
  const form = useMemo<PlanForm>(() => {
    const faults = new Map(
      [...table.faults, ...plan.faults].toReversed().map(({ field, text }) => [field, text]),
    );
    return { texts: asSet, type, settle, faultOf: (key) => faults.get(key), assumed: assumedTexts(plan) };
  }, [asSet, type, settle, plan, table.faults]);
  const head = useMemo(
    () => tableHead(reading, { assumptions: assumptionsOf(reading, context), context }),
    [reading, context],
  );
  return (
    <PlanFormProvider value={form}>
      <div className="grid flex-1 grid-cols-[minmax(0,1fr)] md:grid-cols-[20rem_minmax(0,1fr)] print:block">
        <form
          aria-label="Pole and assumptions"
          onSubmit={(event) => event.preventDefault()}
          className="min-w-0 border-hairline md:border-r print:hidden"
        >
          <PoleFields butt />
          <FormSection title="Depths">
            <PlanInput name="fromFt" label="From" />
            <PlanInput name="toFt" label="To" />
            <PlanInput name="stepFt" label="In steps of" />
          </FormSection>
          <BoreFields one={false} />
          <FoamFields products={products} kitsFt3={plan.assumptions.kitsFt3} kinds={['set']} />
        </form>
        <div className="min-w-0">
          <div className="print:hidden">
            <SectionHead
              title="Kits by bore and depth"
              aside={
                <span className="flex gap-3">
                  <Button
                    size="small"
                    onClick={() => downloadCsv('kits-by-bore-and-depth.csv', depthTableCsv(table, head))}
                  >
                    Export CSV
                  </Button>
                  <Button size="small" kind="primary" onClick={() => window.print()}>
                    Print for the truck
                  </Button>
                </span>
              }
            />
          </div>
          <DepthTableSheet table={table} head={head} dueFt={plan.dueFt} standard={context.standard} />
        </div>
      </div>
    </PlanFormProvider>
  );
}
