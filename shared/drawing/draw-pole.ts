import { SECTION_SIDES } from '#shared/calc/section.ts';
import { at, path, round, type Mark } from './marks.ts';
import type { SetGeometry } from './set-geometry.ts';
import type { SetSection } from './set-section.ts';
import type { SheetSpec } from './sheet-spec.ts';

type Pole = NonNullable<SetGeometry['pole']>;

/** The pole with its taper, broken off above grade: wood with its grain, a polygon with its edges. */
export function poleMarks(
  section: SetSection,
  { geometry, spec, wood }: { geometry: SetGeometry; spec: SheetSpec; wood: boolean },
): Mark[] {
  const { pole } = geometry;
  if (!pole) return [];
  return [
    path(
      `${brokenTop(pole.topLeft, pole.topRight, spec.poleTopY)}L${at(pole.buttRight, pole.buttY)}L${at(pole.buttLeft, pole.buttY)}Z`,
      { fill: 'pole-fill', stroke: 'pole', weight: 1.5 },
    ),
    ...lengthwise(section, pole, { topY: spec.poleTopY + 14, wood }),
    ...(section.pole?.openWallIn ? [openInside(section.pole.openWallIn, pole, geometry)] : []),
  ];
}

/** A long break line, as drawn where a part goes on beyond the sheet. */
export function brokenTop(left: number, right: number, y: number): string {
  const step = (right - left) / 4;
  const rise = Math.min(6, step * 0.5);
  const wave = (dy: number) => `t${at(step, dy)}`;
  return `M${at(left, y)}q${at(step / 2, rise * 1.6)} ${at(step, rise * 0.6)}${wave(-rise * 0.4)}${wave(rise * 0.4)}${wave(-rise * 0.6)}`;
}

/** Grain of wood; the edges of a polygon that one sees from the side. */
function lengthwise(
  section: SetSection,
  pole: Pole,
  { topY, wood }: { topY: number; wood: boolean },
): Mark[] {
  const sides = section.pole === null ? null : SECTION_SIDES[section.pole.section];
  const shares = sides === null ? (wood ? [0.32, 0.64, 0.93] : []) : edgeShares(sides);
  if (shares.length === 0) return [];
  const lines = shares.map((share) => {
    const top = pole.topLeft + (pole.topRight - pole.topLeft) * share;
    const butt = pole.buttLeft + (pole.buttRight - pole.buttLeft) * share;
    return `M${at(top, topY)}L${at(butt, pole.buttY - (sides === null ? 6 : 1))}`;
  });
  return [path(lines.join(''), { stroke: 'pole', weight: 1, opacity: sides === null ? 0.5 : 0.8 })];
}

/** Where the near edges of a polygon lie across its width, two flats at its sides. */
export function edgeShares(sides: number): number[] {
  const shares: number[] = [];
  for (let index = 0; index < sides / 2; index += 1) {
    const share = 0.5 - Math.cos(((2 * index + 1) * Math.PI) / sides) / Math.cos(Math.PI / sides) / 2;
    if (share > 0.001 && share < 0.999) shares.push(round(share));
  }
  return shares;
}

/** The hidden inside of an open butt, dashed over the lowest part, where foam and water can enter. */
function openInside(wallIn: number, pole: Pole, geometry: SetGeometry): Mark {
  const wall = (wallIn / 12) * geometry.scale;
  const topY = Math.max(geometry.y(0), pole.buttY - 120);
  const side = (x: number) => `M${at(x, topY)}L${at(x, pole.buttY)}`;
  return path(side(pole.buttLeft + wall) + side(pole.buttRight - wall), {
    stroke: 'pole',
    weight: 1,
    dash: [5, 3],
  });
}

/** The axis of the pole, from above its break to below everything. */
export function axisMark(section: SetSection, geometry: SetGeometry, spec: SheetSpec): Mark {
  const { pole } = geometry;
  const axis = pole ? (pole.left + pole.right) / 2 : geometry.x(0);
  const bottom = Math.max(geometry.y(section.deepestFt), pole?.buttY ?? 0) + 26;
  return path(`M${at(axis, spec.poleTopY - 26)}L${at(axis, bottom)}`, {
    stroke: 'ink-2',
    weight: 1,
    dash: [14, 4, 3, 4],
  });
}
