import { Arrow } from './arrow.tsx';
import { dimensionText } from './dimension-text.ts';
import type { Materials } from './materials.tsx';
import type { RelevelLayout } from './relevel-layout.ts';
import { RunText } from './run-text.tsx';

type Props = { readonly layout: RelevelLayout; readonly materials: Materials; readonly metric: boolean };

/** Thickness of pad and box are not measured: they are drawn as a sign, the wedge under them to scale. */
const PAD = 18;
const BOX = 44;

/** Section from left to right: the pad where it stands now, its slope before as a dashed line, the wedge under it. */
export function RelevelProfile({ layout, materials, metric }: Props) {
  const { section, places } = layout;
  const { left, right, padY, scale } = places;
  const gaps = section.gapsIn;
  const deepL = padY + (gaps ? ((gaps[0] + gaps[1]) / 2) * scale : 0);
  const deepR = padY + (gaps ? ((gaps[2] + gaps[3]) / 2) * scale : 0);
  const rise = ((section.slopeBeforeAcross ?? 0) / 12) * (right - left);
  const width = right - left;
  const mean = gaps ? (gaps[2] + gaps[3]) / 2 : null;
  return (
    <g>
      <RunText
        x={left}
        y={padY - PAD - BOX - 12}
        runs={[{ text: 'Section, left to right', tone: 'muted' }]}
      />
      <path
        d={`M${left - 28} ${deepL}H${left}L${right} ${deepR}H${right + 28}V${Math.max(deepL, deepR) + 42}H${left - 28}Z`}
        fill={`url(#${materials.soil})`}
      />
      {gaps ? (
        <path
          d={`M${left} ${padY}H${right}V${deepR}L${left} ${deepL}Z`}
          fill={`url(#${materials.foam})`}
          className="stroke-ink"
          strokeWidth="1.4"
        />
      ) : null}
      <rect
        x={left}
        y={padY - PAD}
        width={width}
        height={PAD}
        className="fill-sunk stroke-ink"
        strokeWidth="1.4"
      />
      <rect
        x={left + width * 0.12}
        y={padY - PAD - BOX}
        width={width * 0.76}
        height={BOX}
        className="fill-sheet stroke-ink"
        strokeWidth="1.4"
      />
      {section.slopeBeforeAcross === null ? null : (
        <path
          d={`M${left} ${padY - PAD + rise / 2 + 8}L${right} ${padY - PAD - rise / 2 + 8}`}
          className="stroke-pole"
          strokeWidth="1.4"
          strokeDasharray="8 5"
        />
      )}
      {mean !== null && deepR - padY > 4 ? (
        <g>
          <path d={`M${left - 10} ${padY}V${deepL}`} className="stroke-ink-2" strokeWidth="0.9" />
          {deepL - padY > 18 ? <Arrow x={left - 10} y={padY} to="up" /> : null}
          {deepL - padY > 18 ? <Arrow x={left - 10} y={deepL} to="down" /> : null}
          <RunText
            x={left - 18}
            y={(padY + deepL) / 2 + 5}
            anchor="end"
            runs={[
              { text: dimensionText(((gaps?.[0] ?? 0) + (gaps?.[1] ?? 0)) / 2, 'in', metric), bold: true },
            ]}
          />
          <RunText
            x={right}
            y={deepR + 20}
            anchor="end"
            runs={[
              { text: dimensionText(mean, 'in', metric), bold: true },
              { text: ' mean right', tone: 'muted' },
            ]}
          />
        </g>
      ) : null}
    </g>
  );
}
