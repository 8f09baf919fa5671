import { classNames } from '#src/lib/class-names.ts';
import { counted } from '#src/lib/formats.ts';
import type { NonconformitySummary } from '#shared/generated/api-types.ts';
import { ChartFigure } from './chart-figure.tsx';
import { percent } from './percent.ts';
import { rateScale } from './rate-scale.ts';

type Contractor = NonconformitySummary['byContractor'][number];
const GRID = 'grid grid-cols-[minmax(5rem,8rem)_minmax(0,1fr)_3.6rem] items-center gap-x-4';

/** Share of records with a finding of the filter, by contractor, and how sure that is. */
export function RateChart({ contractors }: { contractors: readonly Contractor[] }) {
  const shown = contractors.filter((one) => one.records > 0);
  const records = shown.reduce((sum, one) => sum + one.records, 0);
  const all = records > 0 ? shown.reduce((sum, one) => sum + one.nonconforming, 0) / records : 0;
  const { end, ticks } = rateScale(Math.max(all, ...shown.map((one) => one.high)));
  const at = (share: number) => `${(share / end) * 100}%`;
  return (
    <ChartFigure
      title="Rate by contractor, 95 % interval"
      note={shown.some((one) => one.low > all) ? 'red: its whole interval is above all' : undefined}
    >
      {shown.length === 0 ? <p className="text-table text-ink-2">No records yet.</p> : null}
      {shown.length > 0 ? (
        <div className="text-table">
          <div className={GRID} aria-hidden="true">
            <span />
            <span className="relative h-4 text-micro text-muted">
              <span
                className={classNames(
                  'absolute whitespace-nowrap',
                  all / end > 0.7 ? '-translate-x-full pr-1' : 'pl-1',
                )}
                style={{ left: at(all) }}
              >
                all {percent(all)}
              </span>
            </span>
          </div>
          <ul>
            {shown.map((one) => (
              <li key={one.id} className={GRID}>
                <span className="py-1 leading-tight">{one.name}</span>
                <svg width="100%" height="33" aria-hidden="true" className="overflow-visible">
                  <line
                    x1={at(all)}
                    x2={at(all)}
                    y1="0"
                    y2="33"
                    className="stroke-ink-2"
                    strokeDasharray="3 3"
                  />
                  <Whiskers one={one} at={at} high={one.low > all} />
                </svg>
                <span className="text-right font-semibold">{percent(one.rate)}</span>
                <span className="sr-only">
                  {one.nonconforming} of {counted(one.records, 'record')}, interval {percent(one.low)} to{' '}
                  {percent(one.high)}
                </span>
              </li>
            ))}
          </ul>
          <div className={GRID} aria-hidden="true">
            <span />
            <span className="relative h-6 border-t-[1.4px] border-ink text-micro text-muted">
              {ticks.map((tick, index) => (
                <span
                  key={tick}
                  className={classNames(
                    'absolute top-1 whitespace-nowrap',
                    index > 0 && (index === ticks.length - 1 ? '-translate-x-full' : '-translate-x-1/2'),
                  )}
                  style={{ left: at(tick) }}
                >
                  {index === 0 ? '0' : percent(tick, tick * 100 === Math.round(tick * 100) ? 0 : 1)}
                </span>
              ))}
            </span>
          </div>
        </div>
      ) : null}
    </ChartFigure>
  );
}

type WhiskerProps = {
  readonly one: Contractor;
  readonly at: (share: number) => string;
  readonly high: boolean;
};

function Whiskers({ one, at, high }: WhiskerProps) {
  return (
    <g className={high ? 'fill-nonconform stroke-nonconform' : 'fill-ink stroke-ink'} strokeWidth="1.3">
      <line x1={at(one.low)} x2={at(one.high)} y1="16.5" y2="16.5" />
      <line x1={at(one.low)} x2={at(one.low)} y1="12" y2="21" />
      <line x1={at(one.high)} x2={at(one.high)} y1="12" y2="21" />
      <circle cx={at(one.rate)} cy="16.5" r="3.6" strokeWidth="0" />
    </g>
  );
}
