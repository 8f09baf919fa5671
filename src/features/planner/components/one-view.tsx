import { useCallback, useDeferredValue, useMemo } from 'react';
import { assumedTexts } from '../lib/assumed-texts.ts';
import { PlanFormProvider, type PlanForm } from '../lib/plan-form.ts';
import { planRecord } from '../lib/plan-record.ts';
import { BoreFields, GroundFields } from './set-fields.tsx';
import { FoamFields } from './foam-fields.tsx';
import { FormSection } from './form-section.tsx';
import { KitAnswers } from './kit-answers.tsx';
import { PlanFacts } from './plan-facts.tsx';
import { PlanInput } from './plan-input.tsx';
import { PlanSelect } from './plan-select.tsx';
import { PoleFields } from './pole-fields.tsx';
import { RelevelFields, StraightenFields } from './other-fields.tsx';
import { RockSection } from './rock-section.tsx';
import { WaterSection } from './water-section.tsx';
import { RecordSheet } from '#src/components/drawing/record-sheet.tsx';
import { Cautions } from '#src/components/ui/caution.tsx';
import { StatusBar } from '#src/components/ui/status-bar.tsx';
import { sheetLimits } from '#shared/drawing/sheet-limits.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import { assumptionsOf } from '#shared/planner/assumptions.ts';
import { kitsText } from '#shared/planner/kits-text.ts';
import { planOne } from '#shared/planner/plan-one.ts';
import { amountBySize, type PlanTexts } from '#shared/planner/plan-texts.ts';
import type { PlanContext } from '#shared/planner/plan-types.ts';
import { readPlan } from '#shared/planner/read-plan.ts';
import { tableHead } from '#shared/planner/table-head.ts';
import { formatQuantity } from '#shared/units/format-quantity.ts';
import type { Product } from '#shared/standard/types.ts';

/** Always the same, so never painted anew. */
const CAUTIONS = <Cautions />;

type Props = {
  readonly texts: PlanTexts;
  readonly type: PlanForm['type'];
  readonly settle: PlanForm['settle'];
  readonly context: PlanContext;
  readonly products: readonly Product[];
};

/** One structure: what is asked at the left, drawn in the middle, answered at the right. */
export function OneView({ texts, type, settle, context, products }: Props) {
  const metric = useUnitSystem() === 'metric';
  const plan = useMemo(() => planOne(texts, context, { metric }), [texts, context, metric]);
  const form = useMemo<PlanForm>(() => {
    const faults = new Map(plan.faults.toReversed().map(({ field, text }) => [field, text]));
    return { texts, type, settle, faultOf: (key) => faults.get(key), assumed: assumedTexts(plan) };
  }, [texts, type, settle, plan]);
  const { kind } = plan;
  const { standard, product } = context;
  const priceOf = useCallback((kitFt3: number) => amountBySize(texts, 'price', kitFt3), [texts]);
  return (
    <PlanFormProvider value={form}>
      <div className="grid flex-1 grid-cols-[minmax(0,1fr)] md:grid-cols-[20rem_minmax(0,1fr)] xl:grid-cols-[20rem_minmax(0,1fr)_27rem] print:flex print:flex-col">
        <form
          aria-label="What is planned"
          onSubmit={(event) => event.preventDefault()}
          className="min-w-0 border-hairline md:row-span-2 md:border-r xl:row-span-1 print:hidden"
        >
          <FormSection title="Structure">
            <PlanSelect name="kind" label="Kind of work" />
            <PlanInput name="name" label="Number" />
          </FormSection>
          {kind === 'relevel' ? <RelevelFields one /> : <PoleFields butt={kind === 'set'} />}
          {kind === 'set' ? (
            <>
              <GroundFields />
              <BoreFields one />
            </>
          ) : null}
          {kind === 'straighten' ? <StraightenFields one /> : null}
          <FoamFields products={products} kitsFt3={plan.assumptions.kitsFt3} kinds={[kind]} />
        </form>
        {kind === 'set' ? <PrintHead texts={texts} context={context} /> : null}
        <div className="order-3 min-w-0 px-3 py-2.5 xl:order-none print:order-3 print:p-0">
          <div className="print:mx-auto print:w-[12cm]">
            <PlanDrawing plan={plan} name={texts['name'] ?? ''} context={context} />
          </div>
          {kind === 'set' ? <WhatIfs plan={plan} texts={texts} context={context} /> : null}
        </div>
        <div className="min-w-0 border-hairline xl:border-l print:contents">
          <KitAnswers plan={plan} priceOf={priceOf} productCode={product?.code ?? 'no foam'} />
          <PlanFacts plan={plan} standard={standard} />
          <div className="px-gutter py-4 print:order-4 print:break-inside-avoid print:px-0">{CAUTIONS}</div>
        </div>
      </div>
      <StatusBar
        left={
          <>
            {plan.kits.likely ? `Kits ${kitsText(plan.kits.likely.kits)} ft³` : 'Kits not known yet'}
            {plan.voidFt3 ? ` for ${formatQuantity(plan.voidFt3.likely, 'ft3', { metric })}` : null}
          </>
        }
        right="A plan for the crew; what is built is measured anew."
      />
    </PlanFormProvider>
  );
}

type PartProps = { readonly plan: ReturnType<typeof planOne>; readonly context: PlanContext };

/** The drawing and the what-ifs may come a moment after the figures: typing never waits for them. */
function PlanDrawing({ plan, name, context }: PartProps & { readonly name: string }) {
  const later = useDeferredValue(plan);
  const record = useMemo(() => planRecord(later, name), [later, name]);
  const limits = useMemo(() => sheetLimits(context.standard), [context.standard]);
  return <RecordSheet record={record} limits={limits} purpose="plan" caution={false} />;
}

/** On paper the fields are not there: what was typed stands over the answers. */
function PrintHead({ texts, context }: Omit<PartProps, 'plan'> & { readonly texts: PlanTexts }) {
  const reading = readPlan(texts);
  const name = reading.words.get('name');
  const head = tableHead(reading, { assumptions: assumptionsOf(reading, context), context });
  return (
    <dl className="hidden grid-cols-[max-content_minmax(0,1fr)] gap-x-4 px-gutter py-2 text-table print:grid">
      {[...(name === undefined ? [] : [['Structure', name] as const]), ...head].map(([word, text]) => (
        <div key={word} className="contents">
          <dt className="text-muted">{word}</dt>
          <dd>{text}</dd>
        </div>
      ))}
    </dl>
  );
}

function WhatIfs({ plan, texts, context }: PartProps & { readonly texts: PlanTexts }) {
  const later = useDeferredValue(plan);
  const typed = useDeferredValue(texts);
  const reading = useMemo(() => readPlan(typed), [typed]);
  return (
    <div className="mt-3 grid grid-cols-[minmax(0,1fr)] gap-x-3 border-t border-hairline 2xl:grid-cols-2">
      <WaterSection plan={later} standard={context.standard} />
      <RockSection reading={reading} context={context} />
    </div>
  );
}
