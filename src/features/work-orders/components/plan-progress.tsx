import type { WorkOrder } from '#shared/generated/api-types.ts';

const PARTS = [
  { key: 'onRecord', word: 'on record', fill: 'bg-conform' },
  { key: 'approved', word: 'approved', fill: 'bg-conform/55' },
  { key: 'inBatch', word: 'in batch', fill: 'bg-query/70' },
] as const;

/** `5 of 36 on record`, and a bar of what is approved and in batch; the words say all of it. */
export function PlanProgress({ order, words }: { order: WorkOrder; words?: boolean }) {
  const { structures, progress } = order;
  const said = [...PARTS.map(({ key, word }) => `${progress[key]} ${word}`), `${progress.planned} planned`];
  return (
    <span className="inline-flex flex-wrap items-center gap-x-2.5 gap-y-1">
      <span className="whitespace-nowrap">
        {words ? said.join(', ') : `${progress.onRecord} of ${structures} on record`}
      </span>
      <span role="img" aria-label={said.join(', ')} className="flex h-1.5 w-37 border border-rule bg-sheet">
        {PARTS.map(({ key, fill }) => (
          <span
            key={key}
            className={fill}
            style={{ width: `${structures > 0 ? (progress[key] / structures) * 100 : 0}%` }}
          />
        ))}
      </span>
    </span>
  );
}
