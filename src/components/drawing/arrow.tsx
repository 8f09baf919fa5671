import { classNames } from '#src/lib/class-names.ts';

const TURN = { up: 0, right: 90, down: 180, left: 270 } as const;

/** Arrowhead with its point at (x, y). */
export function Arrow({
  x,
  y,
  to,
  className,
}: {
  x: number;
  y: number;
  to: keyof typeof TURN;
  className?: string;
}) {
  return (
    <path
      d="M0 0 2.9 8.5H-2.9Z"
      transform={`translate(${x} ${y}) rotate(${TURN[to]})`}
      className={classNames(className ?? 'fill-ink')}
    />
  );
}
