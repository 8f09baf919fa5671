import { labelMarks } from './draw-label.ts';
import { padPlanMarks } from './pad-plan.ts';
import { padSectionMarks } from './pad-section.ts';
import type { LayoutInput } from './layout-input.ts';
import type { Mark } from './marks.ts';
import type { RelevelLayout } from './relevel-layout.ts';
import { scaleBarMarks } from './scale-bar.ts';

/** A pad from above with its four corner gaps, and in section with the wedge of foam under it. */
export function relevelMarks(layout: RelevelLayout, { foot, metric }: LayoutInput): Mark[] {
  const { section, places, labels } = layout;
  return [
    ...padPlanMarks(layout, metric),
    ...padSectionMarks(section, places, metric),
    ...labels.flatMap(labelMarks),
    ...scaleBarMarks({ ...foot.scaleBar, scale: places.scale * 12, metric }),
  ];
}
