import type { Borders, Fill, Style } from 'exceljs';

/** Drafting paper and blue-black ink, as on the screens. */
const INK = 'FF15233C';
const INK_2 = 'FF3D4A63';
const PAPER = 'FFF5F2E9';
const SUNK = 'FFEBE6D9';
const HAIRLINE = 'FFCFC8B6';
const ACCENT = 'FFB83D08';

const fill = (argb: string): Fill => ({ type: 'pattern', pattern: 'solid', fgColor: { argb } });
const line = (style: 'hair' | 'thin' | 'medium', argb: string) => ({ style, color: { argb } });
const hairlines: Partial<Borders> = { bottom: line('thin', HAIRLINE), right: line('thin', HAIRLINE) };
const font = (size: number, argb: string, more: object = {}) => ({
  name: 'Calibri',
  size,
  color: { argb },
  ...more,
});

type Look = Partial<Style>;

export const TITLE: Look = {
  font: font(11, PAPER, { bold: true }),
  fill: fill(INK),
  alignment: { vertical: 'middle', wrapText: true },
  border: { bottom: line('medium', INK), right: line('thin', HAIRLINE) },
};
/** A column that must be filled in: told by the asterisk, and by the line under its title. */
export const TITLE_REQUIRED: Look = {
  ...TITLE,
  border: { bottom: line('medium', ACCENT), right: line('thin', HAIRLINE) },
};
export const HINT: Look = {
  font: font(9, INK_2, { italic: true }),
  fill: fill(SUNK),
  alignment: { vertical: 'top', wrapText: true },
  border: hairlines,
};
export const ENTRY: Look = { font: font(11, INK), border: hairlines };
/** Filled in by the office from the design. */
export const PREFILLED: Look = { font: font(11, INK_2), fill: fill(PAPER), border: hairlines };
export const HEADLINE: Look = { font: font(18, INK, { bold: true }), alignment: { vertical: 'middle' } };
export const SUBHEAD: Look = {
  font: font(12, INK, { bold: true }),
  border: { bottom: line('medium', INK) },
};
export const TEXT: Look = { font: font(11, INK), alignment: { vertical: 'top', wrapText: true } };
export const CAUTION: Look = { ...TEXT, fill: fill(PAPER), border: { left: line('medium', ACCENT) } };
export const LABEL: Look = {
  font: font(11, INK, { bold: true }),
  alignment: { vertical: 'top', wrapText: true },
};
