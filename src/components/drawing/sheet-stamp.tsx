import { textWidth } from './text-width.ts';

export type SheetStampData = {
  readonly word: string;
  readonly tone: 'conform' | 'nonconform' | 'concession';
  readonly detail?: string;
};

const FILLS = {
  conform: 'fill-conform',
  nonconform: 'fill-nonconform',
  concession: 'fill-concession',
} as const;
const STROKES = {
  conform: 'stroke-conform',
  nonconform: 'stroke-nonconform',
  concession: 'stroke-concession',
} as const;

/** The stamp of a checked drawing. */
export function SheetStamp({ stamp, x, y }: { stamp: SheetStampData; x: number; y: number }) {
  const word = stamp.word.toUpperCase();
  const width = Math.max(textWidth(word, 14, true) * 1.22, textWidth(stamp.detail ?? '', 10.5)) + 24;
  const height = stamp.detail ? 42 : 29;
  const middle = x + width / 2;
  return (
    <g className={STROKES[stamp.tone]}>
      <rect x={x} y={y} width={width} height={height} className="fill-none" strokeWidth="2" />
      <rect x={x + 4} y={y + 4} width={width - 8} height={height - 8} className="fill-none" strokeWidth="1" />
      <g stroke="none" className={FILLS[stamp.tone]} textAnchor="middle">
        <text x={middle} y={y + 20} fontSize="14" letterSpacing="1.5" className="font-semibold">
          {word}
        </text>
        {stamp.detail ? (
          <text x={middle} y={y + 33} fontSize="10.5">
            {stamp.detail}
          </text>
        ) : null}
      </g>
    </g>
  );
}
