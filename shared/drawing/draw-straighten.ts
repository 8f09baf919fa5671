import { acrossMarks, downMarks } from './draw-dimension.ts';
import { GHOST } from './draw-ghosts.ts';
import { labelMarks } from './draw-label.ts';
import { brokenTop } from './draw-pole.ts';
import { leanPlanMarks, needsLeanPlan } from './lean-plan.ts';
import type { LayoutInput } from './layout-input.ts';
import { at, path, through, type Mark } from './marks.ts';
import { scaleBarMarks } from './scale-bar.ts';
import { FONT, type SheetSpec } from './sheet-spec.ts';
import type { StraightenLayout } from './straighten-layout.ts';
import { straightenSpec, type StraightenPlaces } from './straighten-places.ts';
import type { StraightenSection } from './straighten-section.ts';

/** A straightened pole: as it stands now, as it stood before, and the wedge that was filled. */
export function straightenMarks(layout: StraightenLayout, input: LayoutInput): Mark[] {
  const { places, section } = layout;
  const spec = straightenSpec(input.spec);
  const { foot, metric, limits } = input;
  return [
    ...groundMarks(places, spec),
    ...wedgeMarks(section, places),
    ...poleMarks(section, places),
    ...formerMarks(places),
    ...axisMarks(section, places),
    ...layout.across.flatMap(acrossMarks),
    ...layout.down.flatMap(downMarks),
    ...layout.labels.flatMap(labelMarks),
    ...(needsLeanPlan(section)
      ? leanPlanMarks(section, { ...foot.inset, metric, limit: limits.leanMostInPer10Ft })
      : []),
    ...oppositeMarks(places, spec),
    ...scaleBarMarks({ ...foot.scaleBar, scale: places.scale, metric }),
  ];
}

/** What the figures leave out, under the section. */
function oppositeMarks({ hatchBottomY }: StraightenPlaces, spec: SheetSpec): Mark[] {
  return [
    {
      is: 'text',
      x: spec.compact ? spec.scaleBar.x - 16 : spec.hatch.left - 24,
      y: spec.compact ? spec.labels.bottom + 28 : hatchBottomY + 20,
      runs: [
        { text: 'Opposite gap below the pivot', bold: true },
        { text: ' is not counted', tone: 'muted' },
      ],
      size: FONT,
      anchor: 'start',
      part: 'opposite gap',
    },
  ];
}

function groundMarks({ face, wedge, hatchBottomY }: StraightenPlaces, { hatch, groundY }: SheetSpec): Mark[] {
  const left = face(-1, 0).x;
  const right = wedge?.[1].x ?? face(1, 0).x;
  return [
    path(
      `M${at(hatch.left, groundY)}L${at(hatch.right, groundY)}L${at(hatch.right, hatchBottomY)}L${at(hatch.left, hatchBottomY)}Z`,
      { material: 'soil' },
    ),
    path(
      `M${at(hatch.left - 24, groundY)}L${at(left, groundY)}M${at(right, groundY)}L${at(hatch.right + 24, groundY)}`,
      { stroke: 'ink', weight: 2.4 },
    ),
  ];
}

function wedgeMarks(section: StraightenSection, { wedge, ghostWedge, scale }: StraightenPlaces): Mark[] {
  if (!wedge) return ghostWedge ? [path(through(ghostWedge, true), { fill: 'sheet', ...GHOST })] : [];
  const outline = through(wedge, true);
  return [
    path(outline, { fill: 'sheet', material: 'foam' }),
    ...waterInWedge(section, wedge, scale),
    path(outline, { stroke: 'ink', weight: 1.4 }),
  ];
}

/** Water stands at the foot of the gap. */
function waterInWedge(
  { waterIn, wedge }: StraightenSection,
  [poleTop, soilTop, soilFoot, poleFoot]: NonNullable<StraightenPlaces['wedge']>,
  scale: number,
): Mark[] {
  if (waterIn === null || wedge === null) return [];
  const share = Math.min(1, waterIn / 12 / wedge.depthFt);
  const up = (foot: { x: number; y: number }, top: { x: number; y: number }) => ({
    x: foot.x + (top.x - foot.x) * share,
    y: foot.y - wedge.depthFt * scale * share,
  });
  const level = [up(soilFoot, soilTop), up(poleFoot, poleTop)];
  return [
    path(through([poleFoot, soilFoot, ...level], true), { fill: 'water-fill', stroke: 'water', weight: 1 }),
  ];
}

function poleMarks(
  { poleIn, after }: StraightenSection,
  { face, topFt, buttFt, open }: StraightenPlaces,
): Mark[] {
  const [topLeft, topRight] = [face(-1, topFt), face(1, topFt)];
  const [buttLeft, buttRight] = [face(-1, buttFt), face(1, buttFt)];
  const sides = `L${at(buttRight.x, buttRight.y)}${open ? 'M' : 'L'}${at(buttLeft.x, buttLeft.y)}L${at(topLeft.x, topLeft.y)}`;
  if (poleIn === null) return [path(`M${at(topRight.x, topRight.y)}${sides}`, GHOST)];
  const area = `${brokenTop(topLeft.x, topRight.x, topLeft.y)}L${at(buttRight.x, buttRight.y)}L${at(buttLeft.x, buttLeft.y)}Z`;
  // Where it leans now was not measured: it stands plumb, as a sign.
  if (after === null)
    return [
      path(area, { fill: 'pole-fill', opacity: 0.5 }),
      path(`M${at(topRight.x, topRight.y)}${sides}`, GHOST),
    ];
  if (!open) return [path(area, { fill: 'pole-fill', stroke: 'pole', weight: 1.5 })];
  return [
    path(area, { fill: 'pole-fill' }),
    path(`${brokenTop(topLeft.x, topRight.x, topLeft.y)}${sides}`, { stroke: 'pole', weight: 1.5 }),
  ];
}

/** Both faces as they stood before, above grade: below it the soil's side of the wedge is what is left of one. */
function formerMarks({ former, topFt }: StraightenPlaces): Mark[] {
  if (!former) return [];
  const style = { stroke: 'pole', weight: 1.4, dash: [8, 5] } as const;
  const lines = ([-1, 1] as const).map((side) => through([former(side, topFt), former(side, 0)]));
  return [path(lines.join(''), style)];
}

/** Plumb through the pole's axis at grade; the design rake; where it was held before it sprang back. */
function axisMarks({ slopes }: StraightenSection, { ray, topFt, buttFt, scale }: StraightenPlaces): Mark[] {
  const over = 26 / scale;
  const line = (slope: number, from: number, to: number) => through([ray(slope, from), ray(slope, to)]);
  return [
    path(line(0, topFt - over, buttFt + over), { stroke: 'ink-2', weight: 1, dash: [14, 4, 3, 4] }),
    ...(slopes.rake === null
      ? []
      : [path(line(slopes.rake, topFt, 0), { stroke: 'conform', weight: 1.2, dash: [10, 4] })]),
    ...(slopes.held === null
      ? []
      : [path(line(slopes.held, topFt, 0), { stroke: 'ink', weight: 1.1, dash: [1.5, 3] })]),
  ];
}
