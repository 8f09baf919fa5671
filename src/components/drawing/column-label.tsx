import { Balloon } from './balloon.tsx';
import { FILL, STROKE } from './sheet-classes.ts';
import { useSheetEvents } from './sheet-events.ts';
import { BALLOON_R, FONT, LINE } from './sheet-spec.ts';
import type { PlacedText } from './label-column.ts';

/** A label with its leader: dot at the place, slanting line, then level to the words or to the balloon. */
export function ColumnLabel({ label }: { label: PlacedText }) {
  const { active } = useSheetEvents();
  const { finding, anchor, tone, x } = label;
  const level = label.y - 4.5;
  const balloonX = x - BALLOON_R - 7;
  const endX = finding ? balloonX - BALLOON_R : x - 6;
  const marked = finding !== null && finding.id === active;
  return (
    <g>
      {anchor ? (
        <>
          <path
            d={
              finding
                ? `M${anchor.x} ${anchor.y}L${endX} ${level}`
                : `M${anchor.x} ${anchor.y}L${endX - 18} ${level}H${endX}`
            }
            className={`fill-none ${STROKE[tone]}`}
            strokeWidth={marked ? 2 : 0.9}
          />
          <circle cx={anchor.x} cy={anchor.y} r="2.6" className={FILL[tone]} />
        </>
      ) : null}
      {finding ? <Balloon finding={finding} x={balloonX} y={level} /> : null}
      <text fontSize={FONT}>
        {label.title.map((line, index) => (
          <tspan key={line} x={x} y={label.y + index * LINE} className={`font-semibold ${FILL[tone]}`}>
            {line}
          </tspan>
        ))}
        {label.detail.map((line, index) => (
          <tspan key={line} x={x} y={label.y + (label.title.length + index) * LINE} className="fill-muted">
            {line}
          </tspan>
        ))}
      </text>
    </g>
  );
}
