import { at, path, type Mark } from './marks.ts';
import type { Ghost } from './set-ghosts.ts';
import type { SetGeometry } from './set-geometry.ts';
import type { SetSection } from './set-section.ts';
import type { SheetSpec } from './sheet-spec.ts';

/** Dashed, in the colour of a question: it stands for what is lacking. */
export const GHOST = { stroke: 'query', weight: 1.3, dash: [5, 4] } as const;

/** Outlines in place of a bore or pole that was not measured; open below where the depth is not known. */
export function ghostMarks({ ghosts }: SetSection, geometry: SetGeometry, spec: SheetSpec): Mark[] {
  const marks: Mark[] = [];
  if (ghosts.bore) marks.push(outline(ghosts.bore, geometry, geometry.y(0)));
  if (ghosts.pole) marks.push(outline(ghosts.pole, geometry, spec.poleTopY));
  return marks;
}

function outline(ghost: Ghost, { x, y }: SetGeometry, topY: number): Mark {
  const foot = y(ghost.depthFt);
  const left = `M${at(x(-ghost.halfTopFt), topY)}L${at(x(-ghost.halfTopFt), y(0))}L${at(x(-ghost.halfBottomFt), foot)}`;
  const right = `${ghost.open ? 'M' : 'L'}${at(x(ghost.halfBottomFt), foot)}L${at(x(ghost.halfTopFt), y(0))}L${at(x(ghost.halfTopFt), topY)}`;
  return path(left + right, GHOST);
}
