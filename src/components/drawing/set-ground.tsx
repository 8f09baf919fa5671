import type { Materials } from './materials.tsx';
import type { SetGeometry } from './set-geometry.ts';
import type { SetSection } from './set-section.ts';
import type { SheetSpec } from './sheet-spec.ts';

type Props = {
  readonly section: SetSection;
  readonly geometry: SetGeometry;
  readonly spec: SheetSpec;
  readonly materials: Materials;
};

/** Hatched ground, soil above rock, and the ground line broken at the bore. */
export function SetGround({ section, geometry, spec, materials }: Props) {
  const { left, right } = spec.hatch;
  const { groundAt, hatchBottomY: bottom } = geometry;
  const edgeL = geometry.bore?.left ?? geometry.x(0);
  const edgeR = geometry.bore?.right ?? geometry.x(0);
  const ground = `M${left} ${groundAt(left)}L${edgeL} ${groundAt(edgeL)}L${edgeR} ${groundAt(edgeR)}L${right} ${groundAt(right)}`;
  const rock = section.rockFromFt;
  const rockY = rock === null ? bottom : Math.min(bottom, geometry.y(rock));
  return (
    <g>
      {rock === 0 ? null : <path d={`${ground}V${rockY}H${left}Z`} fill={`url(#${materials.soil})`} />}
      {rock === 0 ? <path d={`${ground}V${bottom}H${left}Z`} fill={`url(#${materials.rock})`} /> : null}
      {rock !== null && rock > 0 && rockY < bottom ? (
        <>
          <path d={`M${left} ${rockY}H${right}V${bottom}H${left}Z`} fill={`url(#${materials.rock})`} />
          <path
            d={`M${left} ${rockY}H${right}`}
            className="stroke-rock"
            strokeWidth="1.4"
            strokeDasharray="12 3 3 3"
          />
        </>
      ) : null}
      <path
        d={`M${left - 24} ${groundAt(left - 24)}L${edgeL} ${groundAt(edgeL)}M${edgeR} ${groundAt(edgeR)}L${right + 24} ${groundAt(right + 24)}`}
        className="fill-none stroke-ink"
        strokeWidth="2.4"
      />
    </g>
  );
}
