import { ColumnLabel } from './column-label.tsx';
import { AcrossLine, DownLine } from './dimension-lines.tsx';
import type { Materials } from './materials.tsx';
import { ScaleBar } from './scale-bar.tsx';
import { brokenTop } from './set-pole.tsx';
import type { SheetSpec } from './sheet-spec.ts';
import type { StraightenLayout } from './straighten-layout.ts';

type Props = {
  readonly layout: StraightenLayout;
  readonly spec: SheetSpec;
  readonly materials: Materials;
  readonly metric: boolean;
};

/** A straightened pole: where it stands now, where its face stood before, and the wedge that was filled. */
export function StraightenDrawing({ layout, spec, materials, metric }: Props) {
  const { places, section } = layout;
  const { left, right, wedge, buttY } = places;
  const { groundY, hatch, axisX, poleTopY } = spec;
  const edge = wedge?.topX ?? right;
  return (
    <>
      <path
        d={`M${hatch.left} ${groundY}H${hatch.right}V${places.hatchBottomY}H${hatch.left}Z`}
        fill={`url(#${materials.soil})`}
      />
      {wedge ? (
        <path
          d={`M${right} ${groundY}H${wedge.topX}L${wedge.bottomX} ${wedge.bottomY}H${right}Z`}
          fill={`url(#${materials.foam})`}
          className="stroke-ink"
          strokeWidth="1.4"
        />
      ) : null}
      {section.poleIn === null ? null : (
        <path
          d={`${brokenTop(left, right, poleTopY)}V${buttY}H${left}Z`}
          className="fill-pole-fill stroke-pole"
          strokeWidth="1.5"
          strokeDasharray={places.brokenBelow ? '8 4' : undefined}
        />
      )}
      <path
        d={`M${axisX} ${poleTopY - 26}V${buttY + 26}`}
        className="stroke-ink-2"
        strokeWidth="1"
        strokeDasharray="14 4 3 4"
      />
      <path
        d={`M${hatch.left - 24} ${groundY}H${left}M${edge} ${groundY}H${hatch.right + 24}`}
        className="stroke-ink"
        strokeWidth="2.4"
      />
      {wedge ? <FormerFace layout={layout} spec={spec} /> : null}
      {layout.across.map((dimension) => (
        <AcrossLine key={dimension.id} dimension={dimension} />
      ))}
      {layout.down.map((dimension) => (
        <DownLine key={dimension.id} dimension={dimension} />
      ))}
      {layout.labels.map((label) => (
        <ColumnLabel key={label.id} label={label} />
      ))}
      <ScaleBar {...spec.scaleBar} scale={places.scale} metric={metric} />
    </>
  );
}

/** The face of the pole before it was pulled: the outer side of the wedge, carried on above grade. */
function FormerFace({ layout, spec }: { layout: StraightenLayout; spec: SheetSpec }) {
  const { wedge } = layout.places;
  if (!wedge) return null;
  const slope = (wedge.topX - wedge.bottomX) / (wedge.bottomY - spec.groundY);
  const topY = spec.poleTopY;
  return (
    <path
      d={`M${wedge.bottomX} ${wedge.bottomY}L${wedge.topX + slope * (spec.groundY - topY)} ${topY}`}
      className="stroke-pole"
      strokeWidth="1.4"
      strokeDasharray="8 5"
    />
  );
}
