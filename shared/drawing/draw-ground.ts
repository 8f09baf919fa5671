import { at, path, type Mark } from './marks.ts';
import type { SetGeometry } from './set-geometry.ts';
import type { SetSection } from './set-section.ts';
import type { SheetSpec } from './sheet-spec.ts';

/** Hatched ground, soil above rock, and the ground line broken at the bore. */
export function groundMarks(section: SetSection, geometry: SetGeometry, spec: SheetSpec): Mark[] {
  const { left, right } = spec.hatch;
  const { groundAt, hatchBottomY: bottom, edges } = geometry;
  const on = (x: number) => at(x, groundAt(x));
  const ground = `M${on(left)}L${on(edges.left)}L${on(edges.right)}L${on(right)}`;
  const down = (y: number) => `L${at(right, y)}L${at(left, y)}Z`;
  const rock = section.rockFromFt;
  const rockY = rock === null ? bottom : Math.min(bottom, geometry.y(rock));
  const marks: Mark[] = [];
  if (rock !== 0) marks.push(path(ground + down(rockY), { material: 'soil' }));
  if (rock === 0) marks.push(path(ground + down(bottom), { material: 'rock' }));
  if (rock !== null && rock > 0 && rockY < bottom) {
    const line = `M${at(left, rockY)}L${at(right, rockY)}`;
    marks.push(
      path(line + down(bottom), { material: 'rock' }),
      path(line, { stroke: 'rock', weight: 1.4, dash: [12, 3, 3, 3] }),
    );
  }
  marks.push(
    path(`M${on(left - 24)}L${on(edges.left)}M${on(edges.right)}L${on(right + 24)}`, {
      stroke: 'ink',
      weight: 2.4,
    }),
  );
  return marks;
}
