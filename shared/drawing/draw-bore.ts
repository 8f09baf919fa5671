import { at, path, type Mark } from './marks.ts';
import { boreSlice, type SetGeometry } from './set-geometry.ts';
import { boreHalfFt, type SetSection } from './set-section.ts';

/** What fills the bore, from the bottom up: bed, foam in its lifts to the level that the placed volume reaches, water over both; then its outline. */
export function boreMarks(section: SetSection, geometry: SetGeometry): Mark[] {
  const { bore, bed, foam } = section;
  if (!bore || !geometry.bore) return [];
  const depth = bore.depthFt;
  const marks: Mark[] = [path(`${geometry.bore.path}Z`, { fill: 'sheet' })];
  if (bed) {
    const d = boreSlice(section, geometry, [Math.max(0, depth - bed.heightFt), depth]);
    marks.push(path(d, { material: bed.material === 'native' ? 'soil' : 'stone' }));
  }
  if (foam) marks.push(...foamMarks(section, geometry));
  marks.push(...waterMarks(section, geometry));
  marks.push(path(geometry.bore.path, { stroke: 'ink', weight: 1.8 }));
  return marks.filter((mark) => mark.is !== 'path' || mark.d !== '');
}

function level(section: SetSection, geometry: SetGeometry, z: number): string {
  const half = section.bore ? boreHalfFt(section.bore, z) : 0;
  return `M${at(geometry.x(-half), geometry.y(z))}L${at(geometry.x(half), geometry.y(z))}`;
}

function foamMarks(section: SetSection, geometry: SetGeometry): Mark[] {
  const { foam } = section;
  if (!foam) return [];
  const levels = [foam.bottomFt, ...foam.liftsFt, foam.topFt];
  const marks: Mark[] = levels.slice(1).flatMap((to, index): Mark[] => {
    const from = levels[index] ?? foam.bottomFt;
    const d = boreSlice(section, geometry, [to, from]);
    // Every second lift is a shade deeper.
    return [
      path(d, { material: 'foam' }),
      ...(index % 2 === 1 ? [path(d, { fill: 'foam-cell', opacity: 0.28 })] : []),
    ];
  });
  for (const z of foam.liftsFt)
    marks.push(path(level(section, geometry, z), { stroke: 'foam-cell', weight: 1.6 }));
  if (foam.crownFt > 0) marks.push(crown(geometry, foam.crownFt));
  if (foam.recordedTopFt !== null)
    marks.push(
      path(level(section, geometry, foam.recordedTopFt), { stroke: 'foam-cell', weight: 1.6, dash: [5, 4] }),
    );
  return marks;
}

/** Foam that rose above grade: steep at the bore's edge, level against the pole. */
function crown(geometry: SetGeometry, crownFt: number): Mark {
  const { edges, pole } = geometry;
  const top = Math.max(geometry.y(-crownFt), geometry.y(0) - 40);
  const low = geometry.groundAt(edges.left);
  const high = geometry.groundAt(edges.right);
  const inL = pole?.left ?? geometry.x(0);
  const inR = pole?.right ?? geometry.x(0);
  const from = (edge: number, inner: number, share: number) => edge + (inner - edge) * share;
  return path(
    `M${at(edges.left, low)}C${at(from(edges.left, inL, 0.2), top + 2)} ${at(from(edges.left, inL, 0.5), top)} ${at(inL, top)}` +
      `L${at(inR, top)}C${at(from(edges.right, inR, 0.5), top)} ${at(from(edges.right, inR, 0.2), top + 2)} ${at(edges.right, high)}L${at(edges.right, low)}Z`,
    { material: 'foam' },
  );
}

/** Water with the pole in, and as a dashed line where it stood in the open bore. */
function waterMarks(section: SetSection, geometry: SetGeometry): Mark[] {
  const { bore, bed, waterFt, openWaterFt } = section;
  if (!bore) return [];
  const marks: Mark[] = [];
  const depth = bore.depthFt;
  const water = waterFt === null ? 0 : Math.min(waterFt, depth);
  if (water > 0)
    marks.push(
      path(boreSlice(section, geometry, [depth - water, depth]), {
        fill: 'water-fill',
        opacity: bed ? 0.7 : 1,
      }),
      path(level(section, geometry, depth - water), { stroke: 'water', weight: 1.4 }),
    );
  if (openWaterFt !== null && openWaterFt < depth)
    marks.push(
      path(level(section, geometry, depth - openWaterFt), { stroke: 'ink-2', weight: 0.9, dash: [3, 2.5] }),
    );
  return marks;
}
