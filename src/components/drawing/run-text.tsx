import { classNames } from '#src/lib/class-names.ts';
import { FILL } from './sheet-classes.ts';
import { FONT } from './sheet-spec.ts';
import type { Run } from './sheet-types.ts';

type Props = {
  readonly x: number;
  readonly y: number;
  readonly runs: readonly Run[];
  readonly anchor?: 'start' | 'middle' | 'end';
  readonly size?: number;
  /** Degrees about (x, y). */
  readonly turn?: number;
};

/** A line of text on a drawing: bold for figures, muted for the words around them; a rim of paper keeps hatching off it. */
export function RunText({ x, y, runs, anchor = 'start', size = FONT, turn }: Props) {
  return (
    <text
      x={x}
      y={y}
      fontSize={size}
      textAnchor={anchor}
      transform={turn ? `rotate(${turn} ${x} ${y})` : undefined}
      className="stroke-sheet"
      strokeWidth="4"
      strokeLinejoin="round"
      style={{ whiteSpace: 'pre', paintOrder: 'stroke' }}
    >
      {runs.map((run) => (
        <tspan key={run.text} className={classNames(FILL[run.tone ?? 'ink'], run.bold && 'font-semibold')}>
          {run.text}
        </tspan>
      ))}
    </text>
  );
}
