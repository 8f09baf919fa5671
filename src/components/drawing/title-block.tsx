import type { TitleBlockData } from './sheet-types.ts';
import { fitText, textWidth } from './text-width.ts';

type Cell = {
  readonly word: string;
  readonly value: string;
  /** Share of the row. */ readonly share: number;
};

const ROW = 39;
const WORD = 11;
const VALUE = 14;

/** Rows of the block; a decision with name and day gets a row of its own. */
export function titleRows(data: TitleBlockData, width: number): readonly (readonly Cell[])[] {
  const decidedShare = 0.35;
  const ownRow = textWidth(data.decided, VALUE, true) > width * decidedShare - 16;
  const last: Cell[] = [
    { word: 'Standard', value: data.standard, share: ownRow ? 0.35 : 0.22 },
    { word: 'Revision', value: data.revision, share: ownRow ? 0.3 : 0.22 },
    ...(ownRow ? [] : [{ word: 'Decided', value: data.decided, share: decidedShare }]),
    { word: 'Sheet', value: data.sheet, share: ownRow ? 0.35 : 0.21 },
  ];
  return [
    [{ word: 'Owner', value: data.owner, share: 1 }],
    [
      { word: 'Work order', value: data.workOrder, share: 0.21 },
      { word: 'Structure', value: data.structure, share: 0.29 },
      { word: 'Kind', value: data.kind, share: 0.5 },
    ],
    data.pole === null
      ? [{ word: 'Measured on', value: data.measuredOn, share: 1 }]
      : [
          { word: 'Pole', value: data.pole, share: 0.5 },
          { word: 'Measured on', value: data.measuredOn, share: 0.5 },
        ],
    last,
    ...(ownRow ? [[{ word: 'Decided', value: data.decided, share: 1 }]] : []),
  ];
}

export function titleBlockHeight(data: TitleBlockData, width: number): number {
  return titleRows(data, width).length * ROW;
}

type Props = {
  readonly data: TitleBlockData;
  /** Lower right corner. */
  readonly right: number;
  readonly bottom: number;
  readonly width: number;
};

export function TitleBlock({ data, right, bottom, width }: Props) {
  const rows = titleRows(data, width);
  const left = right - width;
  const top = bottom - rows.length * ROW;
  return (
    <g>
      <rect
        x={left}
        y={top}
        width={width}
        height={rows.length * ROW}
        className="fill-sheet stroke-ink"
        strokeWidth="1.6"
      />
      {rows.map((cells, index) => (
        <TitleRow
          key={cells[0]?.word ?? index}
          cells={cells}
          x={left}
          y={top + index * ROW}
          width={width}
          first={index === 0}
        />
      ))}
    </g>
  );
}

type RowProps = { cells: readonly Cell[]; x: number; y: number; width: number; first: boolean };

function TitleRow({ cells, x, y, width, first }: RowProps) {
  const starts = cells.map(
    (_, index) => x + width * cells.slice(0, index).reduce((sum, cell) => sum + cell.share, 0),
  );
  return (
    <g>
      {first ? null : <path d={`M${x} ${y}H${x + width}`} className="stroke-ink" strokeWidth="1" />}
      {cells.map((cell, index) => {
        const cellX = starts[index] ?? x;
        const cellWidth = cell.share * width;
        return (
          <g key={cell.word}>
            {index === 0 ? null : (
              <path d={`M${cellX} ${y}V${y + ROW}`} className="stroke-ink" strokeWidth="1" />
            )}
            <text x={cellX + 8} y={y + 14} fontSize={WORD} className="fill-muted">
              {cell.word}
            </text>
            <text x={cellX + 8} y={y + 30} fontSize={VALUE} className="fill-ink font-semibold">
              {fitText(cell.value, { width: cellWidth - 12, size: VALUE, bold: true })}
            </text>
          </g>
        );
      })}
    </g>
  );
}
