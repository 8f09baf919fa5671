import { classNames } from '#src/lib/class-names.ts';

/** Ruled lines where text will stand; said aloud once. */
export function Skeleton({ lines = 5, label = 'Loading' }: { lines?: number; label?: string }) {
  return (
    <div role="status" aria-label={label} className="appear-late px-gutter py-4">
      {Array.from({ length: lines }, (_, index) => (
        <div
          key={index}
          className={classNames(
            'flex h-row items-center border-b border-hairline',
            index === lines - 1 && 'border-transparent',
          )}
        >
          <span className="h-2 bg-sunk" style={{ width: `${[62, 44, 71, 53, 38][index % 5]}%` }} />
        </div>
      ))}
    </div>
  );
}
