import type { WorkbookNotice } from '#shared/records/types.ts';
import type { NoticeCode } from './notices.ts';

type Sentence = { readonly title: string; readonly message: string; readonly remedy: string };
type Say = (params: Readonly<Record<string, string>>, sheet: string) => Sentence;

const NOTHING_DUE = 'Nothing, if that is meant.';

const SENTENCES: Readonly<Record<NoticeCode, Say>> = {
  'workbook-no-lines': () => ({
    title: 'No lines',
    message:
      'None of the sheets Set, Straighten and Re-level holds a filled-in line. A row with nothing but what the template had filled in is not one.',
    remedy: 'Fill in what was measured, save, and upload again.',
  }),
  'workbook-sheet-missing': (_, sheet) => ({
    title: 'Sheet missing',
    message: `The sheet ${sheet} is missing.`,
    remedy: 'Start from the work order’s template, or bring the sheet back.',
  }),
  'workbook-sheet-unknown': (_, sheet) => ({
    title: 'Sheet not read',
    message: `The sheet “${sheet}” is no part of the template and was not read.`,
    remedy: NOTHING_DUE,
  }),
  'workbook-sheet-renamed': ({ like }, sheet) => ({
    title: 'Sheet under another name',
    message: `The sheet “${sheet}” has the headings of ${like}, but not its name, and was not read.`,
    remedy: `If it holds lines, name it ${like} again, or move its rows into the sheet ${like}, and upload the workbook again.`,
  }),
  'workbook-sheet-not-read': (_, sheet) => ({
    title: 'Sheet not read',
    message: `“${sheet}” is no sheet of cells and was not read.`,
    remedy: NOTHING_DUE,
  }),
  'workbook-header-missing': (_, sheet) => ({
    title: 'Headings missing',
    message: `The sheet ${sheet} has no row of headings that is known, so that none of its rows was read.`,
    remedy: 'Copy the rows into a fresh template of the work order.',
  }),
  'workbook-column-missing': ({ title }, sheet) => ({
    title: 'Column missing',
    message: `The sheet ${sheet} has no column “${title}”.`,
    remedy: 'Bring the column back from the template and fill it in.',
  }),
  'workbook-column-unknown': ({ column, heading }, sheet) => ({
    title: 'Column not known',
    message:
      heading === ''
        ? `Column ${column} of ${sheet} has no heading; it is kept as written and not checked.`
        : `Column ${column} of ${sheet}, “${heading}”, is no part of the template; it is kept as written and not checked.`,
    remedy: NOTHING_DUE,
  }),
  'workbook-other-order': ({ written, order }) => ({
    title: 'Another work order',
    message: `The workbook says that it is for work order “${written}”; this batch belongs to ${order}.`,
    remedy: 'Hand it in with the batch of its own order, or copy the rows into this order’s template.',
  }),
  'workbook-not-returned': ({ structures, more }) => ({
    title: 'Lines not returned',
    message: `This revision takes the returned lines only; not taken again: ${structures}${more === '0' || !more ? '' : ` and ${more} more`}.`,
    remedy: 'Nothing: lines that were approved stand as they are.',
  }),
  'workbook-column-twice': ({ title }, sheet) => ({
    title: 'Column twice',
    message: `The sheet ${sheet} has the column “${title}” more than once; only the first was read.`,
    remedy: 'Keep the right one and delete the other.',
  }),
  'workbook-row-skipped': ({ row }, sheet) => ({
    title: 'Row not read',
    message: `Row ${row} of ${sheet} stands where the template has its titles and hints and was not read.`,
    remedy: 'If it is a line, move it below the headings.',
  }),
  'workbook-merged': ({ range, more }, sheet) => ({
    title: 'Merged cells',
    message:
      more === '0'
        ? `The cells ${range} of ${sheet} are merged: only the first of them holds a value.`
        : `The cells ${range} of ${sheet} and ${more} further ranges are merged: only the first cell of each holds a value.`,
    remedy: 'Unmerge them and write the value in every row that it holds for.',
  }),
  'workbook-template-old': ({ version, current }) => ({
    title: 'Older template',
    message: `The workbook was made with template version ${version}; version ${current} is current. It was read all the same.`,
    remedy: 'Take the current template for the next batch.',
  }),
  'workbook-template-unknown': ({ version, current }) => ({
    title: 'Template not known',
    message: `Template version “${version}” is not known; the workbook was read as version ${current}.`,
    remedy: 'Take the work order’s template, or put the version back as the template had it.',
  }),
  'workbook-keywords-differ': ({ field, written, kept }) => ({
    title: 'Workbook of another template',
    message:
      field === 'workOrder'
        ? `The Batch sheet says work order ${written}, but the template was made for ${kept}.`
        : `The Batch sheet says template version ${written}, but the file was made as version ${kept}.`,
    remedy: 'Fill in the template that was made for this work order, or say why another one was used.',
  }),
};

/** Title, message and remedy of a notice about the workbook as a whole; null for a code that is none of its own. */
export function noticeText({
  code,
  params,
  sheet,
}: Pick<WorkbookNotice, 'code' | 'params' | 'sheet'>): Sentence | null {
  if (!Object.hasOwn(SENTENCES, code)) return null;
  const texts = Object.fromEntries(
    Object.entries(params).map(([name, value]) => [name, String(value ?? '')]),
  );
  return SENTENCES[code as NoticeCode](texts, sheet ?? '');
}
