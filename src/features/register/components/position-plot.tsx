import { useRef } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '#src/config/paths.ts';
import { counted, formatCount } from '#src/lib/formats.ts';
import { useUnitSystem } from '#src/lib/settings/unit-system.ts';
import { useWidth } from '#src/lib/use-width.ts';
import type { RegisterRow } from '#shared/generated/api-types.ts';
import { formatQuantity } from '#shared/units/format-quantity.ts';
import { namedPoints, projectPositions, roundLength } from './project-positions.ts';

type Placed = RegisterRow & { latitude: number; longitude: number };
const HEIGHT = 260;
/** What a name takes, in px. */
const NAME = { width: 58, height: 15 };
const FEET_A_METRE = 1 / 0.3048;

/** Where the structures of the rows loaded stand, to scale, north up; each mark leads to its record. */
export function PositionPlot({ rows, total }: { rows: readonly RegisterRow[]; total: number | null }) {
  const frame = useRef<HTMLDivElement>(null);
  const width = useWidth(frame);
  const metric = useUnitSystem() === 'metric';
  const placed = rows.filter((row): row is Placed => row.latitude !== null && row.longitude !== null);
  const plot = width > 0 ? projectPositions(placed, { width, height: HEIGHT, pad: 36 }) : null;
  const named = namedPoints(plot?.points ?? [], NAME);
  const away = rows.length - placed.length;
  const extent = plot
    ? `, over ${formatQuantity(plot.widthFt, 'ft', { metric, digits: 0 })} west to east and ${formatQuantity(plot.heightFt, 'ft', { metric, digits: 0 })} south to north`
    : '';
  return (
    <section aria-label="Plot of positions" className="border-b border-hairline">
      <div ref={frame} className="relative overflow-hidden bg-sheet" style={{ height: HEIGHT }}>
        {plot ? (
          <>
            <svg width={width} height={HEIGHT} aria-hidden="true" className="absolute inset-0">
              {plot.points.map(({ x, y, item }) => (
                <g key={item.id}>
                  <Mark x={x} y={y} row={item} />
                  {named.has(item) ? (
                    <text x={x} y={y - 10} textAnchor="middle" className="fill-ink-2 text-micro">
                      {item.structureNumber}
                    </text>
                  ) : null}
                </g>
              ))}
              <ScaleBar feetPerPx={plot.feetPerPx} metric={metric} />
              <g transform={`translate(${width - 26} 20)`} className="fill-ink stroke-ink">
                <path d="M0 0 5 16 0 12.5-5 16Z" strokeWidth="1" />
                <text y="30" textAnchor="middle" strokeWidth="0" className="text-micro">
                  N
                </text>
              </g>
            </svg>
            <ul>
              {plot.points.map(({ x, y, item }) => (
                <li key={item.id}>
                  <Link
                    to={paths.registerRecord.to(item.recordNumber)}
                    title={`${item.structureNumber}, ${item.recordNumber}`}
                    style={{ left: x - 8, top: y - 8 }}
                    className="absolute size-4 rounded-full hover:bg-ink/15"
                  >
                    <span className="sr-only">
                      {item.structureNumber}, {item.nonconforming ? 'by concession' : 'conforms'}
                    </span>
                  </Link>
                </li>
              ))}
            </ul>
          </>
        ) : null}
        {placed.length === 0 ? (
          <p className="px-gutter py-6 text-ink-2">None of these records has a position.</p>
        ) : null}
      </div>
      <p className="flex flex-wrap gap-x-5 px-gutter py-1.5 text-small text-muted">
        <span>
          {counted(placed.length, 'position')}
          {extent}.
          {total !== null && total > rows.length
            ? ` Of ${formatCount(total)} records the ${formatCount(rows.length)} loaded so far are plotted: filter, or scroll the list for more.`
            : ''}
          {away > 0 ? ` ${counted(away, 'row')} without one.` : ''}
        </span>
        <span className="inline-flex items-center gap-1.5">
          <svg width="9" height="9" aria-hidden="true">
            <circle cx="4.5" cy="4.5" r="3.5" className="fill-ink" />
          </svg>
          conforms
        </span>
        <span className="inline-flex items-center gap-1.5">
          <svg width="11" height="11" aria-hidden="true">
            <path
              d="M5.5 1 10 5.5 5.5 10 1 5.5Z"
              className="fill-sheet stroke-concession"
              strokeWidth="1.6"
            />
          </svg>
          by concession
        </span>
      </p>
    </section>
  );
}

function Mark({ x, y, row }: { x: number; y: number; row: RegisterRow }) {
  if (row.nonconforming)
    return (
      <path
        d={`M${x} ${y - 5.5}l5.5 5.5-5.5 5.5-5.5-5.5Z`}
        className="fill-sheet stroke-concession"
        strokeWidth="1.6"
      />
    );
  return <circle cx={x} cy={y} r="3.5" className="fill-ink" />;
}

function ScaleBar({ feetPerPx, metric }: { feetPerPx: number; metric: boolean }) {
  const feetAUnit = metric ? FEET_A_METRE : 1;
  const length = roundLength((feetPerPx * 130) / feetAUnit);
  const px = (length * feetAUnit) / feetPerPx;
  return (
    <g transform={`translate(18 ${HEIGHT - 26})`} className="fill-ink stroke-ink">
      <path d={`M0 0V7H${px}V0M${px / 2} 2V7`} fill="none" strokeWidth="1.2" />
      <text x={px + 7} y="8" strokeWidth="0" className="text-small">
        {length.toLocaleString('en-US')} {metric ? 'm' : 'ft'}
      </text>
    </g>
  );
}
