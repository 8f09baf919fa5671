import type { Materials } from './materials.tsx';
import { boreSlice, type SetGeometry } from './set-geometry.ts';
import { boreHalfFt, type SetSection } from './set-section.ts';

type Props = { readonly section: SetSection; readonly geometry: SetGeometry; readonly materials: Materials };

/** What fills the bore, from the bottom up: bed, foam to the level that the placed volume reaches, water over both; then its outline. */
export function SetBore({ section, geometry, materials }: Props) {
  const { bore, foam, bed, waterFt } = section;
  if (!bore || !geometry.bore) return null;
  const slice = (from: number, to: number) => boreSlice(section, geometry, [from, to]);
  const depth = bore.depthFt;
  const water = waterFt === null ? 0 : Math.min(waterFt, depth);
  return (
    <g>
      <path d={`${geometry.bore.path}Z`} className="fill-sheet" />
      {bed ? (
        <path
          d={slice(Math.max(0, depth - bed.heightFt), depth)}
          fill={`url(#${bed.material === 'native' ? materials.soil : materials.stone})`}
        />
      ) : null}
      {foam ? <path d={slice(foam.topFt, foam.bottomFt)} fill={`url(#${materials.foam})`} /> : null}
      {foam && foam.crownFt > 0 ? (
        <Crown section={section} geometry={geometry} fill={materials.foam} />
      ) : null}
      {foam && foam.recordedTopFt !== null ? (
        <path
          d={`M${geometry.x(-boreHalfFt(bore, foam.recordedTopFt))} ${geometry.y(foam.recordedTopFt)}H${geometry.x(boreHalfFt(bore, foam.recordedTopFt))}`}
          className="stroke-foam-cell"
          strokeWidth="1.6"
          strokeDasharray="5 4"
        />
      ) : null}
      {water > 0 ? (
        <>
          <path d={slice(depth - water, depth)} className="fill-water-fill" fillOpacity={bed ? 0.7 : 1} />
          <path
            d={`M${geometry.x(-boreHalfFt(bore, depth - water))} ${geometry.y(depth - water)}H${geometry.x(boreHalfFt(bore, depth - water))}`}
            className="stroke-water"
            strokeWidth="1.4"
          />
        </>
      ) : null}
      <path
        d={geometry.bore.path}
        className="fill-none stroke-ink"
        strokeWidth="1.8"
        strokeLinejoin="round"
      />
    </g>
  );
}

/** Foam that rose above grade: steep at the bore's edge, level against the pole. */
function Crown({ section, geometry, fill }: { section: SetSection; geometry: SetGeometry; fill: string }) {
  const { bore, pole } = geometry;
  if (!bore || !section.foam) return null;
  const top = geometry.y(-section.foam.crownFt);
  const low = geometry.groundAt(bore.left);
  const high = geometry.groundAt(bore.right);
  const inL = pole?.left ?? geometry.x(0);
  const inR = pole?.right ?? geometry.x(0);
  return (
    <path
      d={`M${bore.left} ${low}C${bore.left + (inL - bore.left) * 0.2} ${top + 2} ${bore.left + (inL - bore.left) * 0.5} ${top} ${inL} ${top}H${inR}C${bore.right - (bore.right - inR) * 0.5} ${top} ${bore.right - (bore.right - inR) * 0.2} ${top + 2} ${bore.right} ${high}V${low}Z`}
      fill={`url(#${fill})`}
    />
  );
}
