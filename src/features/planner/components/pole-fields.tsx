import { usePlanForm } from '../lib/plan-form.ts';
import { FoldedSection, FormSection } from './form-section.tsx';
import { PlanInput } from './plan-input.tsx';
import { PlanSelect } from './plan-select.tsx';

const TAPED = [
  'girthGroundLineIn',
  'girthButtIn',
  'diameterGroundLineIn',
  'diameterButtIn',
  'poleSection',
  'wallIn',
];
const NOT_WOOD = new Set(['steel', 'concrete', 'composite']);

/** The pole by its design, and by tape where the class table does not do. */
export function PoleFields({ butt }: { readonly butt: boolean }) {
  const { texts, faultOf } = usePlanForm();
  const taped =
    NOT_WOOD.has(texts['poleMaterial'] ?? '') ||
    TAPED.some((key) => texts[key] || faultOf(key) !== undefined);
  return (
    <>
      <FormSection title="Pole">
        <PlanInput name="poleLengthFt" label="Length" />
        <PlanSelect name="poleClass" label="Class" />
        <div className="col-span-2">
          <PlanSelect name="poleMaterial" label="Material" />
        </div>
      </FormSection>
      <FoldedSection
        title="Taped sizes"
        note="In place of the class table: girth, or diameter across flats."
        open={taped}
      >
        <PlanInput name="girthGroundLineIn" label="Girth, ground line" />
        <PlanInput name="diameterGroundLineIn" label="Size, ground line" />
        {butt ? (
          <>
            <PlanInput name="girthButtIn" label="Girth, butt" />
            <PlanInput name="diameterButtIn" label="Size, butt" />
          </>
        ) : null}
        <PlanSelect name="poleSection" label="Section" blank="round" />
        {butt ? (
          <>
            <PlanSelect name="buttEnd" label="Butt" blank="solid" />
            <PlanInput name="wallIn" label="Wall" />
          </>
        ) : null}
      </FoldedSection>
    </>
  );
}
