import { useRef } from 'react';
import { Link } from 'react-router-dom';
import { classNames } from '#src/lib/class-names.ts';
import { useWidth } from '#src/lib/use-width.ts';
import type { NonconformitySummary } from '#shared/generated/api-types.ts';
import { ChartFigure } from './chart-figure.tsx';
import { paretoBars, wrapTitle } from './pareto-bars.ts';
import { percent } from './percent.ts';

const HEIGHT = 214;
const TOP = 18;
const FOOT = 38;
const LEFT = 38;
const BASE = HEIGHT - FOOT;
/** The tallest bar stays below the end of the line, so that neither hides the other. */
const BAR_ROOM = 0.68 * (BASE - TOP);
const LETTER_PX = 6.1;

type Props = {
  readonly rules: NonconformitySummary['byRule'];
  /** Where a bar leads: the same list of this rule alone. */
  readonly ruleTo: (code: string) => string;
};

/** How often each rule was not met, with the running share: a few rules make up most. */
export function ParetoChart({ rules, ruleTo }: Props) {
  const frame = useRef<HTMLDivElement>(null);
  const width = useWidth(frame);
  const bars = paretoBars(rules, width >= 560 ? 8 : width >= 420 ? 6 : 4);
  const slot = (width - LEFT) / Math.max(1, bars.length);
  const tallest = Math.max(1, ...bars.map((bar) => bar.count));
  const share = (running: number) => BASE - running * (BASE - TOP);
  const middle = (index: number) => LEFT + slot * (index + 0.5);
  const line = bars.map((bar, index) => `${middle(index)},${share(bar.running)}`).join(' ');
  return (
    <ChartFigure
      title="By rule, with running share"
      note={bars.some((bar) => bar.few) ? 'red: the rules that make up the first half' : undefined}
    >
      <div ref={frame} className="relative" style={{ height: HEIGHT }}>
        {width > 0 ? (
          <svg width={width} height={HEIGHT} aria-hidden="true" className="absolute inset-0">
            <line
              x1={LEFT}
              x2={width}
              y1={share(0.8)}
              y2={share(0.8)}
              className="stroke-hairline"
              strokeDasharray="3 3"
            />
            <text x={LEFT - 6} y={share(0.8) + 4} textAnchor="end" className="fill-muted text-micro">
              80 %
            </text>
            {bars.map((bar, index) => {
              const tall = (bar.count / tallest) * BAR_ROOM;
              return (
                <g key={bar.title}>
                  <rect
                    x={middle(index) - Math.min(32, slot * 0.4)}
                    width={Math.min(64, slot * 0.8)}
                    y={BASE - tall}
                    height={tall}
                    className={bar.few ? 'fill-nonconform' : 'fill-hairline'}
                  />
                  {wrapTitle(bar.title, { width: Math.max(5, Math.floor(slot / LETTER_PX)), lines: 2 }).map(
                    (words, row) => (
                      <text
                        key={words}
                        x={middle(index)}
                        y={BASE + 15 + row * 14}
                        textAnchor="middle"
                        className="fill-ink-2 text-micro"
                      >
                        {words}
                      </text>
                    ),
                  )}
                </g>
              );
            })}
            <line x1={LEFT} x2={width} y1={BASE} y2={BASE} className="stroke-ink" strokeWidth="1.4" />
            <polyline points={line} fill="none" className="stroke-ink" strokeWidth="1.1" />
            {bars.map((bar, index) => (
              <circle
                key={bar.title}
                cx={middle(index)}
                cy={share(bar.running)}
                r="2.8"
                className="fill-paper stroke-ink"
                strokeWidth="1.2"
              />
            ))}
            {bars.map((bar, index) => (
              <text
                key={bar.title}
                x={middle(index)}
                y={countHeight(BASE - (bar.count / tallest) * BAR_ROOM - 6, share(bar.running))}
                textAnchor="middle"
                className="fill-ink stroke-paper text-small font-semibold"
                strokeWidth="3"
                paintOrder="stroke"
              >
                {bar.count}
              </text>
            ))}
          </svg>
        ) : null}
        <ul aria-label="Findings by rule, most frequent first">
          {bars.map((bar, index) => {
            const words = `${bar.title}: ${bar.count}, ${percent(bar.running, 0)} up to here`;
            return (
              <li
                key={bar.title}
                className={classNames('absolute inset-y-0', bar.code && 'hover:bg-ink/5')}
                style={{ left: middle(index) - slot / 2, width: slot }}
              >
                {bar.code ? (
                  <Link to={ruleTo(bar.code)} title={words} className="block size-full">
                    <span className="sr-only">{words}</span>
                  </Link>
                ) : (
                  <span className="sr-only">{words}</span>
                )}
              </li>
            );
          })}
        </ul>
      </div>
    </ChartFigure>
  );
}

/** A count keeps clear of the point of the line at the same place. */
function countHeight(above: number, point: number): number {
  return Math.abs(above - 4 - point) < 11 ? point - 8 : above;
}
