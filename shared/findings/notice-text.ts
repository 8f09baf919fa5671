import { fieldTitle } from '#shared/records/field-meta.ts';
import { say } from './say.ts';
import type { FindingText } from './record-text.ts';
import type { Finding } from './types.ts';

const sheetOf = ({ sheet }: Finding): string => `The sheet ${say(sheet, null)}`;
const param = ({ params }: Finding, name: string): string => say(params[name], null);
const nothing = (): string => 'Nothing needs doing if that is as meant.';

/** What concerns the workbook as a whole: codes of shared/workbook/notices.ts, and of the check itself. */
export const NOTICE_TEXT: ReadonlyMap<string, FindingText> = new Map<string, FindingText>([
  [
    'standard-none',
    {
      title: 'No standard',
      message: () => 'The owner has no construction standard in force, so nothing can be judged.',
      remedy: () => 'Ask the owner to publish a standard.',
    },
  ],
  [
    'workbook-no-lines',
    {
      title: 'No lines',
      message: () => 'No line is filled in on the sheets Set, Straighten and Re-level.',
      remedy: () =>
        'Fill in one line a structure; the numbers that the template wrote make no line by themselves.',
    },
  ],
  [
    'workbook-sheet-missing',
    {
      title: 'Sheet missing',
      message: (finding) => `${sheetOf(finding)} is not in the workbook.`,
      remedy: () => 'Use the template of the work order, and keep its sheets and their names.',
    },
  ],
  [
    'workbook-sheet-unknown',
    {
      title: 'Sheet not known',
      message: (finding) => `${sheetOf(finding)} is none of the template's and was not read.`,
      remedy: nothing,
    },
  ],
  [
    'workbook-sheet-not-read',
    {
      title: 'Sheet not read',
      message: (finding) =>
        `${sheetOf(finding)} holds a ${param(finding, 'kind')} and no rows; it was not read.`,
      remedy: nothing,
    },
  ],
  [
    'workbook-header-missing',
    {
      title: 'Headings missing',
      message: (finding) =>
        `${sheetOf(finding)} has no row of headings within its first 20 rows, so none of it was read.`,
      remedy: () => 'Put the headings of the template back, or copy the rows into a fresh template.',
    },
  ],
  [
    'workbook-column-missing',
    {
      title: 'Column missing',
      message: (finding) => `${sheetOf(finding)} has no column ${param(finding, 'title')}.`,
      remedy: () => 'Put the column back under its heading.',
    },
  ],
  [
    'workbook-column-unknown',
    {
      title: 'Column not known',
      message: (finding) =>
        `Column ${param(finding, 'column')} of the sheet ${say(finding.sheet, null)}, headed "${param(finding, 'heading')}", is none of the template's; it is kept as written and not checked.`,
      remedy: nothing,
    },
  ],
  [
    'workbook-column-twice',
    {
      title: 'Column twice',
      message: (finding) =>
        `${sheetOf(finding)} has the column ${param(finding, 'title')} twice; only the first was read.`,
      remedy: () => 'Leave one of the two columns.',
    },
  ],
  [
    'workbook-row-skipped',
    {
      title: 'Row above the headings',
      message: (finding) =>
        `Row ${param(finding, 'row')} of the sheet ${say(finding.sheet, null)} stands above the headings and was not read.`,
      remedy: () => 'Move it below the headings if it is a line.',
    },
  ],
  [
    'workbook-merged',
    {
      title: 'Merged cells',
      message: (finding) =>
        `${sheetOf(finding)} has merged cells at ${param(finding, 'range')}${Number(finding.params['more']) > 0 ? ` and ${param(finding, 'more')} more` : ''}: only the first cell of a merged range holds a value.`,
      remedy: () => 'Unmerge them if the value is meant for each row.',
    },
  ],
  [
    'workbook-template-old',
    {
      title: 'Earlier template',
      message: (finding) =>
        `The workbook is of template version ${param(finding, 'version')}; the current one is ${param(finding, 'current')}. It was read all the same.`,
      remedy: () => 'Download the template again for the next batch.',
    },
  ],
  [
    'workbook-template-unknown',
    {
      title: 'Template not known',
      message: (finding) =>
        `Template version "${param(finding, 'version')}" is none that was ever issued; the workbook was read as version ${param(finding, 'current')}.`,
      remedy: () =>
        'Download the template of the work order and copy the rows into it, or say where this one is from.',
    },
  ],
  [
    'workbook-keywords-differ',
    {
      title: 'Workbook contradicts itself',
      message: (finding) =>
        `${fieldTitle('batch', String(finding.params['field'] ?? ''))} is "${param(finding, 'written')}" on the Batch sheet, but the workbook was made for "${param(finding, 'kept')}".`,
      remedy: () => 'Use the template that was downloaded for this work order.',
    },
  ],
]);
