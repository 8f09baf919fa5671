import { FormSection } from './form-section.tsx';
import { PlanInput } from './plan-input.tsx';

/** The gap behind a leaning pole: measured, or told from its lean. */
export function StraightenFields({ one }: { readonly one: boolean }) {
  return (
    <FormSection
      title="Lean and gap"
      note="Without a measured gap, the one that the change of lean will open."
    >
      <PlanInput name="leanInPer10Ft" />
      <PlanInput name="leanAfterInPer10Ft" />
      {one ? (
        <>
          <PlanInput name="gapAtGradeIn" />
          <PlanInput name="gapAtDepthIn" label="Gap at depth" />
        </>
      ) : null}
      <PlanInput name="gapDepthFt" label="Depth of the gap" />
      {one ? (
        <>
          <PlanInput name="gapWidthIn" label="Width of the gap" />
          <PlanInput name="embedmentFt" label="Embedment" />
          <PlanInput name="waterIn" label="Water, pole in" />
        </>
      ) : null}
    </FormSection>
  );
}

/** The pad, and how it stands now. */
export function RelevelFields({ one }: { readonly one: boolean }) {
  return (
    <>
      <FormSection title="Pad">
        <PlanInput name="padLengthIn" label="Length, to the back" />
        <PlanInput name="padWidthIn" label="Width" />
        <PlanInput name="openingLengthIn" label="Opening, length" />
        <PlanInput name="openingWidthIn" label="Opening, width" />
      </FormSection>
      <FormSection title="How it stands now" note="Positive: higher at the back, higher at the right.">
        <PlanInput name="slopeAlongInPerFt" label="Slope, along" />
        <PlanInput name="slopeAcrossInPerFt" label="Slope, across" />
        <PlanInput name="liftIn" label="Lift, highest corner" />
      </FormSection>
      {one ? (
        <FormSection
          title="Gaps at the final level"
          note="All four, once it is raised; else the slopes tell them."
        >
          <PlanInput name="gap1In" label="Front left" />
          <PlanInput name="gap4In" label="Front right" />
          <PlanInput name="gap2In" label="Back left" />
          <PlanInput name="gap3In" label="Back right" />
        </FormSection>
      ) : null}
    </>
  );
}
