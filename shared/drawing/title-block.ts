import { at, path, type Mark } from './marks.ts';
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
function titleRows(data: TitleBlockData, width: number): readonly (readonly Cell[])[] {
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

type Place = {
  /** Lower right corner. */
  readonly right: number;
  readonly bottom: number;
  readonly width: number;
};

/** The corner of the sheet: whose, which, when, by what standard, decided by whom. */
export function titleBlockMarks(data: TitleBlockData, { right, bottom, width }: Place): Mark[] {
  const rows = titleRows(data, width);
  const left = right - width;
  const top = bottom - rows.length * ROW;
  const marks: Mark[] = [
    path(`M${at(left, top)}L${at(right, top)}L${at(right, bottom)}L${at(left, bottom)}Z`, {
      fill: 'sheet',
      stroke: 'ink',
      weight: 1.6,
    }),
  ];
  rows.forEach((cells, index) => {
    const y = top + index * ROW;
    if (index > 0) marks.push(path(`M${at(left, y)}L${at(right, y)}`, { stroke: 'ink', weight: 1 }));
    let x = left;
    for (const cell of cells) {
      const cellWidth = cell.share * width;
      if (x > left) marks.push(path(`M${at(x, y)}L${at(x, y + ROW)}`, { stroke: 'ink', weight: 1 }));
      marks.push(...cellMarks(cell, { x, y, width: cellWidth }));
      x += cellWidth;
    }
  });
  return marks;
}

function cellMarks(cell: Cell, { x, y, width }: { x: number; y: number; width: number }): Mark[] {
  const text = { is: 'text', anchor: 'start', x: x + 8, part: `title ${cell.word}` } as const;
  return [
    { ...text, y: y + 14, size: WORD, runs: [{ text: cell.word, tone: 'muted' }] },
    {
      ...text,
      y: y + 30,
      size: VALUE,
      runs: [{ text: fitText(cell.value, { width: width - 12, size: VALUE, bold: true }), bold: true }],
    },
  ];
}
