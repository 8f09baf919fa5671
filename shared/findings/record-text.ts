import { expectation } from './expectation.ts';
import { unitWord } from '#shared/units/format-quantity.ts';
import { say } from './say.ts';
import type { Finding } from './types.ts';
import { unreadableBecause } from './unreadable-text.ts';

export type FindingText = {
  readonly title: string;
  readonly message: (finding: Finding) => string;
  readonly remedy: (finding: Finding) => string;
};

const cellOf = ({ sheet, cell }: Finding): string => (cell === null ? `the sheet ${sheet}` : `cell ${cell}`);
const Cell = ({ sheet, cell }: Finding): string => (cell === null ? `The sheet ${sheet}` : `Cell ${cell}`);
const name = ({ params, field }: Finding): string => say(params['title'] ?? field, null);

const write = (finding: Finding): string => {
  const expected = expectation(finding.params);
  return expected === '' ? `Correct ${cellOf(finding)}.` : `Write in ${cellOf(finding)} ${expected}.`;
};

/** For what is blank: where any text will do, there is nothing more to say of it. */
const fillIn = (finding: Finding): string => {
  const expected = expectation(finding.params);
  if (expected !== 'a text') return write(finding);
  return finding.cell === null
    ? `Fill it in on the sheet ${finding.sheet}.`
    : `Fill in cell ${finding.cell}.`;
};

/** What stands in a cell, quoted. */
const stands = (finding: Finding): string =>
  `${Cell(finding)} (${name(finding)}) says "${say(finding.measured, null)}"`;

/** Findings of a row that is not yet a record: what stood there, what is expected, how to put it right. */
export const RECORD_TEXT: ReadonlyMap<string, FindingText> = new Map<string, FindingText>([
  [
    'record-missing',
    {
      title: 'Not filled in',
      message: (finding) => `${name(finding)} is not filled in; every line needs it.`,
      remedy: fillIn,
    },
  ],
  [
    'record-conditional',
    {
      title: 'Does not go together',
      message: (finding) => {
        const condition = say(finding.params['condition'], null);
        return finding.measured === null
          ? `${name(finding)} is not filled in; it is needed ${condition}.`
          : `${stands(finding)}, which cannot be so ${condition}.`;
      },
      remedy: write,
    },
  ],
  [
    'record-unreadable',
    {
      title: 'Cannot be read',
      message: (finding) => `${stands(finding)}, ${unreadableBecause(finding.params)}.`,
      remedy: write,
    },
  ],
  [
    'record-type',
    {
      title: 'Not what is expected',
      message: (finding) => `${stands(finding)}, which is not the kind of value expected there.`,
      remedy: write,
    },
  ],
  [
    'record-range',
    {
      title: 'Out of range',
      message: (finding) => {
        const { unit, margin, limit, measured, params } = finding;
        const other = params['of'] === undefined ? '' : ' written beside it';
        const side =
          typeof measured === 'number' && typeof limit === 'number' && measured < limit ? 'below' : 'above';
        const bound = margin === null ? '' : ` is ${side} ${say(limit, unit)}${other} and`;
        return `${name(finding)}, ${say(measured, unit)},${bound} cannot be.`;
      },
      remedy: write,
    },
  ],
  [
    'record-code',
    {
      title: 'Not on the list',
      message: (finding) => `${stands(finding)}, which is not on the list for that column.`,
      remedy: write,
    },
  ],
  [
    'record-unit',
    {
      title: 'Wrong unit',
      message: (finding) => {
        const { found, expected } = finding.params;
        if (typeof found !== 'string' || typeof expected !== 'string')
          return `${stands(finding)}: its unit is not the column's.`;
        return `${stands(finding)}: that is in ${unitWord(found)}, and the column is in ${unitWord(expected)}. Nothing is converted in silence.`;
      },
      remedy: write,
    },
  ],
  [
    'record-length',
    {
      title: 'Too long',
      message: (finding) =>
        `${name(finding)} is longer than ${say(finding.params['maxLength'], null)} characters.`,
      remedy: (finding) => `Shorten ${cellOf(finding)}.`,
    },
  ],
  [
    'record-formula',
    {
      title: 'Formula without a value',
      message: (finding) =>
        finding.params['error'] === ''
          ? `${Cell(finding)} (${name(finding)}) holds a formula whose result was never stored.`
          : `${Cell(finding)} (${name(finding)}) holds ${finding.params['formula'] === true ? 'a formula that ends in an error' : 'an error'}, ${say(finding.params['error'] ?? finding.measured, null)}, and no reading.`,
      remedy: (finding) =>
        finding.params['error'] === ''
          ? 'Open the workbook in a spreadsheet program, save it there and hand it in again, or type the value.'
          : write(finding),
    },
  ],
  [
    'record-duplicate',
    {
      title: 'Written twice',
      message: ({ measured }) =>
        `Event ${say(measured, null)} of this structure has a second row on the Events sheet.`,
      remedy: () => 'Leave one row an event; number a further event one higher.',
    },
  ],
  [
    'record-orphan',
    {
      title: 'Belongs to no line',
      message: ({ sheet, measured }) =>
        `A row of the sheet ${say(sheet, null)} is for structure ${say(measured, null)}, which has no line in this batch.`,
      remedy: () => 'Correct the structure number, or add the line that the row belongs to.',
    },
  ],
]);
