import { useQuery } from '@tanstack/react-query';
import { useCallback, useDeferredValue, useMemo } from 'react';
import { stockQuery } from '../api/stock.ts';
import { assumedTexts } from '../lib/assumed-texts.ts';
import { downloadCsv } from '../lib/download-text.ts';
import { PlanFormProvider, type PlanForm } from '../lib/plan-form.ts';
import { plannerAddress } from '../lib/planner-address.ts';
import { useOrderPlan } from '../lib/use-order-plan.ts';
import type { PlanState } from '../lib/use-plan-texts.ts';
import { FoamFields } from './foam-fields.tsx';
import { FormSection } from './form-section.tsx';
import { OrderKits } from './order-kits.tsx';
import { OrderPrintHead } from './order-print-head.tsx';
import { OrderPicker } from './order-picker.tsx';
import { OrderStructures } from './order-structures.tsx';
import type { PlannedRow } from './order-columns.tsx';
import { PlanInput } from './plan-input.tsx';
import { RelevelFields, StraightenFields } from './other-fields.tsx';
import { BoreFields } from './set-fields.tsx';
import { structuresQuery } from '#src/features/work-orders/api/structures.ts';
import { Button } from '#src/components/ui/button.tsx';
import { Cautions } from '#src/components/ui/caution.tsx';
import { ErrorState } from '#src/components/ui/error-state.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { Quantity } from '#src/components/ui/quantity.tsx';
import { Skeleton } from '#src/components/ui/skeleton.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { counted } from '#src/lib/formats.ts';
import { localToday } from '#src/lib/local-today.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import { allotStock } from '#shared/planner/allot-stock.ts';
import { orderCsv } from '#shared/planner/order-csv.ts';
import { PLAN_DEFAULTS } from '#shared/planner/plan-fields.ts';
import { planOne } from '#shared/planner/plan-one.ts';
import { amountBySize, sharedTexts } from '#shared/planner/plan-texts.ts';
import type { PlanContext } from '#shared/planner/plan-types.ts';
import type { PlannedStructure } from '#shared/generated/api-types.ts';
import type { Kind } from '#shared/records/types.ts';
import type { Product } from '#shared/standard/types.ts';

/** Always the same, so never painted anew. */
const CAUTIONS = <Cautions />;

type Props = {
  readonly orderId: string;
  readonly everything: boolean;
  readonly state: PlanState;
  readonly context: PlanContext;
  readonly products: readonly Product[];
};

const NONE: readonly PlannedStructure[] = [];
const KINDS: readonly Kind[] = ['set', 'straighten', 'relevel'];

