import { usePlanForm } from '../lib/plan-form.ts';
import { FormSection } from './form-section.tsx';
import { PlanInput } from './plan-input.tsx';
import { PlanSelect } from './plan-select.tsx';

/** The ground and how deep the pole stands in it. */
export function GroundFields() {
  const { texts } = usePlanForm();
  return (
    <FormSection title="Ground and depth">
      <PlanSelect name="ground" />
      {texts['ground'] === 'soil-over-rock' ? <PlanInput name="rockFromFt" /> : <span />}
      <PlanInput name="designFt" label="Depth by design" />
      <PlanInput name="embedmentFt" label="Depth to be set" />
    </FormSection>
  );
}

/** The bore: blank takes the least auger that leaves the standard’s gap. */
export function BoreFields({ one }: { readonly one: boolean }) {
  return (
    <FormSection title="Bore">
      <div className="col-span-2">
        <PlanInput name="augersIn" hint="The least that leaves the standard’s gap round the pole is taken." />
      </div>
      {one ? <PlanInput name="boreIn" label="Bore to be used" /> : null}
      <PlanInput name="taperIn" label="Narrower below by" />
      <PlanInput name="overDigFt" />
      <PlanSelect name="bedMaterial" label="Bed in the over-dig" blank="none" />
    </FormSection>
  );
}
