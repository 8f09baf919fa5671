import { Arrow } from './arrow.tsx';
import { Balloon } from './balloon.tsx';
import { RunText } from './run-text.tsx';
import { STROKE } from './sheet-classes.ts';
import type { DownDimension } from './down-dimension.ts';
import type { AcrossDimension, DueTick } from './set-dimensions.ts';
import { BALLOON_R } from './sheet-spec.ts';

const EXTENSION = 'stroke-ink-2';

/** Extension lines, the line between its arrows (broken where the pole stands in front), words at one side. */
export function AcrossLine({ dimension }: { dimension: AcrossDimension }) {
  const { x1, x2, y, fromY, gap, textX, textAt, runs } = dimension;
  const past = y < fromY ? -5 : 5;
  const from = textAt === 'left' ? textX + 5 : x1;
  const to = textAt === 'left' ? x2 : textX - 5;
  return (
    <g>
      <path
        d={`M${x1} ${fromY}V${y + past}M${x2} ${fromY}V${y + past}`}
        className={EXTENSION}
        strokeWidth="0.9"
      />
      <path
        d={gap ? `M${from} ${y}H${gap[0]}M${gap[1]} ${y}H${to}` : `M${from} ${y}H${to}`}
        className={EXTENSION}
        strokeWidth="0.9"
      />
      <Arrow x={x1} y={y} to="left" />
      <Arrow x={x2} y={y} to="right" />
      <RunText x={textX} y={y + 4.5} anchor={textAt === 'left' ? 'end' : 'start'} runs={runs} />
    </g>
  );
}

/** A depth down the left side; a finding on it sits on the line itself. */
export function DownLine({ dimension }: { dimension: DownDimension }) {
  const { x, y1, y2, toX1, toX2, textY, runs, tone, balloon } = dimension;
  const line = balloon
    ? `M${x} ${y1}V${balloon.y - BALLOON_R}M${x} ${balloon.y + BALLOON_R}V${y2}`
    : `M${x} ${y1}V${y2}`;
  return (
    <g>
      <path d={`M${x - 12} ${y1}H${toX1}M${x - 12} ${y2}H${toX2}`} className={EXTENSION} strokeWidth="0.9" />
      <path d={line} className={STROKE[tone]} strokeWidth="1" />
      <Arrow x={x} y={y1} to="up" />
      <Arrow x={x} y={y2} to="down" />
      <RunText x={x - 7} y={textY} turn={-90} anchor="middle" runs={runs} />
      {balloon ? <Balloon finding={balloon.finding} x={x} y={balloon.y} /> : null}
    </g>
  );
}

/** The depth that is due, as a tick beside the measured one. */
export function DueMark({ due }: { due: DueTick }) {
  return (
    <g>
      <path
        d={`M${due.x1} ${due.y}H${due.x2}`}
        className={STROKE[due.tone]}
        strokeWidth="1.5"
        strokeDasharray="6 3"
      />
      <RunText x={due.textX} y={due.textY} runs={[{ text: due.text, tone: due.tone }]} />
    </g>
  );
}
