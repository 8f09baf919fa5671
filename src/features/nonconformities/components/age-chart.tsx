import type { NonconformitySummary } from '#shared/generated/api-types.ts';
import { ChartFigure } from './chart-figure.tsx';

const ACTIONS = [
  { key: 'correct', word: 'correct the record', fill: 'bg-query' },
  { key: 'rework', word: 'rework', fill: 'bg-nonconform' },
  { key: 'repair', word: 'repair', fill: 'bg-concession' },
] as const;

/** What was asked for and is not done, by how long ago it was asked. */
export function AgeChart({ buckets }: { buckets: NonconformitySummary['openActions'] }) {
  const sums = buckets.map((one) => one.correct + one.rework + one.repair);
  const most = Math.max(1, ...sums);
  return (
    <ChartFigure title="Open actions by age">
      <ul className="grid gap-y-3 pt-2 text-table">
        {buckets.map((bucket, index) => (
          <li key={bucket.bucket} className="grid grid-cols-[5rem_minmax(0,1fr)] items-center gap-x-3">
            <span className="whitespace-nowrap">{bucket.bucket}</span>
            <span className="flex items-center gap-2">
              <span
                aria-hidden="true"
                className="flex h-4.5"
                style={{ width: `${((sums[index] ?? 0) / most) * 82}%` }}
              >
                {ACTIONS.map(({ key, fill }) => (
                  <span key={key} className={fill} style={{ flexGrow: bucket[key], flexBasis: 0 }} />
                ))}
              </span>
              <span className="font-semibold">{sums[index]}</span>
              <span className="sr-only">
                {ACTIONS.filter(({ key }) => bucket[key] > 0)
                  .map(({ key, word }) => `${bucket[key]} to ${word}`)
                  .join(', ')}
              </span>
            </span>
          </li>
        ))}
      </ul>
      <p aria-hidden="true" className="mt-3 flex flex-wrap gap-x-3 text-micro text-ink-2">
        {ACTIONS.map(({ key, word, fill }) => (
          <span key={key} className="inline-flex items-center gap-1">
            <span className={`size-2 ${fill}`} />
            {word}
          </span>
        ))}
      </p>
    </ChartFigure>
  );
}
