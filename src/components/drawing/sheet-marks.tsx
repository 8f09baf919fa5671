import type { Mark, PathMark, TextMark } from '#shared/drawing/marks.ts';
import { classNames } from '#src/lib/class-names.ts';
import { Balloon } from './balloon.tsx';
import { patternId } from './material-patterns.tsx';
import { FILL, STROKE } from './paint-classes.ts';
import { useSheetEvents } from './sheet-events.ts';

/** A drawing's marks, back to front. */
export function SheetMarks({ marks, sheet }: { marks: readonly Mark[]; sheet: string }) {
  return marks.map((mark, index) => {
    // The order of a drawing's marks is all the name they have.
    const key = index;
    if (mark.is === 'path') return <Path key={key} mark={mark} sheet={sheet} />;
    if (mark.is === 'text') return <Words key={key} mark={mark} />;
    return <Balloon key={key} finding={mark.finding} x={mark.x} y={mark.y} />;
  });
}

function Path({ mark, sheet }: { mark: PathMark; sheet: string }) {
  const { active } = useSheetEvents();
  const { d, fill, material, stroke, weight, dash, opacity, finding } = mark;
  const shared = {
    d,
    strokeWidth: finding !== undefined && finding === active ? 2 : weight,
    strokeDasharray: dash?.join(' '),
    opacity,
    strokeLinejoin: 'round',
  } as const;
  const line = stroke ? STROKE[stroke] : 'stroke-none';
  if (!material) return <path {...shared} className={`${fill ? FILL[fill] : 'fill-none'} ${line}`} />;
  return (
    <>
      {fill ? <path d={d} className={FILL[fill]} /> : null}
      <path {...shared} fill={`url(#${patternId(sheet, material)})`} className={line} />
    </>
  );
}

/** Bold for figures, muted for the words around them; a rim of paper keeps hatching off them. */
function Words({ mark }: { mark: TextMark }) {
  const { x, y, runs, size, anchor, upright, halo, spacing } = mark;
  return (
    <text
      x={x}
      y={y}
      fontSize={size}
      textAnchor={anchor}
      letterSpacing={spacing}
      transform={upright ? `rotate(-90 ${x} ${y})` : undefined}
      className={halo ? 'stroke-sheet' : undefined}
      strokeWidth={halo ? 4 : undefined}
      strokeLinejoin="round"
      style={{ whiteSpace: 'pre', paintOrder: 'stroke' }}
    >
      {runs.map((run, index) => (
        <tspan
          key={`${index} ${run.text}`}
          className={classNames(FILL[run.tone ?? 'ink'], run.bold && 'font-semibold')}
        >
          {run.text}
        </tspan>
      ))}
    </text>
  );
}
