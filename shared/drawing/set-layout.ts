import type { AnchorName } from './anchors.ts';
import { placeColumn, type PlacedText } from './label-column.ts';
import type { LayoutInput } from './layout-input.ts';
import { setDimensions, type SetDimensions } from './set-dimensions.ts';
import { annulusPoint, setGeometry, type SetGeometry } from './set-geometry.ts';
import { setLabels, type LabelContent } from './set-labels.ts';
import { setSection, type SetSection } from './set-section.ts';
import type { Point } from './sheet-types.ts';

export type SetLayout = {
  readonly section: SetSection;
  readonly geometry: SetGeometry;
  readonly dimensions: SetDimensions;
  readonly labels: readonly PlacedText[];
  /** Labels that found no room; the list beside the sheet still has their findings. */
  readonly leftOut: readonly LabelContent[];
};

/** Everything on the sheet of a *set* record, placed. */
export function setLayout(input: LayoutInput): SetLayout {
  const { record, findings, limits, spec, metric, purpose, foot } = input;
  const section = setSection(record, purpose);
  const geometry = setGeometry(section, spec);
  const dimensions = setDimensions({ section, geometry, spec, values: record.values, findings, metric });
  const onLine = new Set(dimensions.down.map((dimension) => dimension.balloon?.finding.id));
  const contents = setLabels({ record, section, findings, limits, metric, purpose }).filter(
    (label) => label.finding === null || !onLine.has(label.finding.id),
  );
  const column = placeColumn(contents, {
    spec,
    bottom: foot.labelsBottom,
    pointOf: ({ anchor }) => (anchor === null ? null : anchorPoint(anchor, section, geometry)),
  });
  return { section, geometry, dimensions, ...column };
}

/** Where on the section a name points; null where that was not measured. */
export function anchorPoint(name: AnchorName, section: SetSection, geometry: SetGeometry): Point | null {
  const { bore, pole, edges } = geometry;
  const { ghosts } = section;
  const deep = section.bore?.depthFt ?? section.embedmentFt ?? section.deepestFt;
  const foamTop = section.foam?.topFt ?? 0;
  const inAnnulus = (z: number) => annulusPoint(section, geometry, z);
  const alongFoam = (share: number) => inAnnulus(foamTop + (deep - foamTop) * share);
  const boreFoot = bore
    ? { x: bore.bottomRight, y: bore.bottomY }
    : ghosts.bore && { x: geometry.x(ghosts.bore.halfBottomFt), y: geometry.y(ghosts.bore.depthFt) };
  const ghostButt = ghosts.pole && {
    x: geometry.x(ghosts.pole.halfBottomFt),
    y: geometry.y(ghosts.pole.depthFt) - 4,
  };
  const places: Record<AnchorName, Point | null> = {
    'pole-top': pole
      ? { x: pole.topRight + (pole.right - pole.topRight) * 0.25, y: geometry.y(0) - 66 }
      : ghosts.pole && { x: geometry.x(ghosts.pole.halfTopFt), y: geometry.y(0) - 66 },
    'bore-top': { x: edges.right, y: geometry.groundAt(edges.right) },
    'foam-top': inAnnulus(foamTop),
    foam: alongFoam(0.24),
    annulus: alongFoam(0.55),
    'bore-depth': boreFoot,
    'bore-bottom': boreFoot,
    butt: pole ? { x: pole.buttRight, y: pole.buttY - 4 } : ghostButt,
    water: inAnnulus(Math.max(0, deep - (section.waterFt ?? 0))),
    bed: inAnnulus(deep - (section.bed?.heightFt ?? 0) / 2),
    rock: {
      x: geometry.x(0) + geometry.halfWidth + 16,
      y: geometry.y(Math.max(0.3, Math.min(section.rockFromFt ?? 0.3, section.deepestFt))),
    },
    embedment: pole ? { x: pole.buttRight - 4, y: pole.buttY - 8 } : ghostButt,
  };
  return places[name];
}
