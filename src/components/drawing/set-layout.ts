import { annulusPoint, setGeometry, type SetGeometry } from './set-geometry.ts';
import { setDimensions, type SetDimensions } from './set-dimensions.ts';
import { setLabels, type LabelContent } from './set-labels.ts';
import { setSection, type SetSection } from './set-section.ts';
import { placeColumn, type PlacedText } from './label-column.ts';
import type { AnchorName } from './anchors.ts';
import type { SheetSpec } from './sheet-spec.ts';
import type { Point, SheetFinding, SheetLimits, SheetRecord } from './sheet-types.ts';

export type SetLayout = {
  readonly section: SetSection;
  readonly geometry: SetGeometry;
  readonly dimensions: SetDimensions;
  readonly labels: readonly PlacedText[];
  /** Labels that found no room; the list beside the sheet still has their findings. */
  readonly leftOut: readonly LabelContent[];
};

export type LayoutInput = {
  readonly record: SheetRecord;
  readonly findings: readonly SheetFinding[];
  readonly limits: SheetLimits;
  readonly spec: SheetSpec;
  readonly metric: boolean;
  /** Top of the title block. */
  readonly titleTop: number;
};

/** Everything on the sheet of a *set* record, placed; pure, so that overlaps can be tested. */
export function setLayout({ record, findings, limits, spec, metric, titleTop }: LayoutInput): SetLayout {
  const section = setSection(record.values, record.derived);
  const geometry = setGeometry(section, spec);
  const dimensions = setDimensions({ section, geometry, spec, values: record.values, findings, metric });
  const onLine = new Set(dimensions.down.map((dimension) => dimension.balloon?.finding.id));
  const contents = setLabels({ record, section, findings, limits, metric }).filter(
    (label) => label.finding === null || !onLine.has(label.finding.id),
  );
  const column = placeColumn(contents, {
    spec,
    bottom: Math.min(spec.labels.bottom, titleTop - 16),
    pointOf: ({ anchor }) => (anchor === null ? null : anchorPoint(anchor, section, geometry)),
  });
  return { section, geometry, dimensions, ...column };
}

/** Where on the section a name points; null where that was not measured. */
export function anchorPoint(name: AnchorName, section: SetSection, geometry: SetGeometry): Point | null {
  const { bore, pole } = geometry;
  const deep = section.bore?.depthFt ?? section.embedmentFt ?? section.deepestFt;
  const foamTop = section.foam?.topFt ?? 0;
  const inAnnulus = (z: number) => annulusPoint(section, geometry, z);
  const alongFoam = (share: number) => inAnnulus(foamTop + (deep - foamTop) * share);
  const boreFoot = bore && { x: bore.bottomRight, y: bore.bottomY };
  const places: Record<AnchorName, Point | null> = {
    'pole-top': pole && { x: pole.topRight + (pole.right - pole.topRight) * 0.25, y: geometry.y(0) - 66 },
    'bore-top': bore && { x: bore.right, y: geometry.groundAt(bore.right) },
    'foam-top': inAnnulus(foamTop),
    foam: alongFoam(0.24),
    annulus: alongFoam(0.55),
    'bore-depth': boreFoot,
    'bore-bottom': boreFoot,
    butt: pole && { x: pole.buttRight, y: pole.buttY - 4 },
    water: inAnnulus(Math.max(0, deep - (section.waterFt ?? 0))),
    bed: inAnnulus(deep - (section.bed?.heightFt ?? 0) / 2),
    rock: {
      x: geometry.x(0) + geometry.halfWidth + 16,
      y: geometry.y(Math.max(0.3, section.rockFromFt ?? 0.3)),
    },
    embedment: pole && { x: pole.buttRight - 4, y: pole.buttY - 8 },
  };
  return places[name];
}