/** A whole work order: what is assumed alike at the left, kits and structures at the right. */
export function OrderView({ orderId, everything, state, context, products }: Props) {
  const { typed, type, settle } = state;
  const metric = useUnitSystem() === 'metric';
  const texts = useMemo(() => sharedTexts({ ...PLAN_DEFAULTS, ...typed }), [typed]);
  const structures = useQuery({ ...structuresQuery(orderId), enabled: orderId !== '' });
  const wanted = useMemo(
    () => (structures.data ?? NONE).filter((one) => everything || one.state === 'planned'),
    [structures.data, everything],
  );
  const kinds = KINDS.filter((kind) => wanted.some((one) => one.kind === kind));
  const { plan, busy } = useOrderPlan({ structures: wanted, texts, context, metric });
  // What hangs on the plan is painted when there is time.
  const later = useDeferredValue(texts);
  const sample = useMemo(() => KINDS.map((kind) => planOne({ ...texts, kind }, context)), [texts, context]);
  const form = useMemo<PlanForm>(() => {
    const faults = new Map<string, string>();
    // What is missing of one structure's design is said in its row; here, what was typed wrong.
    for (const one of sample)
      for (const { field, text } of one.faults)
        if ((texts[field] ?? '').trim() !== '') faults.set(field, text);
    const assumed = Object.assign({}, ...sample.toReversed().map(assumedTexts)) as Record<string, string>;
    return { texts, type, settle, faultOf: (key) => faults.get(key), assumed: withoutDesign(assumed) };
  }, [texts, type, settle, sample]);
  const productCode = context.product?.code ?? '';
  const seesLots = useCan('read', 'Lot');
  const stock = useQuery({ ...stockQuery(productCode), enabled: seesLots && productCode !== '' });
  const day = localToday();
  const allotted = useMemo(
    () =>
      allotStock(plan.lines, {
        lots: stock.data ?? [],
        day,
        typed: (kitFt3) => amountBySize(later, 'hand', kitFt3),
      }),
    [plan.lines, stock.data, day, later],
  );
  const priceOf = useCallback((kitFt3: number) => amountBySize(later, 'price', kitFt3), [later]);
  const rowTo = useCallback(
    (row: PlannedRow) => plannerAddress({ view: null, order: orderId, structure: row.structure.id }, later),
    [orderId, later],
  );
  const sizes = sample[0]?.assumptions.kitsFt3 ?? [];
  return (
    <PlanFormProvider value={form}>
      <div className="grid flex-1 grid-cols-[minmax(0,1fr)] md:grid-cols-[20rem_minmax(0,1fr)] print:block">
        <form
          aria-label="What is assumed"
          onSubmit={(event) => event.preventDefault()}
          className="min-w-0 border-hairline md:border-r print:hidden"
        >
          <OrderPicker orderId={orderId} everything={everything} go={state.go} />
          {kinds.includes('set') ? (
            <>
              <BoreFields one={false} />
              <FormSection title="Soil over rock" note="Where the design list says so: where rock begins.">
                <PlanInput name="rockFromFt" />
              </FormSection>
            </>
          ) : null}
          {kinds.includes('straighten') ? <StraightenFields one={false} /> : null}
          {kinds.includes('relevel') ? <RelevelFields one={false} /> : null}
          <FoamFields products={products} kitsFt3={sizes} kinds={kinds} order />
          <div className="px-gutter py-4">{CAUTIONS}</div>
        </form>
        <div className="flex min-w-0 flex-col" aria-busy={busy}>
          {orderId === '' ? (
            <p className="px-gutter py-8 text-ink-2">
              Choose a work order: its design list is planned as a whole.
            </p>
          ) : structures.isError ? (
            <ErrorState
              error={structures.error}
              what="The work order"
              onRetry={() => void structures.refetch()}
            />
          ) : structures.isPending ? (
            <Skeleton lines={10} />
          ) : (
            <>
              <OrderPrintHead {...{ orderId, everything, texts: later, context }} />
              <OrderKits
                allotted={allotted}
                priceOf={priceOf}
                lots={seesLots ? (stock.data ?? []) : null}
                day={day}
              />
              <SectionHead
                title="Structures"
                aside={
                  <span className="flex flex-wrap items-center gap-x-4 gap-y-1">
                    <span>
                      {counted(plan.rows.length, 'structure')}, void{' '}
                      <Quantity value={plan.voidFt3} unit="ft3" />
                    </span>
                    {plan.unplanned > 0 ? (
                      <span className="text-query">{plan.unplanned} not planned yet</span>
                    ) : null}
                    <Button
                      size="small"
                      onClick={() =>
                        downloadCsv('kits-of-work-order.csv', orderCsv(plan, { allotted, priceOf }))
                      }
                    >
                      Export CSV
                    </Button>
                  </span>
                }
              />
              <OrderStructures rows={plan.rows} rowTo={rowTo} />
              <div className="mt-4 hidden break-inside-avoid print:block">{CAUTIONS}</div>
            </>
          )}
        </div>
      </div>
      <StatusBar
        left={
          orderId === '' ? '' : `Void ${plan.voidFt3.toFixed(0)} ft³, need ${plan.needFt3.toFixed(0)} ft³`
        }
        keys={[
          { keys: ['J', 'K'], does: 'structure' },
          { keys: ['Enter'], does: 'its plan' },
        ]}
      />
    </PlanFormProvider>
  );
}

/** What blank fields of one structure would be taken as is no assumption about all of them. */
function withoutDesign(assumed: Record<string, string>): Record<string, string> {
  const { embedmentFt: _e, gapDepthFt: _d, gapAtGradeIn: _g, boreIn: _b, ...rest } = assumed;
  return rest;
}
