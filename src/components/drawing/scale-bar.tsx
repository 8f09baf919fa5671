import { M_PER_FT } from '#shared/units/convert.ts';

/** One foot (or two tenths of a metre) at the drawing's scale, which is given per foot. */
export function ScaleBar({ x, y, scale, metric }: { x: number; y: number; scale: number; metric: boolean }) {
  const unit = metric ? (0.2 / M_PER_FT) * scale : scale;
  return (
    <g>
      <path
        d={`M${x} ${y - 5}V${y + 5}M${x + unit / 2} ${y - 4}V${y + 4}M${x + unit} ${y - 5}V${y + 5}`}
        className="stroke-ink"
      />
      <path d={`M${x} ${y}H${x + unit}`} className="stroke-ink" />
      <path d={`M${x} ${y}H${x + unit / 2}`} className="stroke-ink" strokeWidth="4.5" />
      <text x={x} y={y + 20} fontSize="11" className="fill-muted">
        0
      </text>
      <text x={x + unit} y={y + 20} fontSize="11" textAnchor="middle" className="fill-muted">
        {metric ? '0.2 m' : '1 ft'}
      </text>
    </g>
  );
}
