import { acrossMarks, downMarks, dueMarks } from './draw-dimension.ts';
import { labelMarks } from './draw-label.ts';
import { boreMarks } from './draw-bore.ts';
import { ghostMarks } from './draw-ghosts.ts';
import { groundMarks } from './draw-ground.ts';
import { axisMark, poleMarks } from './draw-pole.ts';
import type { LayoutInput } from './layout-input.ts';
import type { Mark } from './marks.ts';
import { scaleBarMarks } from './scale-bar.ts';
import type { SetLayout } from './set-layout.ts';
import { needsPlan, planMarks } from './set-plan.ts';

const WOODLESS = new Set(['steel', 'concrete', 'composite']);

/** Section of a *set* record. */
export function setMarks(layout: SetLayout, { record, spec, foot, metric }: LayoutInput): Mark[] {
  const { section, geometry, dimensions, labels } = layout;
  const wood = !WOODLESS.has(String(record.values['poleMaterial']));
  return [
    ...groundMarks(section, geometry, spec),
    ...boreMarks(section, geometry),
    ...poleMarks(section, { geometry, spec, wood }),
    ...ghostMarks(section, geometry, spec),
    axisMark(section, geometry, spec),
    ...dimensions.across.flatMap(acrossMarks),
    ...dimensions.down.flatMap(downMarks),
    ...(dimensions.due ? dueMarks(dimensions.due) : []),
    ...labels.flatMap(labelMarks),
    ...(needsPlan(section) ? planMarks(section, { ...foot.inset, metric }) : []),
    ...scaleBarMarks({ ...foot.scaleBar, scale: geometry.scale, metric }),
  ];
}
