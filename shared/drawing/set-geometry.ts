import { poleSizeAt } from '#shared/calc/pole-profile.ts';
import { at } from './marks.ts';
import type { Ghost } from './set-ghosts.ts';
import { boreHalfFt, boreWall, type FtPoint, type SetSection } from './set-section.ts';
import type { SheetSpec } from './sheet-spec.ts';
import type { Point } from './sheet-types.ts';

/** The section in sheet units: scale and the places that dimensions, labels and paths need. */
export type SetGeometry = {
  /** Units per foot, the same both ways. */
  readonly scale: number;
  readonly x: (ft: number) => number;
  readonly y: (ft: number) => number;
  /** Ground line at a place across the sheet: it rises to the right on a slope. */
  readonly groundAt: (x: number) => number;
  readonly bore: {
    readonly left: number;
    readonly right: number;
    readonly bottomLeft: number;
    readonly bottomRight: number;
    readonly bottomY: number;
    readonly path: string;
  } | null;
  readonly pole: {
    readonly left: number;
    readonly right: number;
    readonly buttLeft: number;
    readonly buttRight: number;
    readonly buttY: number;
    readonly topLeft: number;
    readonly topRight: number;
  } | null;
  /** Edges of the bore at grade, of its ghost where it is not known. */
  readonly edges: { readonly left: number; readonly right: number };
  readonly hatchBottomY: number;
  /** Outermost half width of anything in the ground. */
  readonly halfWidth: number;
};

export function setGeometry(section: SetSection, spec: SheetSpec): SetGeometry {
  const { bore, pole } = section;
  const widestFt = Math.max(
    0.5,
    ...(bore ? bore.parts.flatMap((part) => [part.top.a / 24, part.bottom.a / 24]) : []),
    pole ? Math.max(pole.buttIn, pole.groundLineIn) / 24 : 0,
    ...ghostHalves(section.ghosts.bore),
    ...ghostHalves(section.ghosts.pole),
  );
  const scale = Math.min(
    (spec.bottomY - spec.groundY) / section.deepestFt,
    spec.halfRoom / widestFt,
    spec.maxScale,
  );
  const x = (ft: number) => spec.axisX + ft * scale;
  const y = (ft: number) => spec.groundY + ft * scale;
  const topHalf = (bore ? boreHalfFt(bore, 0) : (section.ghosts.bore?.halfTopFt ?? 0)) * scale;
  const lowX = spec.axisX - topHalf;
  // On from the bore's edges the ground goes on rising only a little: a hillside would leave the sheet.
  const groundAt = (at: number) => {
    const run = Math.max(-14, Math.min(at - lowX, topHalf * 2 + 14));
    return spec.groundY - run * section.slope;
  };
  return {
    scale,
    x,
    y,
    groundAt,
    bore: bore && {
      left: x(-boreHalfFt(bore, 0)),
      right: x(boreHalfFt(bore, 0)),
      bottomLeft: x(-boreHalfFt(bore, bore.depthFt)),
      bottomRight: x(boreHalfFt(bore, bore.depthFt)),
      bottomY: y(bore.depthFt),
      path: boreOutline(section, { x, y, groundAt }),
    },
    edges: { left: spec.axisX - topHalf, right: spec.axisX + topHalf },
    pole: pole && polePlace(section, { x, y, spec, scale }),
    hatchBottomY: y(section.deepestFt) + 40,
    halfWidth: widestFt * scale,
  };
}

function ghostHalves(ghost: Ghost | null): number[] {
  return ghost === null ? [] : [ghost.halfTopFt, ghost.halfBottomFt];
}

type Axes = { x: (ft: number) => number; y: (ft: number) => number };

function boreOutline(
  { bore }: SetSection,
  { x, y, groundAt }: Axes & { groundAt: (x: number) => number },
): string {
  if (!bore) return '';
  const right = boreWall(bore, 0, bore.depthFt);
  const left = right.toReversed().map((point) => ({ x: -point.x, z: point.z }));
  const rightTop = x(boreHalfFt(bore, 0));
  return [
    `M${at(rightTop, groundAt(rightTop))}`,
    ...[...right, ...left].map((point) => `L${at(x(point.x), y(point.z))}`),
  ].join('');
}

function polePlace(
  { pole, poleOffsetFt }: SetSection,
  { x, y, spec, scale }: Axes & { spec: SheetSpec; scale: number },
): SetGeometry['pole'] {
  if (!pole) return null;
  const half = (z: number) => poleSizeAt(pole, z) / 24;
  // The taper goes on above grade as it runs below.
  const taper = (pole.buttIn - pole.groundLineIn) / 24 / pole.embedmentFt;
  const above = (spec.groundY - spec.poleTopY) / scale;
  const topHalf = Math.max(half(0) / 2, half(0) - taper * above);
  return {
    left: x(poleOffsetFt - half(0)),
    right: x(poleOffsetFt + half(0)),
    buttLeft: x(poleOffsetFt - half(pole.embedmentFt)),
    buttRight: x(poleOffsetFt + half(pole.embedmentFt)),
    buttY: y(pole.embedmentFt),
    topLeft: x(poleOffsetFt - topHalf),
    topRight: x(poleOffsetFt + topHalf),
  };
}

/** Closed outline of the bore between two depths. */
export function boreSlice(
  section: SetSection,
  geometry: SetGeometry,
  [fromFt, toFt]: readonly [number, number],
): string {
  if (!section.bore || toFt <= fromFt) return '';
  const right = boreWall(section.bore, fromFt, toFt);
  return closed([...right, ...right.toReversed().map(({ x, z }) => ({ x: -x, z }))], geometry);
}

function closed(points: readonly FtPoint[], { x, y }: SetGeometry): string {
  return `${points.map((point, index) => `${index === 0 ? 'M' : 'L'}${at(x(point.x), y(point.z))}`).join('')}Z`;
}

/** A point half-way across the annulus at the right, at a depth; null where no bore is drawn. */
export function annulusPoint(section: SetSection, geometry: SetGeometry, z: number): Point | null {
  if (!section.bore) return null;
  const outer = boreHalfFt(section.bore, z);
  const inner =
    section.pole && z <= section.pole.embedmentFt
      ? section.poleOffsetFt + poleSizeAt(section.pole, z) / 24
      : 0;
  return { x: geometry.x((outer + inner) / 2), y: geometry.y(z) };
}
