import type { KeyboardEvent } from 'react';
import { BALLOON_R, FONT } from '#shared/drawing/sheet-spec.ts';
import { toneOf, type SheetFinding } from '#shared/drawing/sheet-types.ts';
import { FILL, STROKE } from './paint-classes.ts';
import { useSheetEvents } from './sheet-events.ts';

/** The number of a finding in its circle. Hover and focus mark its row in the list; Enter goes there. */
export function Balloon({ finding, x, y }: { finding: SheetFinding; x: number; y: number }) {
  const { active, onActive, onPick } = useSheetEvents();
  const tone = toneOf(finding);
  const marked = active === finding.id;
  const drawn = (
    <>
      <circle
        cx={x}
        cy={y}
        r={BALLOON_R}
        strokeWidth={marked ? 2.4 : 1.7}
        className={`${marked ? FILL[tone] : 'fill-sheet'} ${STROKE[tone === 'ink' ? 'ink-2' : tone]}`}
      />
      <text
        x={x}
        y={y + 4.4}
        fontSize={FONT - 0.5}
        textAnchor="middle"
        className={`font-semibold ${marked ? 'fill-sheet' : FILL[tone]}`}
      >
        {finding.number}
      </text>
    </>
  );
  if (!onActive) return <g>{drawn}</g>;
  return (
    <g
      role="button"
      tabIndex={0}
      aria-label={`Finding ${finding.number}: ${finding.title}`}
      aria-pressed={marked}
      className="cursor-pointer outline-none focus-visible:[&>circle]:stroke-focus focus-visible:[&>circle]:stroke-[3]"
      onMouseEnter={() => onActive(finding.id)}
      onMouseLeave={() => onActive(null)}
      onFocus={() => onActive(finding.id)}
      onBlur={() => onActive(null)}
      onClick={() => onPick?.(finding.id)}
      onKeyDown={(event: KeyboardEvent) => {
        if (event.key !== 'Enter' && event.key !== ' ') return;
        event.preventDefault();
        event.stopPropagation();
        onPick?.(finding.id);
      }}
    >
      {drawn}
    </g>
  );
}
