import { counted } from '#src/lib/formats.ts';

type Props = {
  readonly done: number;
  /** 0: not known yet; the bar then makes no claim. */
  readonly total: number;
  /** What is counted, plural: "rows", "photographs". */
  readonly things: string;
  readonly label: string;
  /** The words stand elsewhere: the bar alone. */
  readonly bare?: boolean;
};

/** Real progress: so many of so many, in words and as a bar. */
export function Progress({ done, total, things, label, bare }: Props) {
  const share = total > 0 ? Math.min(1, done / total) : 0;
  return (
    <div>
      {bare ? null : (
        <p className="text-table text-muted" aria-hidden="true">
          {total > 0
            ? `${done.toLocaleString('en-US')} of ${total.toLocaleString('en-US')} ${things}`
            : label}
        </p>
      )}
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={total > 0 ? total : undefined}
        aria-valuenow={total > 0 ? done : undefined}
        aria-valuetext={total > 0 ? `${done} of ${counted(total, things, things)}` : label}
        className="mt-1 h-1.5 border border-rule bg-sheet"
      >
        <div className="h-full bg-accent transition-[width]" style={{ width: `${share * 100}%` }} />
      </div>
    </div>
  );
}

type Segment = {
  readonly count: number;
  readonly tone: 'conform' | 'nonconform' | 'concession' | 'query';
  readonly word: string;
};

const FILLS = {
  conform: 'bg-conform',
  nonconform: 'bg-nonconform',
  concession: 'bg-concession',
  query: 'bg-query',
} as const;

/** How far a review is and which way it goes: approved, returned, held of all lines. */
export function DecisionBar({ segments, total }: { segments: readonly Segment[]; total: number }) {
  const decided = segments.reduce((sum, segment) => sum + segment.count, 0);
  const words = segments
    .filter((segment) => segment.count > 0)
    .map((segment) => `${segment.count} ${segment.word}`);
  return (
    <span className="inline-flex items-center gap-2.5 whitespace-nowrap">
      {decided} of {total} decided
      <span
        role="img"
        aria-label={words.length > 0 ? words.join(', ') : 'none decided'}
        className="flex h-1.5 w-37 border border-rule bg-sheet"
      >
        {segments.map((segment) => (
          <span
            key={segment.word}
            className={FILLS[segment.tone]}
            style={{ width: `${total > 0 ? (segment.count / total) * 100 : 0}%` }}
          />
        ))}
      </span>
    </span>
  );
}
