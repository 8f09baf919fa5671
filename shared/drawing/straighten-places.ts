import type { SheetSpec } from './sheet-spec.ts';
import type { Point } from './sheet-types.ts';
import type { StraightenSection } from './straighten-section.ts';

/** A straightened pole in sheet units. */
export type StraightenPlaces = {
  /** Units per foot, the same both ways. */
  readonly scale: number;
  readonly halfFt: number;
  readonly y: (z: number) => number;
  /** Left (−1), axis (0) or right face (1) of the pole as it stands now, at a depth. */
  readonly face: (side: -1 | 0 | 1, z: number) => Point;
  /** The same of the pole as it stood before; null where neither lean nor gap tells. */
  readonly former: ((side: -1 | 0 | 1, z: number) => Point) | null;
  /** A line through the axis at grade by its slope. */
  readonly ray: (slope: number, z: number) => Point;
  readonly topFt: number;
  readonly buttFt: number;
  /** Open below where the embedment is not known. */
  readonly open: boolean;
  /** Corners of the wedge: at the pole, at the soil, its foot at the soil, its foot at the pole. */
  readonly wedge: readonly [Point, Point, Point, Point] | null;
  /** Stands in for it, dashed, where its gaps are not known. */
  readonly ghostWedge: readonly [Point, Point, Point] | null;
  readonly hatchBottomY: number;
};

/** Less height below than a set pole takes, and more above: the lean is seen there. */
export function straightenSpec(spec: SheetSpec): SheetSpec {
  return { ...spec, groundY: spec.groundY + (spec.compact ? 60 : 84) };
}

export function straightenPlaces(section: StraightenSection, spec: SheetSpec): StraightenPlaces {
  const { wedge, slopes } = section;
  const halfFt = (section.poleIn ?? 12) / 24;
  const widest = halfFt + (wedge === null ? 0.4 : Math.max(wedge.gapAtGradeIn, wedge.gapAtDepthIn) / 12);
  const scale = Math.min(
    (spec.bottomY - spec.groundY) / section.deepestFt,
    spec.halfRoom / widest,
    spec.maxScale,
  );
  const y = (z: number) => spec.groundY + z * scale;
  const x = (ft: number) => spec.axisX + ft * scale;
  const room = (spec.hatch.right - spec.axisX) / scale - widest;
  const aboveFt = (spec.groundY - spec.poleTopY) / scale;
  // A pole that leaned far is cut where it would leave the drawing.
  const steepest = Math.max(...[slopes.before, slopes.after, slopes.rake].map((one) => Math.abs(one ?? 0)));
  const topFt = -Math.min(aboveFt, steepest > 0 ? Math.max(0.4, room / steepest) : aboveFt);
  const slope = slopes.after ?? 0;
  const face = (side: -1 | 0 | 1, z: number) => ({ x: x(side * halfFt - slope * z), y: y(z) });
  const corner = (z: number, gapIn: number) => {
    const at = face(1, z);
    return { x: at.x + (gapIn / 12) * scale, y: at.y };
  };
  return {
    scale,
    halfFt,
    y,
    face,
    former: formerFace(),
    ray: (by, z) => ({ x: x(-by * z), y: y(z) }),
    topFt,
    buttFt: section.embedmentFt ?? section.deepestFt,
    open: section.embedmentFt === null,
    wedge: wedge && [
      corner(0, 0),
      corner(0, wedge.gapAtGradeIn),
      corner(wedge.depthFt, wedge.gapAtDepthIn),
      corner(wedge.depthFt, 0),
    ],
    ghostWedge: wedge
      ? null
      : [corner(0, 0), corner(0, 4), corner(Math.min(3.4, section.deepestFt - 0.4), 0)],
    hatchBottomY: y(section.deepestFt) + 40,
  };

  /** The soil kept the shape of the former face: it runs along the wedge, and above grade on by the lean that was measured. */
  function formerFace(): StraightenPlaces['former'] {
    if (wedge === null && slopes.before === null) return null;
    const gapFt = (wedge?.gapAtGradeIn ?? 0) / 12;
    const byGap = wedge === null ? 0 : (wedge.gapAtGradeIn - wedge.gapAtDepthIn) / 12 / wedge.depthFt + slope;
    const by = slopes.before ?? byGap;
    return (side, z) => ({ x: x(gapFt + side * halfFt - by * z), y: y(z) });
  }
}
