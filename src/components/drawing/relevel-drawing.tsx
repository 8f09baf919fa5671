import { ColumnLabel } from './column-label.tsx';
import { dimensionText } from './dimension-text.ts';
import type { Materials } from './materials.tsx';
import { RelevelProfile } from './relevel-profile.tsx';
import type { RelevelLayout } from './relevel-layout.ts';
import { RunText } from './run-text.tsx';
import { ScaleBar } from './scale-bar.tsx';
import type { SheetSpec } from './sheet-spec.ts';

type Props = {
  readonly layout: RelevelLayout;
  readonly spec: SheetSpec;
  readonly materials: Materials;
  readonly metric: boolean;
};

/** A pad from above with its four corner gaps, and in section with the wedge of foam under it. */
export function RelevelDrawing({ layout, spec, materials, metric }: Props) {
  const { section, places, labels } = layout;
  const { left, right, backY, frontY, scale } = places;
  const known = section.lengthIn !== null && section.widthIn !== null;
  const corners = [
    { x: left, y: frontY },
    { x: left, y: backY },
    { x: right, y: backY },
    { x: right, y: frontY },
  ];
  return (
    <>
      <RunText
        x={left}
        y={backY - 34}
        runs={[{ text: 'Plan, from above; gaps at the final level', tone: 'muted' }]}
      />
      <path
        d={`M${left} ${backY}H${right}V${frontY}H${left}Z`}
        fill={known ? `url(#${materials.foam})` : 'none'}
        className="stroke-ink"
        strokeWidth="1.8"
        strokeDasharray={known ? undefined : '7 5'}
      />
      {section.opening ? <Opening layout={layout} opening={section.opening} /> : null}
      {corners.map(({ x, y }, index) => (
        <g key={`${x} ${y}`}>
          <circle cx={x} cy={y} r="3.8" className="fill-ink" />
          <RunText
            x={x + (x === left ? -10 : 10)}
            y={y === backY ? y - 9 : y + 5}
            anchor={x === left ? 'end' : 'start'}
            runs={[{ text: `${index + 1}: `, bold: true }, gapRun(section.gapsIn?.[index], metric)]}
          />
        </g>
      ))}
      <path d={`M${left + 20} ${frontY + 16}H${right - 20}`} className="stroke-ink" strokeWidth="2.6" />
      <RunText
        x={(left + right) / 2}
        y={frontY + 36}
        anchor="middle"
        runs={[
          { text: 'doors', bold: true },
          { text: ' front', tone: 'muted' },
        ]}
      />
      <RelevelProfile layout={layout} materials={materials} metric={metric} />
      {labels.map((label) => (
        <ColumnLabel key={label.id} label={label} />
      ))}
      <ScaleBar {...spec.scaleBar} scale={scale * 12} metric={metric} />
    </>
  );
}

function gapRun(gap: number | undefined, metric: boolean) {
  return gap === undefined
    ? ({ text: 'not given', tone: 'query' } as const)
    : ({ text: dimensionText(gap, 'in', metric), tone: 'muted' } as const);
}

function Opening({
  layout,
  opening,
}: {
  layout: RelevelLayout;
  opening: { lengthIn: number; widthIn: number };
}) {
  const { left, right, backY, frontY, scale } = layout.places;
  const x = (left + right) / 2;
  const y = (backY + frontY) / 2;
  const w = opening.widthIn * scale;
  const h = opening.lengthIn * scale;
  return (
    <g>
      <rect
        x={x - w / 2}
        y={y - h / 2}
        width={w}
        height={h}
        className="fill-sheet stroke-ink"
        strokeWidth="1.4"
        strokeDasharray="6 4"
      />
      <RunText x={x} y={y + 5} anchor="middle" runs={[{ text: 'opening', bold: true }]} />
    </g>
  );
}
